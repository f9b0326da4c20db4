import { exportListResponse, exportRequest } from '@shared/contracts/exports.ts';
import { defineRoutes, route } from '../../http/route.ts';
import { listExports } from './register-service.ts';
import { exportTables } from './service.ts';

const XLSX = 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet';

export const routes = defineRoutes('exports', [
  route({
    method: 'get',
    path: '/api/exports',
    summary: 'The register of exported tables, newest first',
    who: 'signed-in',
    response: exportListResponse,
    handler: async ({ app }) => ({ exports: await listExports(app) }),
  }),
  route({
    method: 'post',
    path: '/api/exports',
    summary: 'Make a workbook of capacity tables and enter it in the register',
    who: ['drafter', 'standards-manager', 'engineer'],
    body: exportRequest,
    response: 'stream',
    handler: async ({ app, person, body, res }) => {
      const { name, file, hash } = await exportTables(app, person, body);
      res.setHeader('Content-Type', XLSX);
      res.setHeader('Content-Length', file.length);
      // The name holds nothing that either form of RFC 6266 would have to escape.
      res.setHeader('Content-Disposition', `attachment; filename="${name}"; filename*=UTF-8''${name}`);
      res.setHeader('X-File-Hash', hash);
      res.end(file);
    },
  }),
]);
