import type { NextFunction, Request, Response } from 'express';
import { commonProblems } from './common.errors';

const READS = new Set(['GET', 'HEAD', 'OPTIONS']);

/**
 * Refuses writes that a page of another site sends. Browsers name the page's origin on every write; programs that
 * are not browsers name none and carry no cookie they were not given.
 */
export function refuseForeignOrigins(publicUrl: string) {
  const ownHost = new URL(publicUrl).host;
  return (request: Request, _response: Response, next: NextFunction): void => {
    const { origin, host } = request.headers;
    if (READS.has(request.method) || origin === undefined) return next();
    const from = URL.canParse(origin) ? new URL(origin).host : undefined;
    if (from !== undefined && (from === ownHost || from === host)) return next();
    next(commonProblems['foreign-origin']('Writes are taken from the portal’s own pages only.'));
  };
}
