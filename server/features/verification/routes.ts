import { verificationResponse } from '@shared/contracts/verification.ts';
import { defineRoutes, route } from '../../http/route.ts';
import { verification } from './service.ts';

export const routes = defineRoutes('verification', [
  route({
    method: 'get',
    path: '/api/verification',
    summary: 'What the engine was checked against: published values beside its own',
    who: 'signed-in',
    response: verificationResponse,
    handler: () => verification(),
  }),
]);
