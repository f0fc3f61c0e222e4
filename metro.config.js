const { getDefaultConfig } = require('expo/metro-config');
const http = require('node:http');

const { isUnused } = require('./scripts/web/unused-modules');

const config = getDefaultConfig(__dirname);
const folder = __dirname.replace(/[.*+?^${}()|[\]\\]/g, '\\$&');
const standIn = require.resolve('./scripts/web/stand-in');
const upstream = config.resolver.resolveRequest;

config.resolver.blockList = [
  ...[config.resolver.blockList ?? []].flat(),
  new RegExp(`^${folder}/(\\.data|dist|build|__tests__)/.*`),
];

// zod re-exports some 50 locales from its root; nothing here uses them.
config.resolver.resolveRequest = (context, name, platform) => {
  if (/[\\/]zod[\\/]/.test(context.originModulePath) && /(^|\/)locales\/index\.js$/.test(name))
    return { type: 'empty' };
  const found = (upstream ?? context.resolveRequest)(context, name, platform);
  return !context.dev && found.type === 'sourceFile' && isUnused(found.filePath)
    ? { ...found, filePath: standIn }
    : found;
};

// Development only: /api goes through the dev server, so the browser sees one origin.
config.server.enhanceMiddleware = (metro) => (request, response, next) => {
  if (!request.url.startsWith('/api/')) return metro(request, response, next);
  const { method, url, headers } = request;
  const target = { host: '127.0.0.1', port: process.env.API_PORT, method, path: url, headers };
  const forward = http.request(target, (answer) => {
    response.writeHead(answer.statusCode, answer.headers);
    answer.pipe(response);
  });
  forward.on('error', () => response.writeHead(502).end());
  request.pipe(forward);
};

module.exports = config;
