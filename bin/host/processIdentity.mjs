import { readFileSync } from 'node:fs';

/**
 * What tells one process from every other, also from a later one that was given the same number; null when there
 * is no such process (any more).
 * @param {number} pid
 */
export function processIdentity(pid) {
  try {
    const boot = readFileSync('/proc/sys/kernel/random/boot_id', 'utf8').trim();
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    // After the program's name, which may hold anything; state, then by proc(5) the start time as the 20th field.
    const fields = stat.slice(stat.lastIndexOf(')') + 2).split(' ');
    return fields[0] === 'Z' ? null : `${boot} ${pid} ${fields[19]}`;
  } catch {
    return null;
  }
}
