import { createReadStream } from 'node:fs';

/** The bytes of a file, or of standard input for `-`, as they come. */
export const open = (file: string): AsyncIterable<Uint8Array> =>
  file === '-' ? process.stdin : createReadStream(file);

/** All of it, but no more than `most` bytes and one, so that it can still be seen to be too large. */
export const readWhole = async (file: string, most: number): Promise<Uint8Array> => {
  const parts: Uint8Array[] = [];
  let length = 0;
  for await (const part of open(file)) {
    parts.push(part);
    length += part.length;
    if (length > most) break;
  }
  return Buffer.concat(parts).subarray(0, most + 1);
};

const reasons: Readonly<Record<string, string>> = {
  ENOENT: 'is not there',
  EISDIR: 'is a folder',
  EACCES: 'may not be read or written by you',
  ENOSPC: 'has no room left',
  ENOTDIR: 'is not there',
  EROFS: 'cannot be written to',
};

/** Why a file could not be used, in a sentence. */
export const fileSentence = (file: string, error: unknown): string => {
  const code = (error as NodeJS.ErrnoException | null)?.code;
  if (code === undefined) throw error;
  return `${file} ${reasons[code] ?? `could not be used (${code})`}.`;
};
