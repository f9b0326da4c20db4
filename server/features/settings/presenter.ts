import type { z } from 'zod';
import type { settingsResponse } from '@shared/contracts/audit.ts';
import type { SettingsRow } from '../../database/models/settings.ts';

export const presentSettings = (row: SettingsRow): z.input<typeof settingsResponse> => ({
  firm: row.firm,
  increment: row.incrementKn,
  factors: row.factors,
  weldSymbols: row.weldSymbols,
  lockVersion: row.lockVersion,
});
