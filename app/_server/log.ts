import { type LogLevel, readLogLevel } from './env';

/** Writes one line of JSON to the log: time, level, event and what belongs to it. Never secrets, never texts. */
export function log(
  level: LogLevel,
  event: string,
  fields: Readonly<Record<string, string | number | null | undefined>>,
): void {
  if (level === 'info' && readLogLevel() === 'error') return;
  const line = JSON.stringify({ at: new Date().toISOString(), level, event, ...fields });
  (level === 'error' ? process.stderr : process.stdout).write(`${line}\n`);
}
