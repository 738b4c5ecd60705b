import { mkdir, mkdtemp, rm, writeFile } from 'node:fs/promises';
import { request, type OutgoingHttpHeaders } from 'node:http';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { brotliCompressSync, brotliDecompressSync, gzipSync } from 'node:zlib';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { startTestApp, type TestApp } from '#api/testing/test-app.ts';

const script = 'export const answer = 42;\n'.repeat(100);
const page = '<!doctype html><title>Oxbow Lane</title>';
let app: TestApp;
let folder: string;

beforeAll(async () => {
  folder = await mkdtemp(path.join(tmpdir(), 'tierwell-client-'));
  await mkdir(path.join(folder, 'assets'));
  await writeFile(path.join(folder, 'index.html'), page);
  await writeFile(path.join(folder, 'robots.txt'), 'User-agent: *\n');
  const asset = path.join(folder, 'assets', 'main-abc123.js');
  await writeFile(asset, script);
  await writeFile(`${asset}.br`, brotliCompressSync(script));
  await writeFile(`${asset}.gz`, gzipSync(script));
  app = await startTestApp({ env: () => ({ CLIENT_DIR: folder }) });
});
afterAll(async () => {
  await app.close();
  await rm(folder, { recursive: true });
});

type Raw = { readonly status?: number; readonly encoding?: string; readonly bytes: Buffer };

/** The bytes as they come and the headers as they are given: fetch would change both. */
function raw(target: string, headers: OutgoingHttpHeaders): Promise<Raw> {
  return new Promise((resolve, reject) => {
    request(`${app.url}${target}`, { headers }, (answer) => {
      const chunks: Buffer[] = [];
      answer.on('data', (chunk: Buffer) => chunks.push(chunk));
      answer.on('end', () =>
        resolve({
          status: answer.statusCode,
          encoding: answer.headers['content-encoding'],
          bytes: Buffer.concat(chunks),
        }),
      );
    })
      .on('error', reject)
      .end();
  });
}

describe('the built client', () => {
  it('is sent as it was compressed, the best the browser takes', async () => {
    const best = await raw('/assets/main-abc123.js', { 'Accept-Encoding': 'gzip, deflate, br' });
    expect(best.encoding).toBe('br');
    expect(brotliDecompressSync(best.bytes).toString()).toBe(script);
    expect((await raw('/assets/main-abc123.js', { 'Accept-Encoding': 'gzip' })).encoding).toBe(
      'gzip',
    );
    expect(
      (await raw('/assets/main-abc123.js', { 'Accept-Encoding': 'identity' })).bytes.toString(),
    ).toBe(script);
  });

  it('keeps hashed files for a year, others not unasked', async () => {
    const asset = await app.visitor().get('/assets/main-abc123.js');
    expect(asset.headers.get('Cache-Control')).toBe('public, max-age=31536000, immutable');
    expect(asset.headers.get('Set-Cookie')).toBeNull();
    const robots = await app.visitor().get('/robots.txt');
    expect(robots.headers.get('Cache-Control')).toBe('public, max-age=0');
  });

  it('opens every address of its own with the page, by ETag', async () => {
    for (const address of [
      '/',
      '/order/day',
      '/orders/ABC123',
      '/staff/calendar?from=2027-05-01',
    ]) {
      const answer = await app.visitor().get(address);
      expect(answer.status).toBe(200);
      expect(answer.text).toBe(page);
      expect(answer.headers.get('Cache-Control')).toBe('no-cache');
    }
    const tag = (await app.visitor().get('/')).headers.get('ETag') ?? '';
    expect((await raw('/menu', { 'If-None-Match': tag })).status).toBe(304);
  });

  it('answers a file that is not there, an unknown call and a way out of the folder with 404', async () => {
    for (const address of [
      '/assets/gone-000.js',
      '/favicon.png',
      '/api/nothing',
      '/assets/..%2f..%2fetc/passwd',
    ]) {
      const answer = await app.visitor().get(address);
      expect([400, 403, 404], `${address}: ${answer.status}`).toContain(answer.status);
    }
  });
});
