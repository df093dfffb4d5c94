import { NestFactory } from '@nestjs/core';
import { NestExpressApplication } from '@nestjs/platform-express';
import cookieParser from 'cookie-parser';
import helmet from 'helmet';
import { Logger } from 'nestjs-pino';
import { AppModule } from './app.module';
import { Config } from './config/config';
import { documentApi } from './open-api/open-api';
import { serveWebApp } from './web-app/serve-web-app';
import { helmetOptions } from './web-app/helmet-options';

/** Two gigabytes over a slow line; Node's own limit of five minutes breaks such uploads off. */
const longestRequestMs = 4 * 60 * 60 * 1000;

/** The whole API, not yet listening; tests use it as it is. */
export async function createApp(config: Config): Promise<NestExpressApplication> {
  const app = await NestFactory.create<NestExpressApplication>(AppModule.of(config), { bufferLogs: true });
  app.useLogger(app.get(Logger));
  app.set('trust proxy', config.trustProxy);
  app.disable('x-powered-by');
  app.use(helmet(helmetOptions(config.isHttps)), cookieParser());
  documentApi(app);
  if (config.webDist) serveWebApp(app, config.webDist);
  app.enableShutdownHooks();
  app.getHttpServer().requestTimeout = longestRequestMs;
  return app;
}
