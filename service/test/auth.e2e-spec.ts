import { RefreshToken } from '../src/auth/refresh-token.model';
import { Person } from '../src/people/person.model';
import { TestApp } from './test-app';

let app: TestApp;
beforeAll(async () => {
  app = await TestApp.start();
});
afterAll(() => app.stop());

function cookieOf(answer: { headers: Record<string, unknown> }): string {
  return (answer.headers['set-cookie'] as string[])[0].split(';')[0];
}

const signIn = (email: string, password = app.password) =>
  app.http().post('/api/auth/sign-in').send({ email, password });

describe('first owner', () => {
  it('is asked for on an empty database, once', async () => {
    expect((await app.http().get('/api/auth/setup')).body).toEqual({ needed: true });
    const short = await app
      .http()
      .post('/api/auth/setup')
      .send({ shopName: 'Shop', name: 'Ana', email: 'ana@test.example', password: 'short' });
    expect(short.status).toBe(400);
    expect(short.body.errors[0].pointer).toBe('/password');
    const made = await app.http().post('/api/auth/setup').send({
      shopName: 'Shop',
      name: 'Ana',
      email: 'Ana@Test.example',
      password: 'a long enough one',
    });
    expect(made.status).toBe(200);
    expect(made.body.person).toMatchObject({ role: 'owner', email: 'ana@test.example' });
    const again = await app.http().post('/api/auth/setup').send({
      shopName: 'Shop',
      name: 'Eve',
      email: 'eve@test.example',
      password: 'a long enough one',
    });
    expect(again.body.code).toBe('set-up-already');
    expect((await app.http().get('/api/auth/setup')).body).toEqual({ needed: false });
  });
});

describe('sign-in', () => {
  beforeAll(() => app.makePerson('technician', 'tess@test.example'));

  it('gives a token, a cookie no script can read, and never the hash', async () => {
    const answer = await signIn('TESS@test.example');
    expect(answer.status).toBe(200);
    expect(answer.body.accessToken).toMatch(/^eyJ/);
    expect(JSON.stringify(answer.body)).not.toContain('$2');
    const cookie = (answer.headers['set-cookie'] as unknown as string[])[0];
    expect(cookie).toMatch(/ohmstead_refresh=.*Path=\/api\/auth.*HttpOnly.*SameSite=Strict/);
  });

  it('says the same for a wrong password and for nobody', async () => {
    const wrong = await signIn('tess@test.example', 'not this one');
    const nobody = await signIn('nobody@test.example');
    expect(wrong.status).toBe(401);
    expect(wrong.body.code).toBe('wrong-sign-in');
    expect(nobody.body.detail).toBe(wrong.body.detail);
  });

  it('refuses unknown fields and missing ones at their place', async () => {
    const answer = await app
      .http()
      .post('/api/auth/sign-in')
      .send({ email: 'a@b.example', isOwner: true });
    expect(answer.status).toBe(400);
    expect(answer.body.errors.map(({ pointer }: { pointer: string }) => pointer)).toEqual(
      expect.arrayContaining(['/isOwner', '/password']),
    );
  });

  it('answers broken JSON in the same shape', async () => {
    const answer = await app
      .http()
      .post('/api/auth/sign-in')
      .set('Content-Type', 'application/json')
      .send('{"email":');
    expect(answer.status).toBe(400);
    expect(answer.body.code).toBe('bad-request');
    expect(answer.headers['content-type']).toContain('application/problem+json');
  });

  it('refuses whoever is blocked, at once', async () => {
    const person = await app.makePerson('technician', 'gone@test.example');
    const { body } = await signIn('gone@test.example');
    await person.update({ isBlocked: true });
    expect((await signIn('gone@test.example')).body.code).toBe('blocked');
    const me = await app
      .http()
      .get('/api/auth/me')
      .set('Authorization', `Bearer ${body.accessToken}`);
    expect(me.status).toBe(401);
  });
});

describe('staying signed in', () => {
  it('hands out the next token for the last one', async () => {
    const first = cookieOf(await signIn('tess@test.example'));
    const answer = await app.http().post('/api/auth/refresh').set('Cookie', first);
    expect(answer.status).toBe(200);
    expect(cookieOf(answer)).not.toBe(first);
    const me = await app
      .http()
      .get('/api/auth/me')
      .set('Authorization', `Bearer ${answer.body.accessToken}`);
    expect(me.body.email).toBe('tess@test.example');
  });

  it('ends the whole chain when an old token comes back late', async () => {
    const first = cookieOf(await signIn('tess@test.example'));
    const second = cookieOf(await app.http().post('/api/auth/refresh').set('Cookie', first));
    const rows = await RefreshToken.findAll({ order: [['id', 'DESC']], limit: 2 });
    await rows[1].update({ replacedAt: new Date(Date.now() - 60_000) });
    expect((await app.http().post('/api/auth/refresh').set('Cookie', first)).status).toBe(401);
    expect((await app.http().post('/api/auth/refresh').set('Cookie', second)).status).toBe(401);
  });

  it('ends with signing out', async () => {
    const cookie = cookieOf(await signIn('tess@test.example'));
    expect((await app.http().post('/api/auth/sign-out').set('Cookie', cookie)).status).toBe(204);
    expect((await app.http().post('/api/auth/refresh').set('Cookie', cookie)).status).toBe(401);
    expect((await app.http().post('/api/auth/refresh')).status).toBe(401);
  });

  it('does not take a token signed with another secret', async () => {
    const forged = 'eyJhbGciOiJub25lIn0.eyJzdWIiOiIxIn0.';
    expect(
      (await app.http().get('/api/auth/me').set('Authorization', `Bearer ${forged}`)).status,
    ).toBe(401);
  });
});

describe('invitations', () => {
  it('are taken up once and not after they expired', async () => {
    const { body } = await app.send('owner', 'post', '/people/invitations', {
      name: 'New One',
      email: 'new@test.example',
      role: 'trainee',
    });
    const token = body.invitationLink.split('/').pop();
    const accept = () =>
      app
        .http()
        .post('/api/auth/accept-invitation')
        .send({ token, name: 'New One', password: 'a long enough one' });
    expect((await accept()).body.person.role).toBe('trainee');
    expect((await accept()).body.code).toBe('invitation-over');
    const late = await app.send('owner', 'post', '/people/invitations', {
      name: 'Late',
      email: 'late@test.example',
      role: 'trainee',
    });
    await Person.update(
      { invitationExpiresAt: new Date(0) },
      { where: { email: 'late@test.example' } },
    );
    const answer = await app
      .http()
      .post('/api/auth/accept-invitation')
      .send({
        token: late.body.invitationLink.split('/').pop(),
        name: 'Late',
        password: 'a long enough one',
      });
    expect(answer.status).toBe(410);
  });
});
