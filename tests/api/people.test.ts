import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { refusalOf } from '@server/features/people/policy.ts';
import { createHarness, password, type Agent, type Harness } from './harness.ts';

let harness: Harness;
let admin: Agent;

beforeAll(async () => {
  harness = await createHarness();
  admin = await harness.signedIn('admin');
});
afterAll(() => harness.close());

const newcomer = {
  name: 'Wim Aldous',
  email: 'Wim@harrowquay.example',
  role: 'engineer',
  password: 'fifteen letters',
};
const change = (id: number, version: number, body: object) =>
  admin.patch(`/api/people/${id}`).set('If-Match', `"${version}"`).send(body);
const audited = async () => {
  const [entry] = await harness.db.select<{ action: string; detail: string }>(
    'SELECT action, detail FROM audit ORDER BY seq DESC LIMIT 1',
  );
  return entry;
};

describe('the rule about leaving', () => {
  const active = (role: string) => ({ role, state: 'active' });
  const away = { role: 'admin', state: 'disabled' };

  test.each([
    ['the last admin disabled by another', false, true, active('admin'), away, true],
    ['the last admin made an engineer', true, true, active('admin'), active('engineer'), true],
    ['an admin who disables themself', true, false, active('admin'), away, true],
    ['an admin who gives the role away', true, false, active('admin'), active('drafter'), true],
    ['another admin disabled', false, false, active('admin'), away, false],
    ['an admin renamed', true, true, active('admin'), active('admin'), false],
    ['an engineer disabled', false, true, active('engineer'), { role: 'engineer', state: 'disabled' }, false],
    ['a disabled admin made an engineer', false, true, away, active('engineer'), false],
  ])('%s', (_name, self, lastAdmin, before, after, refused) => {
    expect(refusalOf({ self, lastAdmin, before, after }) !== null).toBe(refused);
  });
});

describe('people', () => {
  test('are added, listed, and can sign in', async () => {
    const { body } = await admin.post('/api/people').send(newcomer).expect(201);
    expect(body).toEqual({
      id: expect.any(Number) as number,
      name: 'Wim Aldous',
      email: 'wim@harrowquay.example',
      role: 'engineer',
      state: 'active',
      lockVersion: 0,
      lastSignInAt: null,
    });
    expect((await audited())?.action).toBe('person.created');
    await harness.signIn('wim@harrowquay.example', newcomer.password);
    const list = await admin.get('/api/people').expect(200);
    expect(list.text).not.toContain('argon2');
    const { people } = list.body as { people: { email: string; lastSignInAt: string | null }[] };
    expect(people).toHaveLength(5);
    expect(people.find(({ email }) => email === 'wim@harrowquay.example')?.lastSignInAt).toMatch(/Z$/);
  });

  test('have one e-mail address each, whatever its case', async () => {
    const { body } = await admin
      .post('/api/people')
      .send({ ...newcomer, email: 'WIM@harrowquay.example' })
      .expect(409);
    expect(body).toMatchObject({ code: 'conflict', errors: [{ field: 'email' }] });
  });

  test.each([
    ['state', 'disabled'],
    ['id', 1],
    ['lockVersion', 5],
    ['passwordHash', 'x'],
    ['createdAt', '2020-01-01'],
    ['lock_version', 5],
  ])('cannot be given %s by hand when they are added', async (field, value) => {
    const sent = { ...newcomer, email: 'other@harrowquay.example', [field]: value };
    const { body } = await admin.post('/api/people').send(sent).expect(422);
    expect(body).toMatchObject({ errors: [{ field }] });
    expect(await harness.db.models.Person.count({ where: { email: sent.email } })).toBe(0);
  });

  test('cannot have their password or address changed by others', async () => {
    const { id } = harness.people.engineer;
    await change(id, 0, { email: 'new@harrowquay.example' }).expect(422);
    await change(id, 0, { password: 'another password' }).expect(422);
    const row = await harness.db.models.Person.findByPk(id);
    expect(row?.email).toBe(harness.people.engineer.email);
    expect(row?.lockVersion).toBe(0);
  });

  test.each([
    [{ ...newcomer, email: 'x' }, 'email'],
    [{ ...newcomer, role: 'root' }, 'role'],
    [{ ...newcomer, name: '  ' }, 'name'],
    [{ ...newcomer, name: 'x'.repeat(121) }, 'name'],
    [{ ...newcomer, password: 'fourteen chars' }, 'password'],
  ])('are refused with a fault: %o', async (sent, field) => {
    const { body } = await admin.post('/api/people').send(sent).expect(422);
    expect(body).toMatchObject({ errors: [{ field }] });
  });

  test('are changed by the version that was read', async () => {
    const { id } = harness.people.drafter;
    const { body } = await change(id, 0, { name: 'Lena' }).expect(200).expect('ETag', '"1"');
    expect(body).toMatchObject({ name: 'Lena', role: 'drafter', lockVersion: 1 });
    expect(await audited()).toMatchObject({ action: 'person.changed' });
    const stale = await change(id, 0, { name: 'Other' }).expect(412);
    expect(stale.body).toMatchObject({ code: 'stale-version', current: { name: 'Lena', lockVersion: 1 } });
    await change(999_999, 0, { name: 'Nobody' }).expect(404);
  });

  test('who are disabled are out at once', async () => {
    const { id, email } = harness.people.engineer;
    const engineer = await harness.signIn(email);
    await change(id, 0, { state: 'disabled' }).expect(200);
    await engineer.get('/api/auth/me').expect(401);
    await engineer.post('/api/auth/refresh').expect(401);
    await change(id, 1, { state: 'active' }).expect(200);
    await engineer.post('/api/auth/refresh').expect(401);
  });

  test('always keep an admin', async () => {
    const { id } = harness.people.admin;
    const { body } = await change(id, 0, { state: 'disabled' }).expect(409);
    expect(body).toMatchObject({
      code: 'state-conflict',
      detail: expect.stringContaining('last active admin') as string,
    });
    await change(id, 0, { role: 'engineer' }).expect(409);
    await change(harness.people['standards-manager'].id, 0, { role: 'admin' }).expect(200);
    await change(id, 0, { role: 'engineer' }).expect(409);
  });

  test('keep an admin also when two admins leave at the same moment', async () => {
    const other = harness.people['standards-manager'];
    const second = await harness.signIn(other.email, password);
    const [one, two] = await Promise.all([
      change(other.id, 1, { state: 'disabled' }),
      second
        .patch(`/api/people/${harness.people.admin.id}`)
        .set('If-Match', '"0"')
        .send({ state: 'disabled' }),
    ]);
    expect([one.status, two.status].sort()).not.toEqual([200, 200]);
    const left = await harness.db.models.Person.count({ where: { role: 'admin', state: 'active' } });
    expect(left).toBe(1);
  });
});
