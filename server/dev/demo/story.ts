import { setTimeout as delay } from 'node:timers/promises';
import type { App } from '../../context.ts';
import { createFamily, startRevision } from '../../features/families/service.ts';
import {
  lockRevision,
  publishRevision,
  returnRevision,
  signRevision,
  submitRevision,
  withdrawRevision,
} from '../../features/revisions/service.ts';
import { saveDefinition } from '../../features/revisions/save-service.ts';
import { startSweep, viewSweep } from '../../features/sweeps/service.ts';
import type { SignedInPerson } from '../../http/route.ts';
import type { DemoFamily, Fate } from './families.ts';

/** The people who act. */
export interface Cast {
  readonly manager: SignedInPerson;
  readonly engineer: SignedInPerson;
  readonly admin: SignedInPerson;
}

type Step = (app: App, person: SignedInPerson, id: number, version: number) => Promise<unknown>;

/** How far along its life each fate lies; what comes before is done too. */
const order: readonly Fate[] = ['draft', 'swept', 'in-check', 'checked', 'published', 'locked'];

/** Plays the life of one family through the services that the screens use. */
export async function playFamily(app: App, cast: Cast, family: DemoFamily): Promise<void> {
  const { code, title, definition, fate, next } = family;
  const created = await createFamily(app, cast.manager, { code, title, definition });
  await playRevision(app, cast, code, Number(created.working?.id), fate);
  if (!next) return;
  const started = await startRevision(app, cast.manager, Number(created.id));
  const id = Number(started.working?.id);
  await act(app, cast.manager, id, (...given) => saveDefinition(...given, next.definition));
  await playRevision(app, cast, code, id, next.fate, true);
}

async function playRevision(
  app: App,
  cast: Cast,
  code: string,
  id: number,
  fate: Fate,
  argued = false,
): Promise<void> {
  const { manager, engineer, admin } = cast;
  const reach = (step: Fate) => order.indexOf(fate === 'withdrawn' ? 'locked' : fate) >= order.indexOf(step);
  if (reach('swept')) await sweepNow(app, manager, id);
  if (reach('in-check')) await act(app, manager, id, submitRevision('Ready for a second pair of eyes.'));
  if (argued) {
    const comment = 'Please say on the drawing why the pitch is now 65 mm, then sweep it again.';
    await act(app, engineer, id, returnRevision(comment));
    await sweepNow(app, manager, id);
    await act(app, manager, id, submitRevision('The note is on the standard drawing.'));
  }
  const signed = 'Checked six cells by hand over all governing limit states; all agree to the kilonewton.';
  if (reach('checked')) await act(app, engineer, id, signRevision(signed));
  if (reach('published')) await act(app, manager, id, publishRevision(code));
  if (reach('locked')) await act(app, admin, id, lockRevision(code));
  const reason = 'The shop no longer stocks M16 bolts of class 8.8; use GP-04.';
  if (fate === 'withdrawn') await act(app, manager, id, withdrawRevision(reason));
}

/** Does a step on the revision as it stands. */
async function act(app: App, person: SignedInPerson, id: number, step: Step): Promise<void> {
  const row = await app.db.models.Revision.findByPk(id, { attributes: ['lockVersion'] });
  await step(app, person, id, row?.lockVersion ?? 0);
}

async function sweepNow(app: App, manager: SignedInPerson, id: number): Promise<void> {
  let sweepId = 0;
  await act(app, manager, id, async (...given) => {
    sweepId = Number((await startSweep(...given)).id);
  });
  for (;;) {
    const { state, error } = await viewSweep(app, manager, sweepId);
    if (state === 'done') return;
    if (state === 'failed' || state === 'cancelled')
      throw new Error(`A demo sweep is ${state}: ${error ?? ''}`);
    await delay(20);
  }
}
