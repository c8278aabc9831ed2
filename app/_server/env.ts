/** Settings of this process, from its environment. The only place of the web application that reads it. */
export interface Environment {
  readonly databaseUrl: string;
  /** Signs the session cookies. */
  readonly authSecret: string;
  /** Origin under which people reach the application, if it was stated. */
  readonly origin: string | null;
}

function required(name: string): string {
  const value = process.env[name];
  if (!value) throw new Error(`${name} is not set`);
  return value;
}

/** Reads the environment; throws, naming the variable, when one that is needed is missing. */
export function readEnvironment(): Environment {
  return {
    databaseUrl: required('DATABASE_URL'),
    authSecret: process.env.AUTH_SECRET || required('NEXTAUTH_SECRET'),
    origin: process.env.NEXTAUTH_URL ? new URL(process.env.NEXTAUTH_URL).origin : null,
  };
}
