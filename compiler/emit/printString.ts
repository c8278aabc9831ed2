/**
 * What JSON allows raw but a reader would not see, or would see in another order: DEL and the C1 controls, line and
 * paragraph separators, directional marks, and every code point that Unicode calls default-ignorable (zero-width
 * marks, fillers, variation selectors, language tags). The ranges are listed rather than asked for by property because
 * engines carry different versions of Unicode, and the same rig must give the same bytes everywhere.
 */
const UNSEEN = new RegExp(
  [
    '[\\u007f-\\u009f\\u00ad\\u034f\\u061c\\u115f\\u1160\\u17b4\\u17b5\\u180b-\\u180f\\u200b-\\u200f]',
    '[\\u2028-\\u202e\\u2060-\\u206f\\u3164\\ufe00-\\ufe0f\\ufeff\\uffa0\\ufff0-\\ufffb]',
    '\\ud82f[\\udca0-\\udca3]',
    '\\ud834[\\udd73-\\udd7a]',
    '[\\udb40-\\udb43][\\udc00-\\udfff]',
  ].join('|'),
  'g',
);

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
