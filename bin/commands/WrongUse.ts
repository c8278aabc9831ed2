/** The command was called in a way it does not have; the message says what is wrong. */
export class WrongUse extends Error {
  override readonly name = 'WrongUse';
}
