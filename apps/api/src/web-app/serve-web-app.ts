import { readFileSync } from 'node:fs';
import { basename, join, resolve } from 'node:path';
import { NestExpressApplication } from '@nestjs/platform-express';
import { NextFunction, Request, Response, static as serveFiles } from 'express';
import { RequestContext } from '@mikro-orm/core';
import { EntityManager } from '@mikro-orm/postgresql';
import { SharePreviewService } from '../shares/share-preview.service';
import { withPreview } from './share-page';

/** The built pages: hashed assets may be kept for ever, the page itself is asked for again each time. */
export function serveWebApp(app: NestExpressApplication, webDist: string): void {
  const root = resolve(webDist);
  app.use(
    serveFiles(root, {
      index: false,
      setHeaders: (response, path) => response.setHeader('Cache-Control', cacheControl(root, path)),
    }),
  );
  app.use(/^\/(s|phone)(\/.*)?$/, keepLinksPrivate);
  app.use('/s/:token', sharePages(app, root));
  app.use((request: Request, response: Response, next: NextFunction) => {
    if (!isPage(request)) return next();
    response.set('Cache-Control', 'no-cache').sendFile('index.html', { root });
  });
}

/** The address is the key: no other site is told it, and no search engine keeps it. */
function keepLinksPrivate(_request: Request, response: Response, next: NextFunction): void {
  response.set({ 'Referrer-Policy': 'no-referrer', 'X-Robots-Tag': 'noindex, nofollow' });
  next();
}

/** The same page, with what a messenger may show of the link in its head. */
function sharePages(app: NestExpressApplication, root: string) {
  const previews = app.get(SharePreviewService);
  const em = app.get(EntityManager);
  return (request: Request<{ token: string }>, response: Response, next: NextFunction) => {
    if (!isPage(request)) return next();
    RequestContext.create(em, () => previews.find(request.params.token)).then((preview) => {
      if (!preview) return next();
      const page = withPreview(readFileSync(join(root, 'index.html'), 'utf8'), preview);
      response.set('Cache-Control', 'no-cache').type('html').send(page);
    }, next);
  };
}

function cacheControl(root: string, path: string): string {
  const isHashed = path.startsWith(join(root, 'assets'));
  return isHashed ? 'public, max-age=31536000, immutable' : 'no-cache';
}

/** A path of the web app, which routes it itself. What looks like a file and isn't there stays 404. */
function isPage({ method, originalUrl }: Request): boolean {
  const path = originalUrl.split('?')[0] ?? '';
  const isRead = method === 'GET' || method === 'HEAD';
  const isApi = path === '/api' || path.startsWith('/api/');
  return isRead && !isApi && !basename(path).includes('.');
}
