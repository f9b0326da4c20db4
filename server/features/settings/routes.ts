import { settingsResponse, updateSettingsRequest } from '@shared/contracts/audit.ts';
import { defineRoutes, route } from '../../http/route.ts';
import { presentSettings } from './presenter.ts';
import { readSettings, updateSettings } from './service.ts';

export const routes = defineRoutes('settings', [
  route({
    method: 'get',
    path: '/api/settings',
    summary: 'The firm, its rounding and its partial factors',
    who: 'signed-in',
    response: settingsResponse,
    handler: async ({ app, etag }) => {
      const settings = presentSettings(await readSettings(app));
      etag(settings.lockVersion);
      return settings;
    },
  }),
  route({
    method: 'put',
    path: '/api/settings',
    summary: 'Change the settings',
    who: ['admin'],
    body: updateSettingsRequest,
    ifMatch: true,
    response: settingsResponse,
    handler: async ({ app, person, body, ifMatch, etag }) => {
      const settings = presentSettings(await updateSettings(app, person.id, ifMatch, body));
      etag(settings.lockVersion);
      return settings;
    },
  }),
]);
