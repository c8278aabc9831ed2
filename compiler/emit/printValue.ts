import type { NumberOrAttribute } from '../rig/Rig';
import type { KeyKind, ValueKinds } from '../slipway/verbs';
import { printNumber } from './printNumber';
import { printString } from './printString';

type Printers = { readonly [K in keyof ValueKinds]: (value: ValueKinds[K]) => string };

function printNumbers(values: readonly number[]): string {
  return `(${values.map(printNumber).join(' ')})`;
}

function printAmount(value: NumberOrAttribute): string {
  if (typeof value === 'number') return printNumber(value);
  return `attr(${printString(value.control)} ${printString(value.attribute)})`;
}

function printScalar(value: string | number | boolean): string {
  if (typeof value === 'string') return printString(value);
  return typeof value === 'number' ? printNumber(value) : String(value);
}

const PRINTERS: Printers = {
  text: printString,
  number: printNumber,
  flag: String,
  reference: printString,
  references: (names) => `(${names.map(printString).join(' ')})`,
  parent: (name) => (name === null ? 'none' : printString(name)),
  vector: printNumbers,
  quaternion: printNumbers,
  weights: printNumbers,
  numbers: printNumbers,
  texts: (texts) => `(${texts.map(printString).join(' ')})`,
  channels: (names) => `(${names.join(' ')})`,
  blend: printAmount,
  amount: printAmount,
  scalar: printScalar,
};

/** The text of one value in the notation of its kind; the only way a value of a rig gets into a script. */
export function printValue(kind: KeyKind, value: unknown): string {
  // Kind and value come from one typed step, whose type was made from the same table.
  return typeof kind === 'string' ? (PRINTERS[kind] as (value: unknown) => string)(value) : String(value);
}
