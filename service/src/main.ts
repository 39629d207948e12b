import 'reflect-metadata';
import { NestFactory } from '@nestjs/core';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { SwaggerModule } from '@nestjs/swagger';
import { AppModule } from './app.module';
import { describeApi, serveUi, setUp } from './app-setup';
import { PinoLogger } from './common/pino-logger';
import { requestLog } from './common/request-log';
import { loadEnvFile, readSettings, SettingsError } from './config/settings';
import { DEMO_PEOPLE } from './database/seed/demo-people';
import { SeedService } from './database/seed/seed.service';

/** Starts the whole product on one port. */
async function start(): Promise<void> {
  loadEnvFile();
  const { port, seed } = readSettings(process.env);
  const app = await NestFactory.create<NestExpressApplication>(AppModule, {
    logger: new PinoLogger(),
    bodyParser: false,
  });
  app.use(requestLog());
  setUp(app);
  SwaggerModule.setup('api/docs', app, describeApi(app), { jsonDocumentUrl: 'api/docs-json' });
  const hasUi = serveUi(app);
  // Families and rules are taken from their files now; the demo shop builds on them.
  await app.init();
  const hasDemo = await app.get(SeedService).seedIfEmpty();
  await app.listen(port);
  const address = app.getHttpServer().address() as { port: number };
  console.log(`\nOhmstead is ready at http://localhost:${address.port}`);
  if (!hasUi) console.log('The ui is not built yet; only the API is served. Run "npm run build".');
  if (hasDemo) {
    console.log('Demo sign-ins:');
    for (const { email, password, role } of DEMO_PEOPLE) {
      console.log(`  ${role.padEnd(10)} ${email.padEnd(28)} ${password}`);
    }
  } else if (seed === 'none') console.log('Open it in a browser to make the owner’s account.');
}

start().catch((error: unknown) => {
  if (error instanceof SettingsError) console.error(error.message);
  else if ((error as { code?: string }).code === 'EADDRINUSE') {
    console.error(
      'The port is taken. Stop the other program, or choose another port: PORT=3001 npm start',
    );
  } else console.error(error);
  process.exit(1);
});
