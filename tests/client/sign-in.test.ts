import { flushPromises } from '@vue/test-utils';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import SignInView from '../../src/views/SignInView.vue';
import { targetAfterSignIn } from '../../src/router/index.ts';
import { mountInApp } from '../support/client/mount.ts';
import { buttonNamed, fieldLabelled, labelled } from './queries.ts';

const json = (status: number, body: unknown) => new Response(JSON.stringify(body), { status });
const people = [
  {
    name: 'Idris Quay',
    email: 'idris@harrowquay.example',
    role: 'engineer',
    password: 'a long demo sentence',
  },
];
const fetched = vi.fn<typeof fetch>();
let signIn: () => Response;

beforeEach(() => {
  signIn = () => json(401, { type: 'x', title: 'Not signed in', status: 401, code: 'unauthenticated' });
  fetched.mockReset();
  fetched.mockImplementation((address) => {
    if (address === '/api/auth/demo-people') return Promise.resolve(json(200, { people }));
    return Promise.resolve(signIn());
  });
  vi.stubGlobal('fetch', fetched);
});

async function signInWith(email: string, password: string): Promise<void> {
  await mountInApp(SignInView);
  await flushPromises();
  fieldLabelled('Mail address', email);
  fieldLabelled('Password', password);
  buttonNamed('Sign in').click();
  await flushPromises();
}

describe('signing in', () => {
  it('refuses without saying which of the two is wrong, and keeps what was typed', async () => {
    await signInWith('idris@harrowquay.example', 'not the password');
    const alert = document.querySelector('[role="alert"].refused');
    expect(alert?.textContent).toContain('do not go together');
    expect(labelled('Mail address').value).toBe('idris@harrowquay.example');
  });

  it('names a faulty field at the field', async () => {
    const errors = [{ field: 'email', message: 'A mail address has an @.' }];
    signIn = () => json(422, { type: 'x', title: 'Faults', status: 422, code: 'validation', errors });
    await signInWith('idris', 'x');
    expect(document.body.textContent).toContain('A mail address has an @.');
  });

  it('offers the demo people by name, role and password', async () => {
    await mountInApp(SignInView);
    await flushPromises();
    const person = buttonNamed('Idris Quay');
    expect(person.textContent).toContain('Engineer');
    // One password that all have is said once, above the list.
    expect(document.querySelector('.demo')?.textContent).toContain('a long demo sentence');
    person.click();
    await flushPromises();
    const sent = fetched.mock.calls.find(([address]) => address === '/api/auth/sign-in')?.[1]?.body;
    expect(JSON.parse(String(sent))).toEqual({ email: people[0]?.email, password: people[0]?.password });
  });
});

describe('where signing in leads', () => {
  it('is the page that was asked for, and never another host', () => {
    expect(targetAfterSignIn('/look-up?family=1&angle=30')).toBe('/look-up?family=1&angle=30');
    for (const hostile of [
      '//elsewhere.example',
      '/\\elsewhere.example',
      'https://elsewhere.example',
      undefined,
      ['/'],
    ])
      expect(targetAfterSignIn(hostile)).toBe('/');
  });
});
