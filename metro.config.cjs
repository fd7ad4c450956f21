const { getDefaultConfig } = require('expo/metro-config');

const config = getDefaultConfig(__dirname);
const resolve = config.resolver.resolveRequest;

// zod ships its messages in some forty languages (277 kB); the product speaks one and writes its own.
config.resolver.resolveRequest = (context, name, platform) => {
  if (/zod.*[\\/]v4[\\/]core/.test(context.originModulePath) && /\/locales\/index/.test(name)) return { type: 'empty' };
  if (/[\\/]zod[\\/]/.test(context.originModulePath) && /^\.\.?\/.*locales\/index(\.js|\.cjs)?$/.test(name)) return { type: 'empty' };
  return (resolve ?? context.resolveRequest)(context, name, platform);
};

// In development Metro serves the page and hands /api to Express, so that both are one origin.
const api = process.env.KERBLINE_API;
if (api) {
  const { createProxyMiddleware } = require('http-proxy-middleware');
  const proxy = createProxyMiddleware({ target: api, pathFilter: '/api' });
  config.server.enhanceMiddleware = (metro) => (request, response, next) => proxy(request, response, () => metro(request, response, next));
}

module.exports = config;
