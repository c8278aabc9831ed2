/** An instant as people read it here: date and minute, in UTC. */
export function instantWords(iso: string): string {
  return `${iso.slice(0, 10)} ${iso.slice(11, 16)}`;
}
