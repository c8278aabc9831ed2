/**
 * An adapter skeleton for Slipway 1. It reads a script, refuses what is altered or cut short before the first step, and
 * then makes one call of its host for each line, in order. Write a host for your program; the calls are listed below.
 * Copy this file, translate it, change it: the meaning of every step is in the Slipway reference.
 *
 * A host is an object with these methods. Names are unique in the scene; every name that a call gets was made by an
 * earlier one. `values` holds the keys of the line: numbers, texts, lists, true or false, `{control, attribute}` for an
 * attribute in place of a number, and null for a key that was left out and for `parent=none`.
 *
 *   scene(name, values)         open a scene: up, forward, unit, and where the script came from
 *   node(kind, name, values)    make a group, joint, control, note, line or geometry under values.parent, at rest
 *                               transform values.at, values.turn (x y z w)
 *   attribute(control, values)  add a number: name, default, min, max, labels, note
 *   limit(node, values)         limit a channel of a control; say how far a joint is meant to turn
 *   lock(control, values)       lock channels at rest
 *   show(node, values)          hide a node or make it unselectable
 *   entry(note, values)         add a note: key, value
 *   constrain(name, values)     make a node follow others
 *   space(name, values)         let an attribute choose what carries a control
 *   drive(name, values)         add to a channel what a curve makes of an attribute or channel
 *   solve(kind, name, values)   two_bone, reach, spline, twist, aim or foot_roll
 *   skin(name, values)          bind a mesh to joints
 *   shape(name, values)         weigh a morph target
 *   done()                      everything is made: evaluate, draw, report
 */

/** What a script may be refused for, with the line it stands on. */
export class Refused extends Error {
  constructor(line, reason) {
    super(`line ${line}: ${reason}`);
    this.line = line;
  }
}

const NODES = new Set(['group', 'joint', 'control', 'note', 'line', 'geometry']);
const SOLVERS = new Set(['two_bone', 'reach', 'spline', 'twist', 'aim', 'foot_roll']);
const DETAILS = { attr: 'attribute', limit: 'limit', lock: 'lock', show: 'show', entry: 'entry' };
const LINKS = new Set(['constrain', 'space', 'drive', 'skin', 'shape']);

/** Keys that may be left out; a host sees null for them. */
const OPTIONAL = {
  attr: ['min', 'max', 'labels', 'note'],
  limit: ['min', 'max'],
  constrain: ['blend', 'axis', 'up_axis', 'up'],
  aim: ['pole'],
};

const WORD = /[+-]?[A-Za-z][A-Za-z0-9_]*/y;
const NUMBER = /-?(?:0|[1-9][0-9]*)(?:\.[0-9]+)?(?:[eE][+-]?[0-9]+)?/y;
const STRING = /"(?:[^"\\]|\\.)*"/y;

/** Reads one line from left to right by the grammar. */
class LineReader {
  constructor(text, line) {
    this.text = text;
    this.line = line;
    this.at = 0;
  }

  refuse(reason) {
    throw new Refused(this.line, `${reason} at column ${this.at + 1}`);
  }

  match(pattern) {
    pattern.lastIndex = this.at;
    const found = pattern.exec(this.text)?.[0];
    if (found !== undefined) this.at += found.length;
    return found;
  }

  expect(text) {
    if (!this.text.startsWith(text, this.at)) this.refuse(`${JSON.stringify(text)} is expected`);
    this.at += text.length;
  }

  word() {
    return this.match(WORD) ?? this.refuse('a word is expected');
  }

  string() {
    const found = this.match(STRING) ?? this.refuse('a text in quotes is expected');
    try {
      return JSON.parse(found);
    } catch {
      return this.refuse('a text in quotes as JSON writes it is expected');
    }
  }

  /** A text, a number, or a word; `true` and `false` are flags, `none` is no parent. */
  scalar() {
    if (this.text[this.at] === '"') return this.string();
    const number = this.match(NUMBER);
    if (number !== undefined) {
      const value = Number(number);
      return Number.isFinite(value) ? value : this.refuse('a number that a double can hold is expected');
    }
    const word = this.word();
    return word === 'true' ? true : word === 'false' ? false : word === 'none' ? null : word;
  }

  list() {
    const items = [];
    this.expect('(');
    while (this.text[this.at] !== ')') {
      if (items.length > 0) this.expect(' ');
      items.push(this.scalar());
    }
    this.expect(')');
    return items;
  }

  value() {
    if (this.text[this.at] === '(') return this.list();
    if (!this.text.startsWith('attr(', this.at)) return this.scalar();
    this.expect('attr(');
    const control = this.string();
    this.expect(' ');
    const attribute = this.string();
    this.expect(')');
    return { control, attribute };
  }

  /** verb "name" key=value … */
  step() {
    const verb = this.word();
    this.expect(' ');
    const name = this.string();
    const values = Object.create(null);
    for (const key of OPTIONAL[verb] ?? []) values[key] = null;
    const seen = new Set();
    while (this.at < this.text.length) {
      this.expect(' ');
      const key = this.word();
      if (seen.has(key)) this.refuse(`the key "${key}" stands twice`);
      seen.add(key);
      this.expect('=');
      values[key] = this.value();
    }
    return { verb, name, values };
  }
}

/** SHA-256 of bytes in lower-case hexadecimal, by the Web Crypto of the platform. */
async function sha256Hex(bytes) {
  const digest = new Uint8Array(await globalThis.crypto.subtle.digest('SHA-256', bytes));
  return Array.from(digest, (byte) => byte.toString(16).padStart(2, '0')).join('');
}

/** Checks the first and the last line; gives the lines between. Nothing is carried out before. */
async function openSeal(text) {
  if (!text.startsWith('slipway 1\n')) throw new Refused(1, 'this is no script in Slipway 1');
  const body = text.slice(0, text.lastIndexOf('\n', text.length - 2) + 1);
  const end = /^end steps=(0|[1-9][0-9]*) sha256="([0-9a-f]{64})"\n$/.exec(text.slice(body.length));
  const lines = body.split('\n').slice(0, -1);
  if (end === null) throw new Refused(lines.length + 1, 'the last line is missing: the script was cut short');
  if (Number(end[1]) !== lines.length) throw new Refused(lines.length + 1, 'lines are missing or were added');
  if (end[2] !== (await sha256Hex(new TextEncoder().encode(body)))) {
    throw new Refused(lines.length + 1, 'the script was altered');
  }
  return lines.slice(1);
}

/** Makes the one call of the host that a step stands for. */
function carryOut(host, { verb, name, values }, line) {
  if (NODES.has(verb)) host.node(verb, name, values);
  else if (Object.hasOwn(DETAILS, verb)) host[DETAILS[verb]](name, values);
  else if (SOLVERS.has(verb)) host.solve(verb, name, values);
  else if (LINKS.has(verb)) host[verb](name, values);
  else throw new Refused(line, `there is no verb "${verb}"`);
}

/**
 * Carries out a script on a host. Throws `Refused` before the first step when the script is not whole, and at a line
 * that is none; a host that can undo should then take back what it made.
 */
export async function build(text, host) {
  const lines = await openSeal(text);
  const made = new Set();
  lines.forEach((line, index) => {
    const number = index + 2;
    const step = new LineReader(line, number).step();
    if ((step.verb === 'scene') !== (index === 0))
      throw new Refused(number, 'the second line is the only "scene"');
    if (step.verb === 'scene') {
      host.scene(step.name, step.values);
      return;
    }
    const isDetail = Object.hasOwn(DETAILS, step.verb);
    if (made.has(step.name) !== isDetail) {
      throw new Refused(number, isDetail ? `"${step.name}" was not made before` : `"${step.name}" is taken`);
    }
    made.add(step.name);
    carryOut(host, step, number);
  });
  host.done();
}
