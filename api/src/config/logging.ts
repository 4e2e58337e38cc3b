import { randomUUID } from 'node:crypto';
import { RequestMethod } from '@nestjs/common';
import { LoggerModule } from 'nestjs-pino';
import { Environment } from './environment';
import { errorForLog } from './error-for-log';

interface LoggedRequest {
  id: string;
  method: string;
  url: string;
}

/** One line a request. Nothing secret is logged: no bodies, headers or query strings, nor values a query failed with. */
export const loggingOptions = (level: Environment['LOG_LEVEL']) => ({
  level,
  genReqId: () => randomUUID(),
  autoLogging: { ignore: (request: { url?: string }) => request.url === '/api/health' },
  serializers: {
    req: ({ id, method, url }: LoggedRequest) => ({ id, method, url: url.split('?')[0] }),
    res: ({ statusCode }: { statusCode: number }) => ({ statusCode }),
    err: errorForLog,
  },
});

export const logging = LoggerModule.forRootAsync({
  inject: [Environment],
  useFactory: ({ LOG_LEVEL }: Environment) => ({
    // Spelt as the router spells it now: the bare star of old is taken with a warning at every start.
    forRoutes: [{ path: '{*everything}', method: RequestMethod.ALL }],
    pinoHttp: loggingOptions(LOG_LEVEL),
  }),
});
