/**
 * Text as a terminal may safely show it: characters that steer a terminal or hide text become visible stand-ins of
 * the same length, so that places in the line stay where they are. Tabs stay.
 */
export function printable(text: string): string {
  return text.replace(/(?!\t)[\p{Cc}\u200b-\u200f\u2028-\u202e\u2060-\u2069\ufeff]/gu, '\ufffd');
}
