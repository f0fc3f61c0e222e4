import express from 'express';
import fs from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import zlib from 'node:zlib';
import request from 'supertest';

import { webApp } from '@/api/routes/middleware/web-app';

const folder = fs.mkdtempSync(path.join(os.tmpdir(), 'thickset-web-'));
const script = '_expo/static/js/entry-1234.js';
beforeAll(() => {
  const files = {
    'index.html': 'page',
    [script]: 'plain',
    [`${script}.gz`]: zlib.gzipSync('zipped'),
    [`${script}.br`]: zlib.brotliCompressSync('brotli'),
    '.hash': 'h',
  };
  for (const [name, text] of Object.entries({ ...files, 'icon.svg': '<svg/>' })) {
    fs.mkdirSync(path.dirname(path.join(folder, name)), { recursive: true });
    fs.writeFileSync(path.join(folder, name), text);
  }
});
afterAll(() => fs.rmSync(folder, { recursive: true }));

const get = (url: string, encoding = 'identity') =>
  request(express().use(webApp(folder)))
    .get(url)
    .set('Accept-Encoding', encoding)
    .responseType('blob');

it.each([
  ['br, gzip', 'br', 'brotli'],
  ['gzip', 'gzip', 'zipped'],
  ['identity', undefined, 'plain'],
])('gives to whoever accepts %s the copy in %s, for ever', async (accepted, encoding, text) => {
  const answer = await get(`/${script}`, accepted).expect(200);
  expect(answer.headers['content-encoding']).toBe(encoding);
  expect(answer.headers['content-type']).toMatch(/javascript/);
  expect(answer.headers['cache-control']).toBe('public, max-age=31536000, immutable');
  expect(String(answer.body)).toBe(text);
});

it('gives the page for any address of a screen, always fresh, not to be indexed', async () => {
  for (const url of ['/', '/jobs', '/jobs/1/runs', '/links/abc']) {
    const answer = await get(url).expect(200);
    expect(String(answer.body)).toBe('page');
    expect(answer.headers).toMatchObject({ 'cache-control': 'no-cache', 'x-robots-tag': 'noindex' });
  }
});

it.each(['/missing.js', '/..%2f..%2fetc%2fpasswd.txt', '/%E0%A4%A.js'])('has nothing at %s', async (url) => {
  const answer = await get(url);
  expect(answer.status).toBeGreaterThanOrEqual(400);
  expect(answer.status).toBeLessThan(500);
});
