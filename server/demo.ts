import { loadConfig } from './config/config.ts';
import { createContext, type App } from './context.ts';
import { demoFamilies } from './dev/demo/families.ts';
import { playFamily } from './dev/demo/story.ts';
import { addDemoPeople } from './features/people/service.ts';
import { readSettings, updateSettings } from './features/settings/service.ts';
import type { SignedInPerson } from './http/route.ts';
import { startJobs } from './jobs/jobs.ts';

/* Fills an empty catalogue with an invented firm; does nothing where there are people already. */

async function theFirm(app: App): Promise<void> {
  const { lockVersion, incrementKn: increment, factors, weldSymbols } = await readSettings(app);
  const firm = 'Harrow Quay Structural';
  await updateSettings(app, null, lockVersion, { firm, increment, factors, weldSymbols });
}

async function personWith(app: App, email: string): Promise<SignedInPerson> {
  const row = await app.db.models.Person.findOne({ where: { email } });
  if (!row) throw new Error(`There is no ${email}`);
  const { id, name, role } = row;
  return { id, name, email, role, sessionId: 'demo' };
}

async function fill(app: App): Promise<void> {
  if ((await addDemoPeople(app)) === 0) return;
  await theFirm(app);
  const cast = {
    manager: await personWith(app, 'standards@harrowquay.example'),
    engineer: await personWith(app, 'engineer@harrowquay.example'),
    admin: await personWith(app, 'admin@harrowquay.example'),
  };
  const jobs = await startJobs(app);
  try {
    for (const family of demoFamilies) await playFamily(app, cast, family);
  } finally {
    await jobs.stop();
  }
  console.log(
    'The invented firm Harrow Quay Structural is in the catalogue; its people are on the sign-in page.',
  );
}

const app = createContext(loadConfig({ ...process.env, LOG_LEVEL: process.env.LOG_LEVEL ?? 'warn' }));
try {
  await fill(app);
} finally {
  await app.db.close();
}
