import { auditListResponse, auditQuery, auditVerificationResponse } from '@shared/contracts/audit.ts';
import { defineRoutes, route } from '../../http/route.ts';
import { listAudit } from './list-service.ts';
import { presentEntry } from './presenter.ts';
import { verifyAudit } from './verification-service.ts';

export const routes = defineRoutes('audit', [
  route({
    method: 'get',
    path: '/api/audit',
    summary: 'The audit trail, newest first',
    who: ['admin'],
    query: auditQuery,
    response: auditListResponse,
    handler: async ({ app, query }) => {
      const entries = (await listAudit(app.db, query)).map(presentEntry);
      const last = entries.at(-1);
      return { entries, next: last && last.seq > 1 && entries.length === query.count ? last.seq : null };
    },
  }),
  route({
    method: 'get',
    path: '/api/audit/verification',
    summary: 'Work every hash of the trail out anew',
    who: ['admin'],
    response: auditVerificationResponse,
    handler: async ({ app }) => {
      const { faults, ...rest } = await verifyAudit(app.db);
      return { ...rest, faults: [...faults] };
    },
  }),
]);
