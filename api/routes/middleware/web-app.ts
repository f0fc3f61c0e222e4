import express, { Router, type RequestHandler } from 'express';
import fs from 'node:fs';
import path from 'node:path';

/** The exported app: .br and .gz beside each file, hashed files for ever, and the page for any other address. */
export function webApp(folder: string): Router {
  const router = Router();
  router.use(compressed(folder));
  router.use(express.static(folder, { index: false, setHeaders: keep }));
  router.get('/{*any}', (request, response, next) => {
    if (path.extname(request.path)) return next();
    response.set({ 'Cache-Control': 'no-cache', 'X-Robots-Tag': 'noindex' });
    response.sendFile(path.join(folder, 'index.html'));
  });
  return router;
}

function keep(response: { setHeader(name: string, value: string): unknown }, file: string): void {
  const hashed = /[\\/]_expo[\\/]static|[\\/]assets[\\/]/.test(file);
  response.setHeader('Cache-Control', hashed ? 'public, max-age=31536000, immutable' : 'no-cache');
}

const encodings = [
  { name: 'br', end: '.br' },
  { name: 'gzip', end: '.gz' },
];

/** A path that cannot be decoded names no file. */
function decoded(path: string): string {
  try {
    return decodeURIComponent(path);
  } catch {
    return '';
  }
}

function compressed(folder: string): RequestHandler {
  const files = new Set(fs.readdirSync(folder, { recursive: true, encoding: 'utf8' }).map((file) => `/${file}`));
  return (request, response, next) => {
    const wanted = decoded(request.path);
    const encoding = encodings.find(({ name, end }) => request.acceptsEncodings(name) && files.has(wanted + end));
    if (encoding) {
      response.setHeader('Content-Encoding', encoding.name);
      response.setHeader('Vary', 'Accept-Encoding');
      response.type(path.extname(wanted));
      request.url = encodeURI(wanted + encoding.end);
    }
    next();
  };
}
