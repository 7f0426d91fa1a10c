import { parseArgs } from 'node:util';
import { nearest } from '../../core/steel/nearest.ts';

type Kind = 'boolean' | 'string';

interface Command {
  readonly options: Readonly<Record<string, Kind>>;
  /** Most files that it takes. */
  readonly files: number;
}

const commands = {
  check: { options: { working: 'boolean', json: 'boolean', ndjson: 'boolean' }, files: 1 },
  sheet: { options: { output: 'string', workings: 'string' }, files: 1 },
  card: {
    options: { family: 'string', sections: 'string', rows: 'string', output: 'string', json: 'boolean' },
    files: 1,
  },
  standards: { options: {}, files: 1 },
  serve: { options: { port: 'string', host: 'string' }, files: 0 },
  help: { options: {}, files: 1 },
} as const satisfies Readonly<Record<string, Command>>;

export type CommandName = keyof typeof commands;

/** What was asked for: a command, the file it names, and its options. */
export interface Asked {
  readonly command: CommandName | 'version';
  readonly file: string | undefined;
  readonly flags: ReadonlySet<string>;
  readonly values: Readonly<Record<string, string>>;
}

/** Why the arguments cannot be followed, in one sentence. */
export interface NotUnderstood {
  readonly sentence: string;
}

const unknown = (what: string, known: readonly string[]): NotUnderstood => {
  const [closest] = nearest(what, known, 1);
  return { sentence: `${what} is not known here; ${closest ? `nearest: ${closest}` : `known: ${known.join(', ')}`}.` };
};

const isCommand = (name: string): name is CommandName => Object.hasOwn(commands, name);

/** Reads the arguments of the command line, which name a command first. */
export const readArguments = (args: readonly string[]): Asked | NotUnderstood => {
  const [first = 'help', ...rest] = args;
  if (first === '--version' || first === '-v')
    return { command: 'version', file: undefined, flags: new Set(), values: {} };
  const name = first === '--help' || first === '-h' ? 'help' : first;
  if (!isCommand(name)) return unknown(first, [...Object.keys(commands), '--help', '--version']);
  return readOptions(name, commands[name], rest);
};

const readOptions = (
  command: CommandName,
  { options, files }: Command,
  rest: readonly string[],
): Asked | NotUnderstood => {
  const spec = Object.fromEntries(
    Object.entries(options).map(([name, type]) => [name, { type, ...(name === 'output' && { short: 'o' }) }]),
  );
  const { tokens } = parseArgs({ args: [...rest], options: spec, strict: false, allowPositionals: true, tokens: true });
  const flags = new Set<string>();
  const values: Record<string, string> = {};
  const given: string[] = [];
  for (const token of tokens) {
    if (token.kind === 'positional') given.push(token.value);
    if (token.kind !== 'option') continue;
    if (token.name === 'help' || token.name === 'h') return { command: 'help', file: undefined, flags, values };
    const kind = Object.hasOwn(options, token.name) ? options[token.name] : undefined;
    if (!kind)
      return unknown(
        token.rawName,
        Object.keys(options).map((one) => `--${one}`),
      );
    if (kind === 'boolean' && token.value !== undefined) return { sentence: `${token.rawName} takes no value.` };
    if (kind === 'boolean') flags.add(token.name);
    else if (token.value === undefined) return { sentence: `${token.rawName} needs a value.` };
    else values[token.name] = token.value;
  }
  if (given.length > files)
    return { sentence: `${given[files]} is one too many; ${command} takes ${files === 0 ? 'no file' : 'one file'}.` };
  return { command, file: given[0], flags, values };
};
