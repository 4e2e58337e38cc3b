import { existsSync } from 'node:fs';
import path from 'node:path';
import type { NestExpressApplication } from '@nestjs/platform-express';
import type { NextFunction, Request, Response } from 'express';

const PAGE = 'index.html';

/** The built portal: hashed files for a year, the page itself asked for anew, and the page for every deep link. */
export function servePortal(app: NestExpressApplication, folder: string): void {
  if (!existsSync(path.join(folder, PAGE))) return;
  app.useStaticAssets(path.join(folder, 'assets'), {
    prefix: '/assets',
    immutable: true,
    maxAge: '1y',
    fallthrough: false,
  });
  app.useStaticAssets(folder, { index: false, maxAge: 0 });
  app.use((request: Request, response: Response, next: NextFunction) => {
    if (!asksForPage(request)) return next();
    // By its folder: of a whole path, a part that begins with a dot would be taken for a hidden file.
    response.sendFile(
      PAGE,
      { root: folder, cacheControl: false, headers: { 'Cache-Control': 'no-cache' } },
      (error) => {
        if (error) next(error);
      },
    );
  });
}

/** A place in the portal has no ending; what has one is a file, and was found above or is nowhere. */
function asksForPage(request: Request): boolean {
  return (
    (request.method === 'GET' || request.method === 'HEAD') &&
    !/^\/(api|assets|problems)(\/|$)/.test(request.path) &&
    path.posix.extname(request.path) === '' &&
    request.accepts('html') !== false
  );
}
