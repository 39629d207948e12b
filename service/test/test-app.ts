import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { Test } from '@nestjs/testing';
import bcrypt from 'bcryptjs';
import request from 'supertest';
import { AppModule } from '../src/app.module';
import { setUp } from '../src/app-setup';
import type { Role } from '../src/common/policy';
import { SETTINGS } from '../src/config/settings';
import { Person } from '../src/people/person.model';

/** One hash for all made people; hashing is slow on purpose. */
const PASSWORD = 'a password for tests';
const HASH = bcrypt.hashSync(PASSWORD, 4);

/** A whole service over a database file of its own. */
export class TestApp {
  private readonly tokens = new Map<Role, string>();

  private constructor(
    readonly nest: NestExpressApplication,
    private readonly folder: string,
  ) {}

  /** Starts the service on a fresh database that ran the migrations. */
  static async start(): Promise<TestApp> {
    const folder = mkdtempSync(join(tmpdir(), 'ohmstead-test-'));
    const module = await Test.createTestingModule({ imports: [AppModule] })
      .overrideProvider(SETTINGS)
      .useValue({
        databaseFile: join(folder, 'test.sqlite'),
        port: 0,
        jwtSecret: 'a secret of more than thirty-two characters',
        smtpUrl: null,
        uploadDir: join(folder, 'uploads'),
        seed: 'none',
      })
      .compile();
    const nest = module.createNestApplication<NestExpressApplication>({
      bodyParser: false,
      logger: false,
    });
    setUp(nest);
    await nest.init();
    return new TestApp(nest, folder);
  }

  /** Stops it and removes its files. */
  async stop(): Promise<void> {
    await this.nest.close();
    rmSync(this.folder, { recursive: true, force: true });
  }

  /** The password of every made person. */
  get password(): string {
    return PASSWORD;
  }

  /** Makes a person with the given role. */
  makePerson(role: Role, email = `${role}@test.example`, name = `Test ${role}`): Promise<Person> {
    return Person.create({ name, email, role, passwordHash: HASH });
  }

  /** Access token of a person with the role, made and signed in when first asked for. */
  async tokenOf(role: Role): Promise<string> {
    const known = this.tokens.get(role);
    if (known) return known;
    await this.makePerson(role);
    const { body } = await this.http()
      .post('/api/auth/sign-in')
      .send({ email: `${role}@test.example`, password: PASSWORD });
    this.tokens.set(role, body.accessToken);
    return body.accessToken;
  }

  /** Requests without any sign-in. */
  http() {
    return request(this.nest.getHttpServer());
  }

  /** Sends a request as a role and gives the answer. */
  async send(role: Role, method: 'get' | 'post' | 'patch' | 'delete', path: string, body?: object) {
    const token = await this.tokenOf(role);
    const call = this.http()[method](`/api${path}`).set('Authorization', `Bearer ${token}`);
    return body === undefined ? call : call.send(body);
  }

  /** Expects every route to refuse a request that is not signed in. */
  async expectSignedOut(
    routes: readonly (readonly ['get' | 'post' | 'patch' | 'delete', string])[],
  ): Promise<void> {
    for (const [method, path] of routes) {
      const answer = await this.http()
        [method](`/api${path}`)
        .send(method === 'get' ? undefined : {});
      expect({ path, status: answer.status, code: answer.body.code }).toEqual({
        path,
        status: 401,
        code: 'not-signed-in',
      });
      expect(answer.headers['content-type']).toContain('application/problem+json');
    }
  }
}
