import { mkdir, mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { startTestApp, type TestApp } from './app';

describe('the built portal', () => {
  let test: TestApp;
  let place: string;

  beforeAll(async () => {
    place = await mkdtemp(path.join(tmpdir(), 'ferrite-test-'));
    // A checkout may lie anywhere, under a hidden folder too.
    const PORTAL_DIST = path.join(place, '.hidden', 'dist');
    await mkdir(path.join(PORTAL_DIST, 'assets'), { recursive: true });
    await writeFile(path.join(PORTAL_DIST, 'index.html'), '<title>Ferrite Row</title>');
    await writeFile(path.join(PORTAL_DIST, 'icon.svg'), '<svg xmlns="http://www.w3.org/2000/svg"/>');
    await writeFile(path.join(PORTAL_DIST, 'assets', 'main-1a2b.js'), 'export {};');
    test = await startTestApp({ PORTAL_DIST });
  });
  afterAll(async () => {
    await test.close();
    await rm(place, { recursive: true });
  });

  const browser = (method: 'get' | 'head', address: string) =>
    test.http()[method](address).set('Accept', 'text/html,*/*;q=0.8');

  it.each(['/', '/build', '/treasury/reconcile/4f0f5b52-1d9c-4c6e-9a35-0d7f9c1a2b3c'])(
    'answers %s with the page, asked for anew each time',
    async (address) => {
      const { text } = await browser('get', address)
        .expect(200)
        .expect('content-type', /html/)
        .expect('cache-control', 'no-cache');
      expect(text).toContain('Ferrite Row');
      await browser('head', address).expect(200).expect('content-type', /html/);
    },
  );

  it('gives its files, those with a hash in the name for a year', async () => {
    await browser('get', '/icon.svg').expect(200);
    await browser('get', '/assets/main-1a2b.js')
      .expect(200)
      .expect('cache-control', /max-age=31536000, immutable/);
  });

  it.each(['/x.png', '/build/x.js', '/assets/x.js', '/assets/x', '/api/x', '/problems/x'])(
    'answers %s, which is nowhere, with 404 and not with the page',
    async (address) => {
      await browser('get', address)
        .expect(404)
        .expect('content-type', /problem\+json/);
    },
  );

  it('keeps the page for who takes pages', async () => {
    await test.http().get('/build').set('Accept', 'application/json').expect(404);
    await test.http().post('/build').set('Accept', 'text/html').expect(404);
  });
});
