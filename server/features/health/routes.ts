import { z } from 'zod';
import { problem } from '../../http/problems.ts';
import { defineRoutes, route } from '../../http/route.ts';
import { whatIsMissing } from './service.ts';

export const routes = defineRoutes('health', [
  route({
    method: 'get',
    path: '/api/health',
    summary: 'The process is alive',
    who: 'public',
    response: z.object({ status: z.literal('alive') }),
    handler: () => ({ status: 'alive' as const }),
  }),
  route({
    method: 'get',
    path: '/api/ready',
    summary: 'Everything is up: requests can be served',
    who: 'public',
    response: z.object({ status: z.literal('ready') }),
    handler: async ({ app }) => {
      const missing = await whatIsMissing(app);
      if (missing.length > 0) {
        problem('unavailable', { detail: `Waiting for ${missing.join(', ')}.`, retryAfter: 2 });
      }
      return { status: 'ready' as const };
    },
  }),
]);
