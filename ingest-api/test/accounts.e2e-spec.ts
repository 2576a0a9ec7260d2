import type { Server } from 'node:http';
import { getConnectionToken } from '@nestjs/sequelize';
import type { Sequelize } from 'sequelize-typescript';
import { AuditService } from '../src/audit/audit.service.js';
import { AuditEntry } from '../src/audit/models/audit-entry.model.js';
import { roles } from '../src/auth/roles.js';
import { Writer } from '../src/database/writer.js';
import { FirstAdministrator, refuseDemoAccounts } from '../src/users/first-administrator.js';
import { Session } from '../src/users/models/session.model.js';
import { User } from '../src/users/models/user.model.js';
import { addAccount, ask, signIn } from './accounts.builder.js';
import { createTestApp, emailOf, type TestApp, testPassword } from './create-test-app.js';

const adminEmail = emailOf('administrator');

describe('accounts', () => {
  let test: TestApp;
  let admin: Awaited<ReturnType<typeof signIn>>;
  const server = (): Server => test.app.getHttpServer();
  const patch = (userId: number, wanted: object) =>
    ask(server()).patch(`/api/v1/users/${userId}`).set(admin).send(wanted);
  const newAccount = {
    email: 'Tomasz.Reed@fernhollow.example',
    displayName: 'Tomasz Reed',
    role: 'integrator',
    password: testPassword,
  };

  beforeEach(async () => {
    test = await createTestApp();
    admin = await signIn(server(), adminEmail);
  });
  afterEach(() => test.close());

  it('are created by an administrator and can sign in', async () => {
    const created = await ask(server()).post('/api/v1/users').set(admin).send(newAccount).expect(201);
    expect(created.body).toEqual({
      userId: expect.any(Number),
      email: 'tomasz.reed@fernhollow.example',
      displayName: 'Tomasz Reed',
      role: 'integrator',
      active: true,
      createdAt: '2026-11-30T12:00:00.000Z',
      lastSignInAt: null,
    });
    await signIn(server(), newAccount.email);
    const list = await ask(server()).get('/api/v1/users').set(admin).expect(200);
    expect(list.body).toContainEqual({ ...created.body, lastSignInAt: '2026-11-30T12:00:00.000Z' });
    const names = list.body.map((user: { displayName: string }) => user.displayName);
    expect(names).toEqual([...names].sort());
  });

  it.each([
    ['an address that is none', { email: 'tomasz' }, '/email'],
    ['a blank name', { displayName: ' ' }, '/displayName'],
    ['an unknown role', { role: 'owner' }, '/role'],
    ['a short password', { password: 'resistors' }, '/password'],
    ['a password of which bcrypt would read only a part', { password: 'r'.repeat(73) }, '/password'],
    ['a property that does not exist', { demo: true }, '/demo'],
  ])('are not created with %s', async (_, wrong, pointer) => {
    const refused = await ask(server())
      .post('/api/v1/users')
      .set(admin)
      .send({ ...newAccount, ...wrong })
      .expect(422);
    expect(refused.body.errors).toEqual([expect.objectContaining({ pointer })]);
    expect(await User.count()).toBe(roles.length);
  });

  it('are not created twice for one address', async () => {
    await ask(server()).post('/api/v1/users').set(admin).send(newAccount).expect(201);
    const again = { ...newAccount, email: newAccount.email.toUpperCase() };
    const refused = await ask(server()).post('/api/v1/users').set(admin).send(again).expect(409);
    expect(refused.body.code).toBe('email_taken');
  });

  it('lose their sessions at once when disabled', async () => {
    const { userId, email } = await addAccount(test.app);
    const viewer = await signIn(server(), email);
    await ask(server()).get('/api/v1/session').set(viewer).expect(200);
    await patch(userId, { active: false }).expect(200);
    await ask(server()).get('/api/v1/session').set(viewer).expect(401);
    await patch(userId, { active: true }).expect(200);
    await ask(server()).get('/api/v1/session').set(viewer).expect(401);
  });

  it('have the rights of a new role at once, in the sessions they have', async () => {
    const { userId, email } = await addAccount(test.app);
    const person = await signIn(server(), email);
    await ask(server()).get('/api/v1/users').set(person).expect(403);
    await patch(userId, { role: 'administrator' }).expect(200);
    await ask(server()).get('/api/v1/users').set(person).expect(200);
    await patch(userId, { role: 'viewer' }).expect(200);
    const refused = await ask(server()).get('/api/v1/users').set(person).expect(403);
    expect(refused.body).toMatchObject({
      code: 'role_not_allowed',
      detail: expect.stringContaining('administrator'),
    });
  });

  it('lose their sessions when an administrator sets a new password', async () => {
    const { userId, email } = await addAccount(test.app);
    const viewer = await signIn(server(), email);
    await patch(userId, { password: 'seven amber cascodes' }).expect(200);
    await ask(server()).get('/api/v1/session').set(viewer).expect(401);
    await signIn(server(), email, 'seven amber cascodes');
  });

  it('always keep one active administrator, even when two give up the role at the same time', async () => {
    const { userId } = (await User.findOne({ where: { email: adminEmail } }))!;
    const second = await addAccount(test.app, {
      role: 'administrator',
      email: 'second@fernhollow.example',
    });
    const answers = await Promise.all([
      patch(userId, { role: 'viewer' }),
      patch(second.userId, { active: false }),
    ]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    expect(answers.find(({ status }) => status === 409)?.body.code).toBe('last_administrator');
    expect(await User.count({ where: { role: 'administrator', active: true } })).toBe(1);
  });

  it('are not changed where there is none, or by what is no number', async () => {
    await patch(4711, { active: false }).expect(404);
    await ask(server()).patch('/api/v1/users/first').set(admin).send({ active: false }).expect(400);
    await patch(1, { role: null }).expect(422);
  });

  it('leave a trail of who did what, newest first, page by page', async () => {
    const { userId } = await addAccount(test.app);
    await patch(userId, { role: 'qualityLead', displayName: 'Rosalind Hart-Moss' }).expect(200);
    await patch(userId, {}).expect(200);
    const first = await ask(server()).get('/api/v1/audit').set(admin).expect(200);
    expect(first.body.items[0]).toEqual({
      auditId: expect.any(Number),
      at: '2026-11-30T12:00:00.000Z',
      actor: adminEmail,
      action: 'account.changed',
      subject: 'rosalind.hart@fernhollow.example',
      detail: 'name Rosalind Hart → Rosalind Hart-Moss, role viewer → qualityLead',
    });
    expect(first.body.items[1].action).toBe('session.started');

    const deed = { actor: 'system', action: 'backup.made', subject: 'site', detail: null };
    await test.app.get(Writer, { strict: false }).run(async (transaction) => {
      for (let i = 0; i < 100; i += 1)
        await test.app.get(AuditService, { strict: false }).record(transaction, deed);
    });
    const ids: number[] = [];
    let cursor: string | null = '';
    while (cursor !== null) {
      const page = await ask(server())
        .get(`/api/v1/audit${cursor && `?cursor=${cursor}`}`)
        .set(admin)
        .expect(200);
      ids.push(...page.body.items.map((entry: { auditId: number }) => entry.auditId));
      cursor = page.body.nextCursor as string | null;
    }
    const all = await AuditEntry.findAll({ order: [['auditEntryId', 'DESC']] });
    expect(ids).toEqual(all.map(({ auditEntryId }) => auditEntryId));
    await ask(server()).get('/api/v1/audit?cursor=1%20OR%201').set(admin).expect(422);
  });

  it('leave a trail that nobody can change or remove', async () => {
    const sequelize: Sequelize = test.app.get(getConnectionToken());
    const before = await AuditEntry.findAll({ raw: true });
    expect(before.length).toBeGreaterThan(0);
    for (const sql of ["UPDATE audit_entries SET actor = 'nobody'", 'DELETE FROM audit_entries']) {
      await expect(sequelize.query(sql)).rejects.toMatchObject({
        parent: { message: expect.stringContaining('append-only') },
      });
    }
    expect(await AuditEntry.findAll({ raw: true })).toEqual(before);
  });

  it('of the demo keep real use from starting', async () => {
    const serve = { ...test.env, mode: 'serve' as const };
    await expect(refuseDemoAccounts(serve)).resolves.toBeUndefined();
    await addAccount(test.app, { demo: true, active: false });
    await expect(refuseDemoAccounts(serve)).rejects.toThrow(/demo accounts/);
    await expect(refuseDemoAccounts(test.env)).resolves.toBeUndefined();
  });
});

describe('the first administrator', () => {
  it('is made once from the settings, when there is no account at all', async () => {
    const test = await createTestApp({
      AMPKEEP_ADMIN_EMAIL: 'Ada@fernhollow.example',
      AMPKEEP_ADMIN_PASSWORD: testPassword,
    });
    const first = test.app.get(FirstAdministrator, { strict: false });
    await first.createOnce();
    expect(await User.count()).toBe(roles.length);

    await Session.destroy({ where: {} });
    await User.destroy({ where: {} });
    await first.createOnce();
    await first.createOnce();
    const admin = await signIn(test.app.getHttpServer(), 'ada@fernhollow.example');
    const list = await ask(test.app.getHttpServer()).get('/api/v1/users').set(admin).expect(200);
    expect(list.body).toEqual([
      expect.objectContaining({ email: 'ada@fernhollow.example', role: 'administrator' }),
    ]);
    await test.close();
  });
});
