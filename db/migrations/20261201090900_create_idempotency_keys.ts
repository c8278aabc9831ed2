import type { Knex } from 'knex';

/** Answers already given to a request that a caller may send again. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table idempotency_keys (
      person_id uuid not null references people,
      key text not null check (char_length(key) between 1 and 200),
      request_hash text not null check (request_hash ~ '^[0-9a-f]{64}$'),
      answer jsonb,
      created_at timestamptz(3) not null default now(),
      primary key (person_id, key)
    )`);
  await knex.raw('create index idempotency_keys_by_age on idempotency_keys (created_at)');
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop table idempotency_keys');
}
