import { VERSION } from '../core/check/version.ts';
import { type Asked, readArguments } from './terminal/arguments.ts';
import { checkCommand } from './terminal/checkCommand.ts';
import { help } from './terminal/help.ts';
import { complain, endWithReader, HOLDS, print } from './terminal/output.ts';

const said = async (text: string): Promise<number> => {
  await print(text);
  return HOLDS;
};

const follow = async (asked: Asked): Promise<number> => {
  switch (asked.command) {
    case 'check':
      return checkCommand(asked);
    case 'sheet':
      return (await import('./terminal/sheetCommand.ts')).sheetCommand(asked);
    case 'card':
      return (await import('./terminal/cardCommand.ts')).cardCommand(asked);
    case 'serve':
      return (await import('./terminal/serveCommand.ts')).serveCommand(asked);
    case 'standards':
      return (await import('./terminal/standardsCommand.ts')).standardsCommand(asked);
    case 'version':
      return said(`${VERSION}\n`);
    case 'help':
      return said(help);
  }
};

/** Follows the arguments of the command line and leaves the exit status behind. */
export const cli = async (args: readonly string[]): Promise<void> => {
  endWithReader();
  const asked = readArguments(args);
  process.exitCode = 'sentence' in asked ? complain(asked.sentence) : await follow(asked);
};
