/** On every reply: the page may load only what this server holds, nothing may frame it, no address leaks. */
const guards = {
  'Content-Security-Policy': [
    "default-src 'none'",
    "script-src 'self'",
    "style-src 'self'",
    "img-src 'self' data: blob:",
    "font-src 'self'",
    "connect-src 'self'",
    "worker-src 'self'",
    "manifest-src 'self'",
    "base-uri 'none'",
    "form-action 'none'",
    "frame-ancestors 'none'",
  ].join('; '),
  'X-Content-Type-Options': 'nosniff',
  'Referrer-Policy': 'no-referrer',
  'Cross-Origin-Opener-Policy': 'same-origin',
  'Cross-Origin-Resource-Policy': 'same-origin',
} as const;

type Body = string | Uint8Array<ArrayBuffer> | ReadableStream<Uint8Array> | null;

/** A reply with its guards; headers stay a plain record, which the server writes out as it is. */
export const reply = (
  status: number,
  body: Body,
  type: string | undefined,
  more: Readonly<Record<string, string>> = {},
): Response => new Response(body, { status, headers: { ...guards, ...(type && { 'Content-Type': type }), ...more } });

/** Computed anew for each request, so never to be kept. */
const fresh = { 'Cache-Control': 'no-store' } as const;

/** JSON that is written already. */
export const writtenJson = (text: string | Uint8Array<ArrayBuffer>): Response =>
  reply(200, text, 'application/json', fresh);

export const json = (value: unknown): Response => writtenJson(JSON.stringify(value));

export const pdf = (bytes: Uint8Array<ArrayBuffer>, name: string): Response =>
  reply(200, bytes, 'application/pdf', { ...fresh, 'Content-Disposition': `inline; filename="${name}"` });

export const lines = (stream: ReadableStream<Uint8Array>): Response =>
  reply(200, stream, 'application/x-ndjson', fresh);
