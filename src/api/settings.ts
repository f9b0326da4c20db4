import { settingsResponse, type updateSettingsRequest } from '@shared/contracts/audit.ts';
import type { z } from 'zod';
import { get, request } from './http.ts';

export type Settings = z.output<typeof settingsResponse>;

export const fetchSettings = () => get(settingsResponse, '/api/settings');

export const saveSettings = (body: z.input<typeof updateSettingsRequest>, lockVersion: number) =>
  request(settingsResponse, 'PUT', '/api/settings', { body, lockVersion });
