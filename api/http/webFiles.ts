import { createHash } from 'node:crypto';
import { readdirSync, readFileSync } from 'node:fs';
import { extname, join, sep } from 'node:path';
import { brotliCompressSync, gzipSync } from 'node:zlib';
import { reply } from './reply.ts';

const types: Readonly<Record<string, string>> = {
  '.html': 'text/html; charset=utf-8',
  '.js': 'text/javascript; charset=utf-8',
  '.css': 'text/css; charset=utf-8',
  '.json': 'application/json',
  '.webmanifest': 'application/manifest+json',
  '.svg': 'image/svg+xml',
  '.png': 'image/png',
  '.ico': 'image/x-icon',
  '.woff2': 'font/woff2',
  '.txt': 'text/plain; charset=utf-8',
};

/** Kinds that are already packed gain nothing from being packed again. */
const packed = /^(?:image\/png|image\/x-icon|font\/woff2)$/;
/** A name that changes with its content, so that the content under it never does. */
const hashed = /^\/assets\/.+-[\w-]{8}\.\w+$/;

interface WebFile {
  readonly bytes: Uint8Array<ArrayBuffer>;
  readonly headers: Readonly<Record<string, string>>;
  readonly type: string;
  /** Packed copies, each made at its first request. */
  readonly packings: Map<string, Uint8Array<ArrayBuffer>>;
}

const load = (path: string, at: string): WebFile => {
  const bytes = new Uint8Array(readFileSync(path));
  const type = types[extname(path)] ?? 'application/octet-stream';
  return {
    bytes,
    type,
    packings: new Map(),
    headers: {
      ETag: `W/"${createHash('sha256').update(bytes).digest('hex').slice(0, 16)}"`,
      'Cache-Control': hashed.test(at) ? 'public, max-age=31536000, immutable' : 'no-cache',
      ...(!packed.test(type) && { Vary: 'Accept-Encoding' }),
    },
  };
};

/** Ways of packing, the tightest first. */
const packers = [
  ['br', brotliCompressSync],
  ['gzip', gzipSync],
] as const;

const answer = (file: WebFile, request: Request): Response => {
  const { headers, type, bytes, packings } = file;
  if (request.headers.get('if-none-match') === headers.ETag) return reply(304, null, undefined, headers);
  const taken = request.headers.get('accept-encoding') ?? '';
  const packer = packed.test(type) ? undefined : packers.find(([name]) => new RegExp(`\\b${name}\\b`).test(taken));
  if (!packer) return reply(200, bytes, type, headers);
  const [name, pack] = packer;
  let body = packings.get(name);
  if (!body) {
    body = new Uint8Array(pack(bytes));
    packings.set(name, body);
  }
  return reply(200, body, type, { ...headers, 'Content-Encoding': name });
};

/**
 * The files of a folder, read once, by the path under which the browser asks for them. Only these are ever given out, so no path can
 * lead anywhere else.
 */
export const webFiles = (folder: string): ((path: string, request: Request) => Response | undefined) => {
  const files = new Map<string, WebFile>();
  for (const entry of readdirSync(folder, { recursive: true, withFileTypes: true })) {
    if (!entry.isFile()) continue;
    const path = join(entry.parentPath, entry.name);
    const at = path.slice(join(folder, sep).length - 1).replaceAll(sep, '/');
    const file = load(path, at);
    files.set(at, file);
    if (at.endsWith('/index.html')) files.set(at.slice(0, -'index.html'.length), file);
  }
  return (path, request) => {
    const file = files.get(path);
    return file && answer(file, request);
  };
};
