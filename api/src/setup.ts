import type { NestExpressApplication } from '@nestjs/platform-express';
import { DocumentBuilder, SwaggerModule } from '@nestjs/swagger';
import compression from 'compression';
import cookieParser from 'cookie-parser';
import type { Logger } from 'pino';
import { Configuration } from './platform/configuration/configuration.js';
import { ErrorFilter } from './platform/errors/error.filter.js';
import { bodyErrors, jsonBody, onlyOwnJson } from './platform/http/body-parser.js';
import { neverCached, permissionsPolicy, securityHeaders } from './platform/http/security-headers.js';
import { staticApp } from './platform/http/static-app.js';
import { requestLog } from './platform/log/request-log.js';

/** Bodies are read by `setupApp`, with its own limits and answers. */
export const APP_OPTIONS = { bodyParser: false, forceCloseConnections: true } as const;

/** Everything around the routes, in the order in which a request meets it; the same in the server and in tests. */
export function setupApp(app: NestExpressApplication, log: Logger): void {
  const configuration = app.get(Configuration);
  app.disable('x-powered-by');
  app.set('trust proxy', configuration.trustedProxies);
  app.set('etag', false);
  app.setGlobalPrefix('api');
  app.use(requestLog(log), securityHeaders(configuration.isHttps), permissionsPolicy, compression());
  app.use('/api', neverCached, onlyOwnJson, jsonBody, bodyErrors, cookieParser());
  app.use(staticApp(configuration.pwaDir));
  app.useGlobalFilters(new ErrorFilter(log));
  SwaggerModule.setup('api/docs', app, () => openApiDocument(app), { jsonDocumentUrl: 'api/openapi.json' });
}

/** The description of every route, made from the same schemas that check their input. */
export function openApiDocument(app: NestExpressApplication) {
  const about = new DocumentBuilder().setTitle('Harkmoor').setVersion('1').addBearerAuth().build();
  return SwaggerModule.createDocument(app, about);
}
