import { type ParseArgsConfig, parseArgs } from 'node:util';
import { WrongUse } from './WrongUse';

type Options = NonNullable<ParseArgsConfig['options']>;

/** Reads options and file names; an unknown option or a missing value is a wrong use. */
export function readParameters<const O extends Options>(parameters: readonly string[], options: O) {
  try {
    return parseArgs({ args: [...parameters], options, allowPositionals: true, strict: true });
  } catch (error) {
    throw new WrongUse(error instanceof Error ? error.message : String(error));
  }
}
