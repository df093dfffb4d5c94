import { basename, join, resolve } from 'node:path';
import { NestExpressApplication } from '@nestjs/platform-express';
import { NextFunction, Request, Response, static as serveFiles } from 'express';

/** The built pages: hashed assets may be kept for ever, the page itself is asked for again each time. */
export function serveWebApp(app: NestExpressApplication, webDist: string): void {
  const root = resolve(webDist);
  app.use(
    serveFiles(root, {
      index: false,
      setHeaders: (response, path) => response.setHeader('Cache-Control', cacheControl(root, path)),
    }),
  );
  app.use((request: Request, response: Response, next: NextFunction) => {
    if (!isPage(request)) return next();
    response.set('Cache-Control', 'no-cache').sendFile('index.html', { root });
  });
}

function cacheControl(root: string, path: string): string {
  const isHashed = path.startsWith(join(root, 'assets'));
  return isHashed ? 'public, max-age=31536000, immutable' : 'no-cache';
}

/** A path of the web app, which routes it itself. What looks like a file and isn't there stays 404. */
function isPage({ method, path }: Request): boolean {
  const isRead = method === 'GET' || method === 'HEAD';
  const isApi = path === '/api' || path.startsWith('/api/');
  return isRead && !isApi && !basename(path).includes('.');
}
