import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';

const read = (path: string): string => readFileSync(`${process.cwd()}/${path}`, 'utf8');

/** Source: W3C, WCAG 2.2 (2023), success criterion 1.4.3; thresholds and cases from memory, see the file's head. */
const wcag = JSON.parse(read('tests/data/colour/wcag22.json')) as {
  readonly thresholds: Readonly<Record<string, number>>;
  readonly cases: readonly { readonly fg: string; readonly bg: string; readonly ratio: number }[];
};
/** Source: Okabe and Ito, Color Universal Design (2002, revised 2008); hexadecimal values from memory. */
const { palette } = JSON.parse(read('tests/data/colour/okabe_ito.json')) as {
  readonly palette: Readonly<Record<string, string>>;
};

const TEXT_RATIO = wcag.thresholds['1.4.3 text AA'] as number;

/** Relative luminance of WCAG 2.2: linear light of sRGB, weighted. */
function luminance(hex: string): number {
  const linear = [1, 3, 5].map((start) => {
    const share = Number.parseInt(hex.slice(start, start + 2), 16) / 255;
    return share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4;
  });
  const [red = 0, green = 0, blue = 0] = linear;
  return 0.2126 * red + 0.7152 * green + 0.0722 * blue;
}

function contrast(one: string, other: string): number {
  const [light = 0, dark = 0] = [luminance(one), luminance(other)].sort((a, b) => b - a);
  return (light + 0.05) / (dark + 0.05);
}

type Tokens = Readonly<Record<string, string>>;

function tokensOf(block: string): Tokens {
  return Object.fromEntries(
    [...block.matchAll(/--([a-z-]+):\s*(#[0-9a-f]{6});/gi)].map(([, name, value]) => [name, value]),
  );
}

/** Blocks of custom properties in the style sheet, by their selector. */
function schemes(): Readonly<Record<'day' | 'night' | 'systemNight', Tokens>> {
  const css = read('app/globals.css');
  const block = (selector: string): Tokens => {
    const start = css.indexOf(`${selector} {`);
    expect(start, selector).toBeGreaterThanOrEqual(0);
    return tokensOf(css.slice(start, css.indexOf('}', start)));
  };
  const day = block(':root');
  return {
    day,
    night: { ...day, ...block(':root[data-scheme="night"]') },
    systemNight: { ...day, ...block(':root:not([data-scheme="day"])') },
  };
}

describe('the measure', () => {
  it.each(wcag.cases)('$fg on $bg is $ratio', ({ fg, bg, ratio }) => {
    expect(Math.abs(contrast(fg, bg) - ratio)).toBeLessThan(5e-4);
  });
});

describe('colours of the page', () => {
  const grounds = ['paper', 'sheet'];
  const inks = ['ink', 'ink-soft', 'signal', 'error', 'warning', 'info'];
  const pairs = Object.entries(schemes()).flatMap(([scheme, tokens]) =>
    inks.flatMap((ink) => grounds.map((ground) => [scheme, ink, ground, tokens] as const)),
  );

  it.each(pairs)('%s: %s can be read on %s', (_, ink, ground, tokens) => {
    expect(contrast(tokens[ink] ?? '', tokens[ground] ?? '')).toBeGreaterThanOrEqual(TEXT_RATIO);
  });

  it('are the same at night, whether the switch or the system chose it', () => {
    const { night, systemNight, day } = schemes();
    expect(systemNight).toEqual(night);
    expect(Object.keys(night)).toEqual(Object.keys(day));
  });

  /**
   * Sides are thin lines, never text, and are drawn over a casing in ink: alone, sky blue and orange are too light on
   * paper, so the casing is measured in their place. Sides differ in dashes too, not in colour alone.
   */
  it('of the sides are those of Okabe and Ito in both schemes, within a casing that can be seen', () => {
    for (const tokens of Object.values(schemes())) {
      expect(tokens.left?.toLowerCase()).toBe(palette.sky_blue?.toLowerCase());
      expect(tokens.right?.toLowerCase()).toBe(palette.orange?.toLowerCase());
      expect(tokens.centre?.toLowerCase()).toBe(palette.bluish_green?.toLowerCase());
      const visible = wcag.thresholds['1.4.11 non-text AA'] as number;
      expect(contrast(tokens.ink ?? '', tokens.sheet ?? '')).toBeGreaterThanOrEqual(visible);
    }
  });
});
