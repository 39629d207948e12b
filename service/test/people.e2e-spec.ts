import { canChange, canInvite, canListPeople } from '../src/people/person.policy';
import { ROLES } from '../src/common/policy';
import { TestApp } from './test-app';

let app: TestApp;
beforeAll(async () => {
  app = await TestApp.start();
});
afterAll(() => app.stop());

describe('policies', () => {
  it.each(ROLES)('say what a %s may do with people', (role) => {
    const actor = { id: 1, role, isBlocked: false };
    const isOwner = role === 'owner';
    expect([
      canListPeople(actor),
      canInvite(actor),
      canChange(actor, { id: 2 }),
      canChange(actor, { id: 1 }),
    ]).toEqual([isOwner, isOwner, isOwner, false]);
    expect(canListPeople({ ...actor, isBlocked: true })).toBe(false);
  });
});

describe('people', () => {
  it('refuses every route to whoever is not signed in', async () => {
    await app.expectSignedOut([
      ['get', '/people'],
      ['post', '/people/invitations'],
      ['patch', '/people/1'],
    ]);
  });

  it.each(['trainee', 'technician', 'senior'] as const)('refuses a %s', async (role) => {
    expect((await app.send(role, 'get', '/people')).status).toBe(403);
    expect(
      (
        await app.send(role, 'post', '/people/invitations', {
          name: 'X',
          email: 'x@test.example',
          role: 'trainee',
        })
      ).status,
    ).toBe(403);
    expect((await app.send(role, 'patch', '/people/1', { isBlocked: true })).status).toBe(403);
  });

  it('refuses bad input at its field', async () => {
    const answer = await app.send('owner', 'post', '/people/invitations', {
      name: '',
      email: 'nowhere',
      role: 'chief',
    });
    expect(answer.status).toBe(400);
    expect(answer.body.errors.map(({ pointer }: { pointer: string }) => pointer)).toEqual([
      '/name',
      '/email',
      '/role',
    ]);
    expect((await app.send('owner', 'patch', '/people/999', { isBlocked: true })).status).toBe(404);
    expect((await app.send('owner', 'patch', '/people/abc', { isBlocked: true })).status).toBe(400);
  });

  it('lets the owner invite, change and block, but not the last owner', async () => {
    const invited = await app.send('owner', 'post', '/people/invitations', {
      name: 'Mara',
      email: 'mara@test.example',
      role: 'technician',
    });
    expect(invited.status).toBe(201);
    expect(invited.body.person).toMatchObject({ isInvited: true, role: 'technician' });
    const { id } = invited.body.person;
    const changed = await app.send('owner', 'patch', `/people/${id}`, { role: 'senior' });
    expect(changed.body.role).toBe('senior');
    const list = await app.send('owner', 'get', '/people');
    expect(list.body.some(({ email }: { email: string }) => email === 'mara@test.example')).toBe(
      true,
    );
    const owner = list.body.find(({ role }: { role: string }) => role === 'owner');
    expect(
      (await app.send('owner', 'patch', `/people/${owner.id}`, { role: 'trainee' })).status,
    ).toBe(403);
  });
});
