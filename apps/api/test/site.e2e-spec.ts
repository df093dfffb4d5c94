import { mkdir, mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { appHeader, healthResponse, paths } from '@thudline/contracts';
import request from 'supertest';
import { BreakableStore, startBreakableStore } from './support/breakable-store';
import { Browser } from './support/person';
import { startTestApp, TestApp } from './support/test-app';

describe('the site', () => {
  let test: TestApp;
  let store: BreakableStore;
  let webDist: string;

  beforeAll(async () => {
    webDist = await mkdtemp(join(tmpdir(), 'thudline-web-'));
    await mkdir(join(webDist, 'assets'));
    await writeFile(join(webDist, 'index.html'), '<!doctype html><title>Thudline</title>');
    await writeFile(join(webDist, 'assets', 'main-1a2b.js'), 'export {};');
    store = await startBreakableStore();
    test = await startTestApp({ WEB_DIST: webDist, S3_ENDPOINT: store.url });
  });
  afterEach(() => store?.mend());
  afterAll(async () => {
    await test?.close();
    await store?.close();
    await rm(webDist, { recursive: true, force: true });
  });

  const get = (path: string) => request(test.server).get(path);

  describe('health', () => {
    it('is ok when database, object store and queue answer', async () => {
      const response = await get(paths.health).expect(200);
      expect(healthResponse.parse(response.body)).toEqual({
        status: 'ok',
        database: 'up',
        objectStore: 'up',
        queue: 'up',
      });
    });

    it('says which part is away', async () => {
      store.breakAfter(0);
      const response = await get(paths.health).expect(503);
      expect(response.body).toMatchObject({ status: 'failing', database: 'up', objectStore: 'down' });
    });
  });

  describe('the documentation', () => {
    it('is there as JSON', async () => {
      const response = await get(`${paths.docs}/openapi.json`).expect(200);
      const body = response.body as { info: { title: string }; paths: Record<string, unknown> };
      expect(body.info.title).toBe('Thudline');
      expect(Object.keys(body.paths)).toContain('/api/takes/{id}/report');
      expect(body.paths['/api/takes/{id}/report']).toMatchObject({
        get: {
          responses: {
            default: { content: { 'application/json': { schema: { $ref: expect.any(String) as string } } } },
          },
        },
      });
    });

    it('refers to nothing that is not in it', async () => {
      const { text } = await get(`${paths.docs}/openapi.json`).expect(200);
      const { components } = JSON.parse(text) as { components: { schemas: Record<string, unknown> } };
      const named = [...text.matchAll(/"#\/components\/schemas\/([^"]+)"/g)].map(([, name]) => name);
      expect(named).toContain('ErrorResponseDto');
      expect(named.filter((name) => !(name in components.schemas))).toEqual([]);
    });

    it('is a page that works without inline script', async () => {
      const page = await get(paths.docs).expect(200);
      expect(page.text).not.toMatch(/<script(?![^>]*\bsrc=)[^>]*>/);
      const scripts = [...page.text.matchAll(/<script[^>]*\bsrc=['"]([^'"]+)['"]/g)].map(([, src]) => src);
      expect(scripts.length).toBeGreaterThan(0);
      for (const script of scripts) {
        await get(new URL(script, `http://x${paths.docs}/`).pathname)
          .expect(200)
          .expect('Content-Type', /javascript/);
      }
    });
  });

  describe('pages', () => {
    it.each(['/', '/takes', '/takes/0198c0de-0000-7000-8000-000000000000'])(
      '%s is the web app',
      async (path) => {
        const response = await get(path).expect(200);
        expect(response.text).toContain('<title>Thudline</title>');
        expect(response.headers['cache-control']).toBe('no-cache');
      },
    );

    it('keeps hashed assets for ever, and has no others', async () => {
      const response = await get('/assets/main-1a2b.js').expect(200);
      expect(response.headers['cache-control']).toBe('public, max-age=31536000, immutable');
      await get('/assets/main-0000.js').expect(404);
    });

    it('allows no script but its own, and no frame around it', async () => {
      const { headers } = await get('/').expect(200);
      const policy = headers['content-security-policy'];
      expect(policy).toContain("script-src 'self';");
      expect(policy).toContain("media-src 'self' blob:");
      expect(policy).toContain("frame-ancestors 'none'");
      expect(policy).not.toContain('upgrade-insecure-requests');
      expect(headers['x-powered-by']).toBeUndefined();
    });
  });

  describe('what is not there', () => {
    it.each(['/api', '/api/nothing', '/api/takes/x/y/z'])('%s is 404 as JSON', async (path) => {
      const response = await get(path).expect(404);
      expect(response.body).toMatchObject({ code: 'not-found', message: expect.any(String) as string });
    });
  });

  describe('behind https', () => {
    const publicUrl = 'https://drums.thudline.test';
    let secure: TestApp;

    beforeAll(async () => {
      secure = await startTestApp({ PUBLIC_URL: publicUrl });
    });
    afterAll(async () => secure?.close());

    it('sends its cookies over https only, and asks browsers to stay there', async () => {
      const response = await request(secure.server)
        .post(paths.join)
        .set(appHeader.name, appHeader.value)
        .set('Origin', publicUrl)
        .send({ name: 'Juno', email: 'juno@example.org', password: 'correct horse battery' })
        .expect(201);
      const cookies = response.headers['set-cookie'] as unknown as string[];
      expect(cookies).toHaveLength(2);
      for (const cookie of cookies) expect(cookie).toMatch(/; Secure/);
      expect(response.headers['strict-transport-security']).toMatch(/max-age=\d+/);
    });
  });

  it('names every request', async () => {
    const [first, second] = [await get(paths.health), await get(paths.health)];
    expect(first.headers['x-request-id']).toMatch(/^[0-9a-f-]{36}$/);
    expect(first.headers['x-request-id']).not.toBe(second.headers['x-request-id']);
  });

  it('answers a body that is far too large with 413', async () => {
    const response = await new Browser(test).post(paths.join, { name: 'x'.repeat(300_000) }).expect(413);
    expect(response.body).toMatchObject({ code: 'too-large' });
  });
});
