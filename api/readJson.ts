import { type Fault, fault } from '../core/end/fault.ts';

const decoder = new TextDecoder('utf-8', { fatal: true });

/** Names given in the text, as the colons outside strings count them. */
const namesWritten = (text: string): number => {
  let count = 0;
  let quoted = false;
  for (let at = 0; at < text.length; at += 1) {
    const code = text.charCodeAt(at);
    if (quoted) {
      if (code === 0x5c) at += 1;
      else if (code === 0x22) quoted = false;
    } else if (code === 0x22) quoted = true;
    else if (code === 0x3a) count += 1;
  }
  return count;
};

/** No length, force or strength of a beam end comes near these in any unit; past them, products overflow or vanish. Zero is a number. */
const LARGEST = 1e12;
const LEAST = 1e-9;

const isRefused = (name: string): boolean => name === '__proto__';

const sizeFault = (value: number, path: string, given: unknown): Fault | undefined => {
  const size = Math.abs(value);
  if (size > LARGEST) return fault('too-big', path, given, { most: LARGEST });
  return size > 0 && size < LEAST ? fault('too-small', path, given, { least: LEAST }) : undefined;
};

/**
 * Names that the parsed value holds; a name given twice is held once. Undefined where it holds something that no end may. Not recursive:
 * nesting has no bound here.
 */
const namesHeld = (value: unknown): number | undefined => {
  let count = 0;
  const open: unknown[] = [value];
  while (open.length > 0) {
    const one = open.pop();
    if (typeof one === 'number' && sizeFault(one, '', null)) return undefined;
    if (typeof one !== 'object' || one === null) continue;
    if (Object.hasOwn(one, '__proto__')) return undefined;
    const held = Object.values(one);
    if (!Array.isArray(one)) count += held.length;
    for (const inner of held) if (typeof inner === 'object' || typeof inner === 'number') open.push(inner);
  }
  return count;
};

const tokens = /"(?:[^"\\]|\\.)*"|[{}[\],]|-?\d[\d.eE+-]*/gsu;

interface Level {
  /** Names met so far; undefined in a list. */
  readonly names: Set<string> | undefined;
  readonly path: string;
  /** The next string is a name. */
  naming: boolean;
  last: string;
}

/** Follows the text of a JSON value to the first thing in it that no end may hold. */
class Refusal {
  private readonly levels: Level[] = [];

  find(text: string): Fault {
    for (const [token] of text.matchAll(tokens)) {
      const found = this.step(token);
      if (found) return found;
    }
    return fault('repeated-field', '', null, null);
  }

  /** No longer than a person reads. */
  private get path(): string {
    const level = this.levels.at(-1);
    const whole = level?.names && level.path ? `${level.path}.${level.last}` : level?.path || level?.last;
    return (whole ?? '').slice(0, 200);
  }

  private step(token: string): Fault | undefined {
    const level = this.levels.at(-1);
    if (token === '{' || token === '[') {
      const names = token === '{' ? new Set<string>() : undefined;
      this.levels.push({ names, path: this.path, naming: token === '{', last: '' });
    } else if (token === '}' || token === ']') this.levels.pop();
    else if (token === ',') {
      if (level?.names) level.naming = true;
    } else if (token.startsWith('"')) {
      return level?.names && level.naming ? this.name(level.names, level, JSON.parse(token)) : undefined;
    } else return sizeFault(Number(token), this.path, token.slice(0, 20));
    return undefined;
  }

  private name(names: Set<string>, level: Level, name: string): Fault | undefined {
    level.naming = false;
    level.last = name;
    if (isRefused(name)) return fault('unknown-field', this.path, null, null);
    if (names.has(name)) return fault('repeated-field', this.path, null, null);
    names.add(name);
    return undefined;
  }
}

/** Start of a text, short enough to be repeated in a sentence. */
const start = (text: string): string => (text.length > 40 ? `${text.slice(0, 40)}…` : text);

/**
 * Reads JSON text. A name that an object gives twice is a fault: readers differ in which of the two they take, and nobody can tell which
 * was meant. So is a number past all bounds, and a name that validators pass over.
 */
export const readJson = (bytes: Uint8Array): { readonly value: unknown } | { readonly fault: Fault } => {
  let text: string;
  try {
    text = decoder.decode(bytes);
  } catch {
    return { fault: fault('not-json', '', 'not UTF-8', null) };
  }
  let value: unknown;
  try {
    value = JSON.parse(text);
  } catch {
    return { fault: fault(text.trim() === '' ? 'not-an-end' : 'not-json', '', start(text), null) };
  }
  if (namesWritten(text) === namesHeld(value)) return { value };
  return { fault: new Refusal().find(text) };
};
