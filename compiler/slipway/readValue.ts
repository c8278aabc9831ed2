import type { Channel, NumberOrAttribute } from '../rig/Rig';
import type { Value } from './Value';
import { CHANNEL_NAMES, type KeyKind, type ValueKinds } from './verbs';

/** Undefined where the value is not of the kind. */
type Readers = { readonly [K in keyof ValueKinds]: (value: Value) => ValueKinds[K] | undefined };

function readText(value: Value): string | undefined {
  return value.kind === 'string' ? value.value : undefined;
}

function readNumber(value: Value): number | undefined {
  return value.kind === 'number' ? value.value : undefined;
}

function readFlag(value: Value): boolean | undefined {
  return value.kind === 'word' && (value.value === 'true' || value.value === 'false')
    ? value.value === 'true'
    : undefined;
}

function readList<T>(value: Value, readItem: (item: Value) => T | undefined): T[] | undefined {
  if (value.kind !== 'list') return undefined;
  const items: T[] = [];
  for (const item of value.items) {
    const read = readItem(item);
    if (read === undefined) return undefined;
    items.push(read);
  }
  return items;
}

function readNumbers(value: Value, count: number): number[] | undefined {
  const numbers = readList(value, readNumber);
  return numbers?.length === count ? numbers : undefined;
}

function readChannel(value: Value): Channel | undefined {
  return value.kind === 'word' ? CHANNEL_NAMES.find((channel) => channel === value.value) : undefined;
}

function readAmount(value: Value): NumberOrAttribute | undefined {
  if (value.kind !== 'attribute') return readNumber(value);
  const control = readText(value.control);
  const attribute = readText(value.attribute);
  return control === undefined || attribute === undefined ? undefined : { control, attribute };
}

const READERS: Readers = {
  text: readText,
  number: readNumber,
  flag: readFlag,
  reference: readText,
  references: (value) => readList(value, readText),
  parent: (value) => (value.kind === 'word' && value.value === 'none' ? null : readText(value)),
  vector: (value) => readNumbers(value, 3) as ValueKinds['vector'] | undefined,
  quaternion: (value) => readNumbers(value, 4) as ValueKinds['quaternion'] | undefined,
  weights: (value) => readList(value, readNumber),
  numbers: (value) => readList(value, readNumber),
  texts: (value) => readList(value, readText),
  channels: (value) => readList(value, readChannel),
  blend: readAmount,
  amount: readAmount,
  scalar: (value) => readText(value) ?? readNumber(value) ?? readFlag(value),
};

const DESCRIPTIONS: { readonly [K in keyof ValueKinds]: string } = {
  text: 'a text in quotes',
  number: 'a number',
  flag: 'true or false',
  reference: 'a name in quotes',
  references: 'names in quotes between parentheses',
  parent: 'a name in quotes or none',
  vector: 'three numbers in parentheses',
  quaternion: 'four numbers in parentheses',
  weights: 'numbers in parentheses',
  numbers: 'numbers in parentheses',
  texts: 'texts in quotes between parentheses',
  channels: 'channels in parentheses',
  blend: 'a number or attr("control" "attribute")',
  amount: 'a number or attr("control" "attribute")',
  scalar: 'a text in quotes, a number, true or false',
};

/** What a value must be, in words, for findings and the reference. */
export function describeKind(kind: KeyKind): string {
  return typeof kind === 'string' ? DESCRIPTIONS[kind] : `one of ${kind.join(', ')}`;
}

/** The value as its kind asks, or undefined when it is something else. */
export function readValue(kind: KeyKind, value: Value): unknown {
  if (typeof kind === 'string') return READERS[kind](value);
  return value.kind === 'word' && kind.includes(value.value) ? value.value : undefined;
}
