import { sql } from 'drizzle-orm';
import { afterAll, expect, it } from 'vitest';
import type { KeptAnalysis } from '@/contract';
import { findAnalysis } from '@/db/stores/analysis-store';
import { made, makeProject } from '../../support/a-project';
import { startTestApp } from '../../support/test-app';

const app = await startTestApp();
afterAll(() => app.close());

it('an analysis that was kept before cases had a basis is read as one that said nothing of it', async () => {
  const ada = await app.client('ada').signUp();
  const { at, project, design } = await makeProject(ada);
  const { id } = await made<KeptAnalysis>(ada, `${at}/analyses`, { designId: design.id });
  const older = crypto.randomUUID();
  app.db.run(sql`
    insert into analysis (id, project_id, design_id, design_revision, engine_version, content_hash, result_hash, verdict, headline,
      inputs, results, created_by, created_at)
    select ${older}, project_id, design_id, design_revision, engine_version, content_hash, result_hash, verdict, headline,
      json_remove(inputs, '$.operatingRange', '$.cases[0].basis'), results, created_by, created_at
    from analysis where id = ${id}`);
  const kept = findAnalysis(app.db, { projectId: project.id, analysisId: older });
  expect(kept).toMatchObject({ room: null, inputs: { operatingRange: [], cases: [{ basis: 'extrapolated' }] } });
  expect((await ada.call('GET', `${at}/analyses/${older}`)).status).toBe(200);
});
