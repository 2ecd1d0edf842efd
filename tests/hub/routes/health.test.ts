import request from 'supertest';
import { expect, it } from 'vitest';
import packageJson from '../../../package.json' with { type: 'json' };
import { createApp } from '../../../server/app.ts';
import { temporaryDatabase } from '../../setup/hub.ts';

it('says that hub and database are well, and which version runs', async () => {
  const answer = await request(createApp({ database: temporaryDatabase() })).get('/api/v1/health');
  expect(answer.status).toBe(200);
  expect(answer.body).toEqual({
    status: 'ok',
    version: packageJson.version,
    database: { status: 'ok' },
  });
  expect(answer.headers['cache-control']).toBe('no-store');
});

it('says 503 when the database does not answer', async () => {
  const database = temporaryDatabase();
  const app = createApp({ database });
  database.close();
  const answer = await request(app).get('/api/v1/health');
  expect(answer.status).toBe(503);
  expect(answer.body).toMatchObject({ status: 'failing', database: { status: 'failing' } });
});
