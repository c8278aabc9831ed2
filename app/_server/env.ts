/** Settings of this process, from its environment. The only place of the web application that reads it. */
export interface Environment {
  readonly databaseUrl: string;
  /** Signs the session cookies. */
  readonly authSecret: string;
  /** Origin under which people reach the application, if it was stated. */
  readonly origin: string | null;
}

/** How much the log says: everything, or only what went wrong. */
export type LogLevel = 'info' | 'error';

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

/** The log's level; `info` unless LOG_LEVEL says `error`. */
export function readLogLevel(): LogLevel {
  return process.env.LOG_LEVEL === 'error' ? 'error' : 'info';
}

/** Whether this is `next dev`, whose fast refresh needs eval in the browser. */
export function isDevelopment(): boolean {
  return process.env.NODE_ENV === 'development';
}
