import jwt from 'jsonwebtoken';
import { afterAll, beforeAll, beforeEach, describe, expect, test } from 'vitest';
import type { z } from 'zod';
import type { demoPeopleResponse } from '@shared/contracts/auth.ts';
import { addDemoPeople } from '@server/features/people/service.ts';
import { createHarness, password, type Harness } from './harness.ts';

let harness: Harness;
const engineer = () => harness.people.engineer;
const quarterHour = 15 * 60;

beforeAll(async () => {
  harness = await createHarness();
});
afterAll(() => harness.close());
beforeEach(async () => {
  await harness.db.execute('DELETE FROM sign_in_failures');
  await harness.db.execute("UPDATE people SET state = 'active'");
});

const attempt = (email: string, secret: string) =>
  harness.stranger().post('/api/auth/sign-in').send({ email, password: secret });

const cookiesOf = (response: { headers: Record<string, unknown> }): string[] =>
  (response.headers['set-cookie'] as string[] | undefined) ?? [];
const valueOf = (cookies: string[], name: string) =>
  cookies.map((cookie) => new RegExp(`^${name}=([^;]+)`).exec(cookie)?.[1]).find(Boolean) ?? '';

/** Cookies of a fresh sign-in, to be sent by hand. */
async function fresh() {
  const cookies = cookiesOf(await attempt(engineer().email, password).expect(204));
  return { access: valueOf(cookies, 'backmark_access'), refresh: valueOf(cookies, 'backmark_refresh') };
}
const me = (access: string) =>
  harness.stranger().get('/api/auth/me').set('Cookie', `backmark_access=${access}`);
const renew = (refresh: string) =>
  harness.stranger().post('/api/auth/refresh').set('Cookie', `backmark_refresh=${refresh}`);

describe('signing in', () => {
  test('gives two cookies that scripts and other sites cannot use', async () => {
    const cookies = cookiesOf(await attempt(engineer().email, password).expect(204));
    expect(cookies).toHaveLength(2);
    for (const cookie of cookies) {
      expect(cookie).toContain('HttpOnly');
      expect(cookie).toContain('SameSite=Lax');
      expect(cookie).toContain('Path=/');
      expect(cookie).not.toContain('Domain');
    }
  });

  test('says who one is and what one may do', async () => {
    const agent = await harness.signedIn('engineer');
    const { body } = await agent.get('/api/auth/me').expect(200).expect('Cache-Control', 'no-store');
    expect(body).toEqual({
      id: engineer().id,
      name: 'The engineer',
      email: engineer().email,
      role: 'engineer',
      can: {
        defineFamilies: false,
        seeDrafts: false,
        exportTables: true,
        managePeople: false,
        readAudit: false,
      },
    });
  });

  test('takes the address in any case and leaves an audit entry', async () => {
    await attempt('Engineer@HarrowQuay.Example ', password).expect(204);
    const [entry] = await harness.db.select<{ action: string; actor_id: number }>(
      'SELECT action, actor_id FROM audit ORDER BY seq DESC LIMIT 1',
    );
    expect(entry).toEqual({ action: 'person.signed-in', actor_id: engineer().id });
  });

  test('gives one answer for a wrong password, an unknown address and a disabled account', async () => {
    const answers = [
      await attempt(engineer().email, 'wrong'),
      await attempt('nobody@harrowquay.example', password),
    ];
    await harness.db.execute("UPDATE people SET state = 'disabled' WHERE id = ?", [engineer().id]);
    answers.push(await attempt(engineer().email, password));
    const [first, ...others] = answers.map(({ status, body }) => ({
      status,
      ...(body as object),
      requestId: '',
    }));
    expect(first).toMatchObject({ status: 401, code: 'sign-in-refused' });
    for (const other of others) expect(other).toEqual(first);
    for (const answer of answers) expect(cookiesOf(answer)).toEqual([]);
  });

  test('lists every fault, and never repeats the password', async () => {
    const { body, text } = await harness
      .stranger()
      .post('/api/auth/sign-in')
      .send({ email: 'no address', password: ['canary-4711'], role: 'admin' })
      .expect(422)
      .expect('Content-Type', /application\/problem\+json/);
    const { errors } = body as { errors: { field: string; message: string }[] };
    expect(errors).toEqual([
      {
        field: 'email',
        message: 'email must be an e-mail address such as name@firm.example, not "no address".',
        value: 'no address',
      },
      { field: 'password', message: 'password must be text.' },
      { field: 'role', message: 'role is not a field that can be given here.' },
    ]);
    expect(text).not.toContain('canary-4711');
  });

  test('stores argon2id and strengthens a weaker hash at the next sign-in', async () => {
    const { default: argon2 } = await import('argon2');
    const weak = await argon2.hash(password, {
      type: argon2.argon2id,
      memoryCost: 8192,
      timeCost: 1,
      parallelism: 1,
    });
    await harness.db.execute('UPDATE people SET password_hash = ? WHERE id = ?', [weak, engineer().id]);
    await attempt(engineer().email, password).expect(204);
    const row = await harness.db.models.Person.findByPk(engineer().id);
    expect(row?.passwordHash).toMatch(/^\$argon2id\$v=19\$m=19456,(p=1,t=2|t=2,p=1)\$/);
    expect(row?.lockVersion).toBe(0);
  });
});

describe('too many failures', () => {
  test('lock the account at the sixth, even for the right password, and are forgotten in time', async () => {
    for (let failure = 0; failure < 5; failure += 1) await attempt(engineer().email, 'wrong').expect(401);
    const { headers, body } = await attempt(engineer().email, password).expect(429);
    expect(body).toMatchObject({ code: 'rate-limited' });
    expect(Number(headers['retry-after'])).toBeGreaterThan(quarterHour - 60);
    expect(Number(headers['retry-after'])).toBeLessThanOrEqual(quarterHour);
    await attempt(harness.people.drafter.email, password).expect(204);
    harness.clock.forward(quarterHour + 1);
    await attempt(engineer().email, password).expect(204);
  });

  test('cannot be slipped by with many attempts at once', async () => {
    const answers = await Promise.all(Array.from({ length: 20 }, () => attempt(engineer().email, 'wrong')));
    expect(answers.filter(({ status }) => status === 401).length).toBeLessThanOrEqual(5);
    expect(answers.every(({ status }) => status === 401 || status === 429)).toBe(true);
  });

  test('of many accounts lock the address they come from', async () => {
    for (let other = 0; other < 30; other += 1)
      await attempt(`nobody${other}@harrowquay.example`, 'wrong').expect(401);
    await attempt('nobody31@harrowquay.example', 'wrong').expect(429);
  });

  test('are struck out by a good sign-in', async () => {
    for (let failure = 0; failure < 4; failure += 1) await attempt(engineer().email, 'wrong').expect(401);
    await attempt(engineer().email, password).expect(204);
    for (let failure = 0; failure < 5; failure += 1) await attempt(engineer().email, 'wrong').expect(401);
  });
});

describe('a session', () => {
  test('ends with signing out: both cookies are worthless then', async () => {
    const { access, refresh } = await fresh();
    await harness
      .stranger()
      .post('/api/auth/sign-out')
      .set('Cookie', `backmark_access=${access}; backmark_refresh=${refresh}`)
      .expect(204);
    await me(access).expect(401);
    await renew(refresh).expect(401);
  });

  test('is renewed with a new token, and ends when an old one comes back', async () => {
    const first = await fresh();
    const second = valueOf(cookiesOf(await renew(first.refresh).expect(204)), 'backmark_refresh');
    expect(second).not.toBe(first.refresh);
    harness.clock.forward(60);
    await renew(first.refresh).expect(401);
    await renew(second).expect(401);
    await me(first.access).expect(401);
    const [entry] = await harness.db.select('SELECT action FROM audit ORDER BY seq DESC LIMIT 1');
    expect(entry).toEqual({ action: 'session.revoked' });
  });

  test('survives two tabs that renew at the same moment', async () => {
    const { refresh } = await fresh();
    const answers = await Promise.all([renew(refresh), renew(refresh)]);
    expect(answers.map(({ status }) => status)).toEqual([204, 204]);
    expect(answers.map((answer) => cookiesOf(answer).length).sort()).toEqual([1, 2]);
  });

  test('needs renewal after ten minutes, ends when idle and after twelve hours', async () => {
    const idle = await fresh();
    harness.clock.forward(601);
    await me(idle.access).expect(401);
    harness.clock.forward(45 * 60);
    await renew(idle.refresh).expect(401);
    let { refresh } = await fresh();
    for (let half = 0; half < 23; half += 1) {
      harness.clock.forward(30 * 60);
      refresh = valueOf(cookiesOf(await renew(refresh).expect(204)), 'backmark_refresh');
    }
    harness.clock.forward(30 * 60);
    await renew(refresh).expect(401);
  });

  test('takes a new role at the next request, and ends with the account', async () => {
    const { access, refresh } = await fresh();
    await harness.db.execute("UPDATE people SET role = 'drafter' WHERE id = ?", [engineer().id]);
    expect((await me(access).expect(200)).body).toMatchObject({ role: 'drafter' });
    await harness.db.execute("UPDATE people SET role = 'engineer', state = 'disabled' WHERE id = ?", [
      engineer().id,
    ]);
    await me(access).expect(401);
    await renew(refresh).expect(401);
  });

  test('ends elsewhere when the password is changed', async () => {
    const drafter = harness.people.drafter.email;
    const here = await harness.signIn(drafter);
    const elsewhere = await harness.signIn(drafter);
    const next = 'another quiet sentence';
    const wrong = await here.post('/api/auth/password').send({ current: 'wrong', next }).expect(422);
    expect((wrong.body as { errors: unknown }).errors).toEqual([
      { field: 'current', message: 'This is not your present password.' },
    ]);
    await here.post('/api/auth/password').send({ current: password, next: 'short' }).expect(422);
    await here.post('/api/auth/password').send({ current: password, next }).expect(204);
    await here.get('/api/auth/me').expect(200);
    await elsewhere.get('/api/auth/me').expect(401);
    await attempt(drafter, password).expect(401);
    await harness.signIn(drafter, next);
  });
});

describe('a forged access token', () => {
  const secret = 'only for tests, and at least so long';
  const claims = { sid: '00000000-0000-0000-0000-000000000000' };
  const base = { issuer: 'backmark', audience: 'backmark-api', expiresIn: 600 };

  test.each([
    ['without signature', () => jwt.sign(claims, '', { ...base, subject: '1', algorithm: 'none' })],
    ['of another secret', () => jwt.sign(claims, 'x'.repeat(32), { ...base, subject: '1' })],
    ['of another algorithm', () => jwt.sign(claims, secret, { ...base, subject: '1', algorithm: 'HS512' })],
    ['for another audience', () => jwt.sign(claims, secret, { ...base, subject: '1', audience: 'others' })],
    ['of another issuer', () => jwt.sign(claims, secret, { ...base, subject: '1', issuer: 'others' })],
    ['not yet good', () => jwt.sign(claims, secret, { ...base, subject: '1', notBefore: 3600 * 100 })],
    ['of a session that is not there', () => jwt.sign(claims, secret, { ...base, subject: '1' })],
    ['that is no token', () => 'x'.repeat(3000)],
    ['that is huge', () => 'x'.repeat(9000)],
  ])('%s is refused', async (_name, forge) => {
    await me(forge()).expect(401);
  });

  test('with another person in it is refused', async () => {
    const { access } = await fresh();
    const [header = '', payload = '', signature = ''] = access.split('.');
    const said = JSON.parse(Buffer.from(payload, 'base64url').toString()) as object;
    const altered = Buffer.from(JSON.stringify({ ...said, sub: '4' })).toString('base64url');
    await me(`${header}.${altered}.${signature}`).expect(401);
    await me(access).expect(200);
  });
});

test('an unknown address takes as much work as a wrong password', async () => {
  const took = async (email: string) => {
    const times: number[] = [];
    for (let n = 0; n < 5; n += 1) {
      await harness.db.execute('DELETE FROM sign_in_failures');
      const began = performance.now();
      await attempt(email, 'wrong').expect(401);
      times.push(performance.now() - began);
    }
    return times.sort((a, b) => a - b)[2] ?? 0;
  };
  const ratio = (await took('nobody@harrowquay.example')) / (await took(engineer().email));
  // Without the decoy hash it is about a tenth.
  expect(ratio).toBeGreaterThan(0.4);
  expect(ratio).toBeLessThan(2.5);
});

test('the demo people are shown in demo mode alone, and can sign in there', async () => {
  await harness.stranger().get('/api/auth/demo-people').expect(404);
  const demo = await createHarness({ BACKMARK_DEMO: 'true' });
  await demo.db.execute('DELETE FROM people');
  expect((await demo.stranger().get('/api/auth/demo-people').expect(200)).body).toEqual({ people: [] });
  expect(await addDemoPeople(demo.app)).toBe(6);
  expect(await addDemoPeople(demo.app)).toBe(0);
  const { body } = await demo.stranger().get('/api/auth/demo-people').expect(200);
  for (const { email, password: secret, role } of (body as z.output<typeof demoPeopleResponse>).people) {
    const agent = await demo.signIn(email, secret);
    expect((await agent.get('/api/auth/me')).body).toMatchObject({ role });
  }
  await demo.db.execute("UPDATE people SET state = 'disabled' WHERE role = 'drafter'");
  const fewer = await demo.stranger().get('/api/auth/demo-people').expect(200);
  expect((fewer.body as { people: unknown[] }).people).toHaveLength(5);
  await demo.close();
});

test('no password, cookie or token is in the log', async () => {
  const { access, refresh } = await fresh();
  await me(access).expect(200);
  const text = harness.logged.join('');
  expect(text).toContain('"route":"/api/auth/me"');
  for (const secret of [password, access, refresh, 'another quiet sentence', 'argon2id']) {
    expect(text).not.toContain(secret);
  }
});
