import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vitest/config';

const root = fileURLToPath(new URL('.', import.meta.url));
const alias = { '@': root.replace(/\/$/, '') };
const native = {
  ...alias,
  'react-native-svg': `${root}node_modules/react-native-svg/lib/module/index.js`,
  'react-native': 'react-native-web',
};

/** Two runners: the engine, figures, database and server on Node, components in a happy-dom page. Browser tests are in vitest.browser.config.ts. */
export default defineConfig({
  resolve: { alias },
  test: {
    projects: [
      {
        resolve: { alias },
        test: {
          name: 'node',
          environment: 'node',
          include: ['tests/{analysis,contract,figures,db,server,scripts,hooks}/**/*.test.ts'],
          testTimeout: 30_000,
          hookTimeout: 60_000,
        },
      },
      {
        resolve: { alias: native, extensions: ['.web.tsx', '.web.ts', '.web.js', '.tsx', '.ts', '.mjs', '.js', '.json'] },
        define: { __DEV__: 'false', 'process.env.EXPO_OS': '"web"' },
        test: {
          name: 'components',
          environment: 'happy-dom',
          include: ['tests/components/**/*.test.tsx'],
          testTimeout: 30_000,
          server: { deps: { inline: [/react-native/, /expo/] } },
        },
      },
    ],
  },
});
