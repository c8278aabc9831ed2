import type { ControlChart } from './controlChart';

/** Characters that make a spreadsheet take a cell for a formula (OWASP, CSV injection; list from memory). */
const FORMULA_START = /^[=+\-@\t\r\n＝＋－＠]/;

/** A cell of text: quoted where it must be, and with an apostrophe before what a spreadsheet would work out. */
function textCell(text: string): string {
  const safe = FORMULA_START.test(text) ? `'${text}` : text;
  return /[",\r\n]/.test(safe) || safe !== text ? `"${safe.replaceAll('"', '""')}"` : safe;
}

function numberCell(value: number | null): string {
  return value === null ? '' : String(value);
}

const HEAD = [
  'number',
  'id',
  'name',
  'side',
  'steers',
  'value',
  'unit',
  'default',
  'min',
  'max',
  'choices',
  'note',
];

/** The chart as CSV (RFC 4180, UTF-8, CRLF): one line for each value of each control. */
export function chartCsv({ entries }: ControlChart): string {
  const lines = entries.flatMap(({ number, id, name, side, steers, values }) =>
    values.map((value) =>
      [
        numberCell(number),
        textCell(id),
        textCell(name),
        textCell(side),
        textCell(steers.join(' ')),
        textCell(value.name),
        textCell(value.unit),
        numberCell(value.default),
        numberCell(value.min),
        numberCell(value.max),
        textCell((value.choices ?? []).join(' | ')),
        textCell(value.note ?? ''),
      ].join(','),
    ),
  );
  return `${[HEAD.join(','), ...lines].join('\r\n')}\r\n`;
}
