/**
 * What JSON allows raw but would be invisible, reorder a line on screen or end a line in some reader: C1 controls and
 * DEL, soft hyphen, Arabic letter mark, Mongolian separator, zero-width and directional marks, line and paragraph
 * separators, directional embeddings and isolates, byte order mark, annotation marks, language tags. The ranges are
 * listed rather than asked for by Unicode property because engines differ in the Unicode version they carry, and the
 * same rig must give the same bytes everywhere.
 */
const UNSEEN =
  /[\u007f-\u009f\u00ad\u061c\u180e\u200b-\u200f\u2028-\u202e\u2060-\u206f\ufeff\ufff9-\ufffb]|\udb40[\udc00-\udfff]/g;

function escapeUnits(match: string): string {
  let escaped = '';
  for (let i = 0; i < match.length; i += 1) {
    escaped += `\\u${match.charCodeAt(i).toString(16).padStart(4, '0')}`;
  }
  return escaped;
}

/**
 * A quoted JSON string that reads back as exactly `value` and cannot end early, start a line or disturb one on screen:
 * quotes, backslashes, controls, lone surrogates and unseen characters are escaped.
 */
export function printString(value: string): string {
  return JSON.stringify(value).replace(UNSEEN, escapeUnits);
}
