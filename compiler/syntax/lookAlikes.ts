/**
 * Letters of other alphabets that look like a Latin small letter, digit or underscore, from the Unicode confusables
 * list (UTS #39), written down from memory for the letters that occur in real keyboards. Width and ligature
 * variants are folded by NFKC before.
 */
const LOOK_ALIKES: Readonly<Record<string, string>> = {
  а: 'a',
  ԁ: 'd',
  е: 'e',
  һ: 'h',
  і: 'i',
  ј: 'j',
  ӏ: 'l',
  о: 'o',
  р: 'p',
  ԛ: 'q',
  с: 'c',
  ѕ: 's',
  у: 'y',
  х: 'x',
  ԝ: 'w',
  α: 'a',
  ε: 'e',
  ι: 'i',
  κ: 'k',
  ν: 'v',
  ο: 'o',
  ρ: 'p',
  τ: 't',
  υ: 'u',
  χ: 'x',
  А: 'A',
  В: 'B',
  Е: 'E',
  К: 'K',
  М: 'M',
  Н: 'H',
  О: 'O',
  Р: 'P',
  С: 'C',
  Т: 'T',
  Х: 'X',
  Α: 'A',
  Β: 'B',
  Ε: 'E',
  Ζ: 'Z',
  Η: 'H',
  Ι: 'I',
  Κ: 'K',
  Μ: 'M',
  Ν: 'N',
  Ο: 'O',
  Ρ: 'P',
  Τ: 'T',
  Υ: 'Y',
  Χ: 'X',
  ı: 'i',
  ɡ: 'g',
  օ: 'o',
  ո: 'n',
  ս: 'u',
};

const BEYOND_ASCII = /\P{ASCII}/u;
const WORD_OR_ID = /^=?[A-Za-z0-9_.@-]+$/;

/** A name that another one can be mistaken for, and the letters that deceive. */
export interface LookAlike {
  readonly twin: string;
  readonly letters: string;
}

/** The plain Latin name that a name in other letters looks like; null when it is plain, or looks like none. */
export function findLookAlike(name: string): LookAlike | null {
  if (!BEYOND_ASCII.test(name) || name.length > 200) return null;
  const strange = new Set<string>();
  const twin = [...name.normalize('NFKC')]
    .map((letter) => {
      const plain = LOOK_ALIKES[letter] ?? letter;
      if (plain !== letter) strange.add(letter);
      return plain;
    })
    .join('');
  if (!WORD_OR_ID.test(twin)) return null;
  const letters = strange.size > 0 ? [...strange] : [...name].filter((letter) => BEYOND_ASCII.test(letter));
  return { twin, letters: letters.map((letter) => `"${letter}" (U+${codeOf(letter)})`).join(', ') };
}

/** A character's code point as four or more hexadecimal digits. */
export function codeOf(letter: string): string {
  return (letter.codePointAt(0) ?? 0).toString(16).toUpperCase().padStart(4, '0');
}
