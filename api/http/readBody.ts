import { problem, tooLarge } from './problem.ts';

/** The body of a request, or the answer to one that is larger than `most` bytes, whatever its headers say, or that breaks off. */
export const readBody = async (request: Request, most: number): Promise<Uint8Array | Response> => {
  const length = request.headers.get('content-length');
  if (length !== null && !(Number(length) <= most)) return tooLarge(most);
  try {
    const bytes = length === null ? await streamed(request.body, most) : new Uint8Array(await request.arrayBuffer());
    return bytes.length > most ? tooLarge(most) : bytes;
  } catch {
    return problem(400, 'The body broke off before its end.');
  }
};

/** Reads no further than one piece past the limit. */
const streamed = async (body: ReadableStream<Uint8Array> | null, most: number): Promise<Uint8Array> => {
  const parts: Uint8Array[] = [];
  let length = 0;
  const reader = body?.getReader();
  for (let read = await reader?.read(); read && !read.done; read = await reader?.read()) {
    parts.push(read.value);
    length += read.value.length;
    if (length > most) await reader?.cancel();
  }
  return Buffer.concat(parts);
};
