import { existsSync } from 'node:fs';
import { join } from 'node:path';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { DocumentBuilder, type OpenAPIObject, SwaggerModule } from '@nestjs/swagger';
import compression from 'compression';
import cookieParser from 'cookie-parser';
import express, { type NextFunction, type Request, type Response } from 'express';
import helmet from 'helmet';
import { ProblemFilter } from './common/filters/problem.filter';
import { Problem } from './common/problem';
import { validationPipe } from './common/validation';
import { PROJECT_ROOT } from './config/settings';

/** Largest body that is taken: a netlist of 400 parts is far below it. */
const BODY_LIMIT = '2mb';

/** The ui after its build. */
export const UI_FOLDER = join(PROJECT_ROOT, 'ui', 'dist');

/** Sets an application up the same way for the server, the tests and the API description. */
export function setUp(app: NestExpressApplication): NestExpressApplication {
  app.setGlobalPrefix('api');
  app.use(
    helmet({
      contentSecurityPolicy: {
        directives: {
          // Fluent writes its styles into the page; everything else comes from this server.
          'style-src': ["'self'", "'unsafe-inline'"],
          'img-src': ["'self'", 'data:', 'blob:'],
          'connect-src': ["'self'"],
          'worker-src': ["'self'", 'blob:'],
          // The shop's network speaks plain HTTP unless somebody puts a proxy in front.
          'upgrade-insecure-requests': null,
        },
      },
      strictTransportSecurity: false,
    }),
  );
  app.use(compression());
  app.use(cookieParser());
  app.useBodyParser('json', { limit: BODY_LIMIT });
  app.useGlobalPipes(validationPipe());
  app.useGlobalFilters(new ProblemFilter());
  app.enableShutdownHooks();
  return app;
}

/** The API description, as served at /api/docs and written to openapi.json. */
export function describeApi(app: NestExpressApplication): OpenAPIObject {
  const config = new DocumentBuilder()
    .setTitle('Ohmstead')
    .setDescription(
      'Cases, readings and diagnoses of tube-era sets. Errors are application/problem+json (RFC 9457).',
    )
    .setVersion('1')
    .addBearerAuth()
    .build();
  return SwaggerModule.createDocument(app, config, { extraModels: [Problem] });
}

/** Serves the built ui beside the API: assets for a year, the page itself never from a cache. */
export function serveUi(app: NestExpressApplication): boolean {
  if (!existsSync(join(UI_FOLDER, 'index.html'))) return false;
  const server = app.getHttpAdapter().getInstance() as express.Express;
  server.use(
    '/assets',
    express.static(join(UI_FOLDER, 'assets'), { immutable: true, maxAge: '1y', fallthrough: true }),
    (_: Request, response: Response) => void response.status(404).type('text').send('Not found'),
  );
  server.use(express.static(UI_FOLDER, { index: false, maxAge: '1h' }));
  server.use((request: Request, response: Response, next: NextFunction) => {
    if (request.method !== 'GET' || request.path.startsWith('/api')) return next();
    response.set('Cache-Control', 'no-cache').sendFile(join(UI_FOLDER, 'index.html'));
  });
  return true;
}
