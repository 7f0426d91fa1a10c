const NEWLINE = 0x0a;
/** Lines handed on at a time: little enough that nothing else waits long. */
const BATCH = 32;

const joined = (parts: readonly Uint8Array[]): Uint8Array => {
  if (parts.length === 1) return parts[0]!;
  const whole = new Uint8Array(parts.reduce((sum, { length }) => sum + length, 0));
  let at = 0;
  for (const part of parts) {
    whole.set(part, at);
    at += part.length;
  }
  return whole;
};

/**
 * The lines of a stream of bytes, in small batches as they come, without their line ends. What follows the last line end is a line unless it
 * is empty. Of a line longer than `most` bytes no more than that and one is kept, so that it can still be seen to be too long.
 */
export async function* linesOf(
  chunks: AsyncIterable<Uint8Array> | Iterable<Uint8Array>,
  most: number,
): AsyncGenerator<readonly Uint8Array[]> {
  let parts: Uint8Array[] = [];
  let length = 0;
  const keep = (part: Uint8Array): void => {
    const kept = part.subarray(0, Math.max(0, most + 1 - length));
    if (kept.length > 0) parts.push(kept);
    length += kept.length;
  };
  for await (const chunk of chunks) {
    let lines: Uint8Array[] = [];
    let from = 0;
    for (let to = chunk.indexOf(NEWLINE); to >= 0; to = chunk.indexOf(NEWLINE, from)) {
      keep(chunk.subarray(from, to));
      lines.push(joined(parts));
      parts = [];
      length = 0;
      from = to + 1;
      if (lines.length < BATCH) continue;
      yield lines;
      lines = [];
    }
    // The stream may use its buffer again.
    keep(chunk.slice(from));
    if (lines.length > 0) yield lines;
  }
  if (length > 0) yield [joined(parts)];
}
