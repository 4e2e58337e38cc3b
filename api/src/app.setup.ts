import path from 'node:path';
import { RequestMethod } from '@nestjs/common';
import type { NestExpressApplication } from '@nestjs/platform-express';
import compression from 'compression';
import cookieParser from 'cookie-parser';
import type { NextFunction, Request, Response } from 'express';
import helmet from 'helmet';
import { Logger } from 'nestjs-pino';
import { refuseForeignOrigins } from './common/origin.middleware';
import { ProblemFilter } from './common/problem.filter';
import { validationPipe } from './common/validation.pipe';
import { Environment } from './config/environment';
import { setUpDocumentation } from './openapi.document';
import { servePortal } from './portal-pages';

/** Everything between the socket and the controllers; the same in the running product and in the tests. */
export function setUpApp(app: NestExpressApplication): void {
  const environment = app.get(Environment);
  app.useLogger(app.get(Logger));
  app.enableShutdownHooks();
  app.set('trust proxy', environment.TRUSTED_PROXY ?? false);
  app.setGlobalPrefix('api', { exclude: [{ path: 'problems{/*rest}', method: RequestMethod.GET }] });
  app.use(helmet({ contentSecurityPolicy: { directives: contentPolicy(environment) } }));
  app.use(compression());
  app.use(cookieParser());
  app.use('/api', refuseForeignOrigins(environment.PUBLIC_URL), forbidStoring);
  app.useBodyParser('json', { limit: '256kb' });
  app.useGlobalPipes(validationPipe());
  app.useGlobalFilters(new ProblemFilter());
  setUpDocumentation(app);
  servePortal(app, environment.PORTAL_DIST ?? path.join(__dirname, '../../portal/dist'));
}

function contentPolicy({ PUBLIC_URL }: Environment): Record<string, string[] | null> {
  return {
    'default-src': ["'self'"],
    'script-src': ["'self'"],
    // Emotion and the calendar write style elements while running.
    'style-src': ["'self'", "'unsafe-inline'"],
    'font-src': ["'self'", 'data:'],
    'img-src': ["'self'", 'data:', 'blob:'],
    'connect-src': ["'self'"],
    'frame-ancestors': ["'none'"],
    // On plain http a browser must not be told to fetch everything by https.
    'upgrade-insecure-requests': PUBLIC_URL.startsWith('https:') ? [] : null,
  };
}

/** What the API answers is somebody's own: no cache keeps it. */
function forbidStoring(_request: Request, response: Response, next: NextFunction): void {
  response.setHeader('Cache-Control', 'no-store');
  next();
}
