import { mkdirSync, mkdtempSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { brotliDecompressSync, gunzipSync } from 'node:zlib';
import { afterAll, describe, expect, test } from 'vitest';
import { createApp } from '../../api/app.ts';

const folder = mkdtempSync(join(tmpdir(), 'copewright-'));
const web = join(folder, 'web');
mkdirSync(join(web, 'assets'), { recursive: true });
const page = '<!doctype html><title>Bench</title>'.padEnd(2000);
writeFileSync(join(web, 'index.html'), page);
writeFileSync(join(web, 'sw.js'), 'self');
writeFileSync(join(web, 'assets', 'index-Ab3_-9xZ.js'), 'export {};');
writeFileSync(join(web, 'assets', 'face-0123abcd.woff2'), 'face');
writeFileSync(join(folder, 'secret.txt'), 'secret');
symlinkSync(join(folder, 'secret.txt'), join(web, 'linked.txt'));
const app = createApp({ web });

afterAll(() => rmSync(folder, { recursive: true }));

describe('the built bench', () => {
  test('is served at the root, looked at anew each time', async () => {
    const response = await app.request('/');
    expect(await response.text()).toBe(page);
    expect(response.headers.get('content-type')).toBe('text/html; charset=utf-8');
    for (const path of ['/', '/index.html', '/sw.js']) {
      expect((await app.request(path)).headers.get('cache-control')).toBe('no-cache');
    }
  });

  test('its hashed files are kept for good', async () => {
    const response = await app.request('/assets/index-Ab3_-9xZ.js');
    expect(response.headers.get('cache-control')).toBe('public, max-age=31536000, immutable');
    expect(response.headers.get('content-type')).toBe('text/javascript; charset=utf-8');
    expect(response.headers.get('content-security-policy')).toContain("script-src 'self'");
  });

  test('a page that has not changed is not sent again', async () => {
    const tag = (await app.request('/')).headers.get('etag') ?? '';
    const response = await app.request('/', { headers: { 'if-none-match': tag } });
    expect([response.status, await response.text()]).toEqual([304, '']);
  });

  test.each([
    ['gzip, br', 'br', brotliDecompressSync],
    ['gzip, deflate', 'gzip', gunzipSync],
  ])('text is packed for those who take %s, a font is not', async (accepted, name, unpack) => {
    const headers = { 'accept-encoding': accepted };
    const response = await app.request('/', { headers });
    expect(response.headers.get('content-encoding')).toBe(name);
    expect(response.headers.get('vary')).toBe('Accept-Encoding');
    expect(unpack(Buffer.from(await response.arrayBuffer())).toString()).toBe(page);
    const font = await app.request('/assets/face-0123abcd.woff2', { headers });
    expect([font.headers.get('content-encoding'), await font.text()]).toEqual([null, 'face']);
  });

  test('nothing outside its folder is given out, not through a link either', async () => {
    for (const path of [
      '/linked.txt',
      '/../secret.txt',
      '/%2e%2e/secret.txt',
      '/..%2fsecret.txt',
      '/assets',
      '/assets/',
    ]) {
      expect((await app.request(path)).status, path).toBe(404);
    }
  });

  test('its files are only read', async () => {
    const response = await app.request('/', { method: 'POST' });
    expect([response.status, response.headers.get('allow')]).toEqual([405, 'GET, HEAD']);
    const head = await app.request('/', { method: 'HEAD' });
    expect([head.status, await head.text()]).toEqual([200, '']);
  });

  test('the API stands beside it', async () => {
    expect((await app.request('/v1/standards')).status).toBe(200);
  });
});
