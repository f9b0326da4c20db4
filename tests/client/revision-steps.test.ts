import { flushPromises } from '@vue/test-utils';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import RevisionActions from '../../src/components/revision/RevisionActions.vue';
import { mountInApp } from '../support/client/mount.ts';
import { buttonNamed } from './queries.ts';
import { json, revisionWith, sweepAt } from './support/revisions.ts';

const fetched = vi.fn<typeof fetch>();
const routes = ['family', 'exports'].map((name) => ({
  path: `/${name}/:id?`,
  name,
  component: { render: () => null },
}));
const changed = vi.fn();

const show = (can: Parameters<typeof revisionWith>[0], more?: Parameters<typeof revisionWith>[1]) =>
  mountInApp(RevisionActions, { props: { revision: revisionWith(can, more), onChanged: changed }, routes });

const names = () => [...document.querySelectorAll('button, a')].map((one) => (one.textContent ?? '').trim());
const dialog = () => document.querySelector<HTMLElement>('[role="dialog"]');
/** The button of the open dialog; the page behind it may have one of the same name. */
function confirmWith(name: string): HTMLButtonElement {
  const found = [...(dialog()?.querySelectorAll('button') ?? [])].find(
    (one) => one.textContent?.trim() === name,
  );
  if (!found) throw new Error(`The dialog has no button "${name}"`);
  return found;
}
async function write(selector: string, text: string): Promise<void> {
  const field = dialog()?.querySelector<HTMLInputElement | HTMLTextAreaElement>(selector);
  if (!field) throw new Error(`The dialog has no ${selector}`);
  field.value = text;
  field.dispatchEvent(new Event('input', { bubbles: true }));
  await flushPromises();
}
const sentTo = (path: string) => fetched.mock.calls.find(([address]) => address === path)?.[1];

beforeEach(() => {
  changed.mockReset();
  fetched.mockReset();
  fetched.mockImplementation(() => Promise.resolve(json(200, revisionWith({}, { state: 'checked' }))));
  vi.stubGlobal('fetch', fetched);
});

describe('the steps of a revision', () => {
  it.each([
    ['sweep', 'Start the sweep'],
    ['submit', 'Submit for check'],
    ['sign', 'Sign'],
    ['return', 'Return to the author'],
    ['publish', 'Publish'],
    ['lock', 'Lock'],
    ['withdraw', 'Withdraw'],
    ['edit', 'Edit the definition'],
    ['export', 'Export a table'],
  ] as const)('shows only what the server allows: %s', async (ability, name) => {
    await show({ [ability]: true });
    expect(names()).toEqual([name]);
  });

  it('starts a sweep on the version that is shown', async () => {
    fetched.mockImplementation(() => Promise.resolve(json(202, sweepAt(0, { state: 'queued' }))));
    await show({ sweep: true });
    buttonNamed('Start the sweep').click();
    await flushPromises();
    expect(sentTo('/api/revisions/31/sweep')?.headers).toMatchObject({ 'if-match': '"4"' });
    expect(changed).toHaveBeenCalledWith(null);
  });

  it('signs with a comment, and not without one', async () => {
    await show({ sign: true }, { state: 'in-check' });
    buttonNamed('Sign').click();
    await flushPromises();
    confirmWith('Sign').click();
    await flushPromises();
    expect(dialog()?.textContent).toContain('at least 3 characters');
    expect(fetched).not.toHaveBeenCalled();
    await write('textarea', '  Bolt shear and bearing by hand, ten cells.  ');
    confirmWith('Sign').click();
    await flushPromises();
    const sent = sentTo('/api/revisions/31/sign');
    expect(JSON.parse(String(sent?.body))).toEqual({ comment: 'Bolt shear and bearing by hand, ten cells.' });
    expect(sent?.headers).toMatchObject({ 'if-match': '"4"' });
    expect(changed).toHaveBeenCalledWith(expect.objectContaining({ state: 'checked' }));
  });

  it('publishes only when the code of the family is typed', async () => {
    await show({ publish: true }, { state: 'checked' });
    buttonNamed('Publish').click();
    await flushPromises();
    expect(confirmWith('Publish').disabled).toBe(true);
    await write('input', 'GP-70');
    expect(confirmWith('Publish').disabled).toBe(true);
    await write('input', 'GP-07');
    confirmWith('Publish').click();
    await flushPromises();
    expect(JSON.parse(String(sentTo('/api/revisions/31/publish')?.body))).toEqual({ confirm: 'GP-07' });
  });

  it('says that somebody was quicker, reads anew and keeps what was typed', async () => {
    fetched.mockImplementation(() =>
      Promise.resolve(json(412, { type: 'x', title: 'Changed', status: 412, code: 'stale-version' })),
    );
    await show({ withdraw: true }, { state: 'published', letter: 'A' });
    buttonNamed('Withdraw').click();
    await flushPromises();
    await write('textarea', 'Wrong bolt class in the order.');
    confirmWith('Withdraw').click();
    await flushPromises();
    expect(changed).toHaveBeenCalledWith(null);
    expect(dialog()?.querySelector('[role="alert"]')?.textContent).toContain('Somebody else changed');
    expect(dialog()?.querySelector('textarea')?.value).toBe('Wrong bolt class in the order.');
  });
});
