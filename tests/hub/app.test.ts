import request from 'supertest';
import { expect, it } from 'vitest';
import { createApp } from '../../server/app.ts';
import { folderWith, temporaryDatabase } from '../setup/hub.ts';

/** A built app in little: a page, a hashed script, a worker, a manifest. */
function served(secure = false) {
  const dist = folderWith({
    'index.html': '<!doctype html><title>Steelyard</title>',
    'assets/index-4f3a9c.js': `console.log("${'x'.repeat(4_000)}");`,
    'assets/app-4f3a9c.css': 'body{}',
    'sw.js': '// service worker',
    'manifest.webmanifest': '{}',
    'schema/model.json': '{}',
    '.built-from': 'digest',
  });
  return request(createApp({ database: temporaryDatabase(), dist, secure }));
}

it.each(['/', '/assets/index-4f3a9c.js', '/api/v1/health', '/api/v1/nothing', '/gone.js'])(
  'sends the security headers with %s',
  async (path) => {
    const { headers } = await served().get(path);
    expect(headers).toMatchObject({
      'x-content-type-options': 'nosniff',
      'referrer-policy': 'no-referrer',
      'x-frame-options': 'DENY',
      'cross-origin-opener-policy': 'same-origin',
      'cross-origin-resource-policy': 'same-origin',
    });
    expect(headers['permissions-policy']).toContain('camera=()');
    expect(headers['x-powered-by']).toBeUndefined();
  },
);

// The directives' meaning: W3C, Content Security Policy Level 3.
it('lets the page run scripts from files of its own only, and no text as code', async () => {
  const { headers } = await served().get('/');
  const policy = new Map(
    String(headers['content-security-policy'])
      .split(';')
      .map((one) => {
        const [name = '', ...values] = one.trim().split(' ');
        return [name, values.join(' ')];
      }),
  );
  expect(Object.fromEntries(policy)).toMatchObject({
    'default-src': "'self'",
    'script-src': "'self' 'wasm-unsafe-eval'",
    'style-src': "'self'",
    'worker-src': "'self'",
    'connect-src': "'self'",
    'img-src': "'self' data: blob:",
    'object-src': "'none'",
    'base-uri': "'self'",
    'frame-ancestors': "'none'",
  });
  expect(headers['content-security-policy']).not.toMatch(/'unsafe-(inline|eval)'/);
});

it('asks for https only where people reach it by https', async () => {
  const plain = (await served().get('/')).headers;
  expect(plain['strict-transport-security']).toBeUndefined();
  expect(plain['content-security-policy']).not.toContain('upgrade-insecure-requests');
  const secure = (await served(true).get('/')).headers;
  expect(secure['strict-transport-security']).toContain('max-age=31536000');
  expect(secure['content-security-policy']).toContain('upgrade-insecure-requests');
});

it.each(['/', '/appraisals/keeping-hearts-well', '/sw.js', '/manifest.webmanifest'])(
  'has %s asked for anew each time',
  async (path) => {
    const { status, headers } = await served().get(path).set('Accept', 'text/html');
    expect(status).toBe(200);
    expect(headers['cache-control']).toBe('no-cache');
    expect(headers.etag).toBeDefined();
  },
);

it('keeps files named by their content for good', async () => {
  const { headers } = await served().get('/assets/index-4f3a9c.js');
  expect(headers['cache-control']).toBe('public, max-age=31536000, immutable');
  expect(headers['content-type']).toMatch(/javascript/);
});

it.each(['gzip', 'br'])('compresses with %s for who takes it', async (encoding) => {
  const answer = served().get('/assets/index-4f3a9c.js').set('Accept-Encoding', encoding);
  expect((await answer).headers['content-encoding']).toBe(encoding);
});

it('opens the page at every address of the app', async () => {
  const { text, headers } = await served().get('/appraisals/keeping-hearts-well/results');
  expect(text).toContain('<title>Steelyard</title>');
  expect(headers['content-type']).toMatch(/html/);
});

it.each([
  '/assets/index-old.js',
  '/assets/gone',
  '/gone.json',
  '/.built-from',
  '/api',
  '/api/v1/x',
])('says that nothing is at %s, as data', async (path) => {
  const { status, body, headers } = await served().get(path).set('Accept', '*/*');
  expect(status).toBe(404);
  expect(body.error).toMatchObject({ code: 'request.notFound', params: { path } });
  expect(headers['content-type']).toMatch(/json/);
});

it.each([
  '/../package.json',
  '/..%2f..%2fetc/passwd',
  '/%2e%2e/%2e%2e/etc/passwd',
  '/assets/..%5c..',
])('serves nothing from outside the built app: %s', async (path) => {
  const { text } = await served().get(path);
  expect(text).not.toMatch(/root:|"name"/);
});

it('takes nothing but reading at the addresses of the app', async () => {
  const { status, body } = await served().post('/appraisals').send({});
  expect([status, body.error.code]).toEqual([404, 'request.notFound']);
});

it('opens no page at an address that cannot be read', async () => {
  const { status, body } = await served().get('/appraisals/%E0%A4%A').set('Accept', 'text/html');
  expect([status, body.error.code]).toEqual([404, 'request.notFound']);
});
