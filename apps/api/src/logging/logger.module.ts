import { randomUUID } from 'node:crypto';
import { IncomingMessage, ServerResponse } from 'node:http';
import { LoggerModule } from 'nestjs-pino';
import { Options } from 'pino-http';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { loggedError } from './logged-error';

/** One line of JSON an event, with the id of its request. Headers and bodies are left out: they hold secrets. */
export const httpLogging = (config: Config): Options => ({
  level: config.logLevel,
  genReqId: (_request: IncomingMessage, response: ServerResponse) => {
    const id = randomUUID();
    response.setHeader('X-Request-Id', id);
    return id;
  },
  serializers: {
    req: ({ id, method, url }: { id: string; method: string; url: string }) => ({ id, method, url }),
    res: ({ statusCode }: { statusCode: number }) => ({ statusCode }),
    err: loggedError,
  },
  customLogLevel: (_request: IncomingMessage, response: ServerResponse, error?: Error) => {
    if (error || response.statusCode >= 500) return 'error';
    return response.statusCode >= 400 ? 'warn' : 'info';
  },
  autoLogging: { ignore: (request: IncomingMessage) => request.url === '/api/health' },
});

export const loggerModule = LoggerModule.forRootAsync({
  inject: [CONFIG],
  useFactory: (config: Config) => ({ pinoHttp: httpLogging(config) }),
});
