import { randomUUID } from 'node:crypto';
import { LoggerModule } from 'nestjs-pino';
import { Environment } from './environment';

interface LoggedRequest {
  id: string;
  method: string;
  url: string;
}

/** One line a request. Nothing secret is logged: no bodies, no headers, no query strings. */
export const logging = LoggerModule.forRootAsync({
  inject: [Environment],
  useFactory: ({ LOG_LEVEL }: Environment) => ({
    pinoHttp: {
      level: LOG_LEVEL,
      genReqId: () => randomUUID(),
      autoLogging: { ignore: (request) => request.url === '/api/health' },
      serializers: {
        req: ({ id, method, url }: LoggedRequest) => ({ id, method, url: url.split('?')[0] }),
        res: ({ statusCode }: { statusCode: number }) => ({ statusCode }),
      },
    },
  }),
});
