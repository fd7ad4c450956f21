import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createApp } from '@/server/app';
import { startTestApp } from '../../support/test-app';
import { rows } from './walk/rows';
import { documentAt } from './walk/operations';
import { letsIn, turnsAway } from './walk/walk';
import { makeWorld, type World } from './walk/world';

const app = await startTestApp({ env: { ANALYSE_PER_MINUTE: '100000' } });
const operations = await documentAt(app.url);
afterAll(() => app.close());

let world: World;
beforeAll(async () => {
  world = await makeWorld(app);
});

const names = operations.map(({ name }) => name);
const named = (name: string) => operations.find((operation) => operation.name === name)!;

describe('every route of the OpenAPI document', () => {
  it('has a row that says who may call it, and every row a route', () => {
    expect(Object.keys(rows).sort()).toEqual([...names].sort());
  });

  it('is every route there is, but for the description itself and the page', () => {
    const page = '/{*path}';
    const layers = createApp(app.context).router.stack.flatMap(({ route: known }) => (known ? [known.path] : []));
    const undescribed = [...new Set(layers)].filter(
      (path) => !operations.some((operation) => operation.path === path.replace(/:(\w+)/g, '{$1}')),
    );
    expect(undescribed.sort()).toEqual(['/api/docs', '/api/docs/open.js', '/api/openapi.json', page]);
  });

  it.each(names)('turns everyone else away without a hint, and changes nothing: %s', async (name) => {
    expect(await turnsAway(world, named(name), rows[name])).toEqual([]);
  });

  it.each(names)('lets in whom the table of permissions says: %s', async (name) => {
    expect(await letsIn(world, named(name), rows[name])).toEqual([]);
  });
});
