import type { Transaction } from 'sequelize';
import type { z } from 'zod';
import type { updateSettingsRequest } from '@shared/contracts/audit.ts';
import type { App } from '../../context.ts';
import type { SettingsRow } from '../../database/models/settings.ts';
import { problem } from '../../http/problems.ts';
import { appendAudit } from '../audit/service.ts';
import { presentSettings } from './presenter.ts';

type Change = z.output<typeof updateSettingsRequest>;

async function theRow(app: App, transaction?: Transaction): Promise<SettingsRow> {
  const lock = transaction ? { transaction, lock: transaction.LOCK.UPDATE } : {};
  const row = await app.db.models.Settings.findByPk(1, lock);
  if (!row) throw new Error('The settings row is missing.');
  return row;
}

/** The firm's name, rounding increment (kN) and partial factors, which new definitions begin with. */
export const readSettings = (app: App): Promise<SettingsRow> => theRow(app);

/**
 * Changes the settings; published revisions keep what they were made with.
 * @param actorId null for the program itself
 * @throws {ProblemError} stale-version
 */
export async function updateSettings(
  app: App,
  actorId: number | null,
  lockVersion: number,
  change: Change,
): Promise<SettingsRow> {
  return app.db.transaction(async (transaction) => {
    const row = await theRow(app, transaction);
    const before = presentSettings(row);
    if (row.lockVersion !== lockVersion) problem('stale-version', { current: before });
    const { increment, ...rest } = change;
    await row.update({ ...rest, incrementKn: increment }, { transaction });
    await appendAudit(
      transaction,
      {
        actorId,
        action: 'settings.changed',
        subjectType: 'settings',
        subjectId: 1,
        detail: { before, after: presentSettings(row) },
      },
      app.clock.now(),
    );
    return row;
  });
}
