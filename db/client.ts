import knex, { type Knex } from 'knex';

/**
 * Knex's settings for a PostgreSQL at `url`. Sessions run in UTC, and no statement may hold a connection for
 * more than half a minute, so that one bad query cannot starve the rest.
 */
export function connectionConfig(url: string): Knex.Config {
  return {
    client: 'pg',
    connection: {
      connectionString: url,
      application_name: 'pintle',
      options: '-c timezone=UTC',
      statement_timeout: 30_000,
    },
    pool: { min: 0, max: 10 },
    acquireConnectionTimeout: 10_000,
  };
}

/** Opens a pool of connections to the PostgreSQL at `url`; the caller ends it with `destroy()`. */
export function createDatabase(url: string): Knex {
  return knex(connectionConfig(url));
}
