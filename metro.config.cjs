const path = require('node:path');
const { getDefaultConfig } = require('expo/metro-config');

const config = getDefaultConfig(__dirname);

// Builds and data come and go while Metro runs; it must neither watch them nor bundle from them.
const ours = (folder) => new RegExp(`^${path.join(__dirname, folder).replace(/[\\^$.*+?()[\]{}|/]/g, '\\$&')}(/|$)`);
config.resolver.blockList = [config.resolver.blockList, ...['dist', 'data', 'screenshots', '.git'].map(ours)].flat().filter(Boolean);

const resolve = config.resolver.resolveRequest;

// What is imported by packages but never rendered here, as [who imports, what]. Each resolves to an empty module; together they are a
// third of the first load, whose budget is checked by scripts/check-bundle-size.mjs.
const unused = [
  // zod ships its messages in some forty languages (277 kB); the product speaks one and writes its own.
  [/[\\/]zod[\\/]/, /^\.\.?\/.*locales\/index(\.js|\.cjs)?$/],
  // Lists that draw only what is in view, and controls that have our own in their place.
  [
    /react-native-web[\\/]dist[\\/](index|.*Animated[\\/]components[\\/]\w+)\.js$/,
    /exports\/(FlatList|SectionList|VirtualizedList|CheckBox|ProgressBar|Switch|Touchable\w*|ActivityIndicator|RefreshControl)$/,
  ],
  // The router's own headers, tab bars, stacks and site map: our layouts are slots between our own bars.
  [/expo-router[\\/]build[\\/]exports\.js$/, /layouts\/(Tabs|experimental-stack)$/],
  [/expo-router[\\/]build[\\/]index\.js$/, /^\.\/stack$/],
  [/expo-router[\\/]build[\\/]layouts[\\/]StackClient\.js$/, /stack-utils$/],
  [/expo-router[\\/].*native-stack[\\/]/, /views\/NativeStackView$/],
  [/expo-router[\\/].*bottom-tabs[\\/]/, /views\/(BottomTabView|BottomTabBar)$/],
];

config.resolver.resolveRequest = (context, name, platform) => {
  if (unused.some(([who, what]) => who.test(context.originModulePath) && what.test(name))) return { type: 'empty' };
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
