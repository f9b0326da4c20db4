import { idParams, type Role } from '@shared/contracts/common.ts';
import {
  commentRequest,
  confirmRequest,
  reasonRequest,
  revisionResponse,
  saveDefinitionRequest,
  savedVersionsResponse,
  submitRequest,
} from '@shared/contracts/revisions.ts';
import type { z } from 'zod';
import type { App } from '../../context.ts';
import { defineRoutes, route, type SignedInPerson } from '../../http/route.ts';
import { viewRevision, type RevisionView } from './change-service.ts';
import {
  lockRevision,
  publishRevision,
  returnRevision,
  signRevision,
  submitRevision,
  withdrawRevision,
} from './life-service.ts';
import { listSaves } from './history-service.ts';
import { saveDefinition } from './save-service.ts';

const managers: readonly Role[] = ['standards-manager'];
const checkers: readonly Role[] = ['standards-manager', 'engineer'];

/** A step of a revision's life: POST with If-Match, the revision as it then stands. */
function step<B extends z.ZodType>(
  name: string,
  summary: string,
  who: readonly Role[],
  body: B,
  change: (
    body: z.output<B>,
  ) => (app: App, person: SignedInPerson, id: number, version: number) => Promise<RevisionView>,
) {
  return route({
    method: 'post',
    path: `/api/revisions/:id/${name}`,
    summary,
    who,
    params: idParams,
    body,
    ifMatch: true,
    response: revisionResponse,
    handler: async ({ app, person, params, body: given, ifMatch, etag }) => {
      const revision = await change(given as z.output<B>)(app, person as SignedInPerson, params.id, ifMatch);
      etag(revision.lockVersion);
      return revision;
    },
  });
}

export const routes = defineRoutes('revisions', [
  route({
    method: 'get',
    path: '/api/revisions/:id',
    summary: 'A revision and what you may do to it',
    who: 'signed-in',
    params: idParams,
    response: revisionResponse,
    handler: async ({ app, person, params, etag }) => {
      const revision = await viewRevision(app, person, params.id);
      etag(revision.lockVersion);
      return revision;
    },
  }),
  route({
    method: 'get',
    path: '/api/revisions/:id/saves',
    summary: 'Saved versions of the definition',
    who: managers,
    params: idParams,
    response: savedVersionsResponse,
    handler: ({ app, person, params }) => listSaves(app, person, params.id),
  }),
  route({
    method: 'put',
    path: '/api/revisions/:id/definition',
    summary: 'Save the definition',
    who: managers,
    params: idParams,
    body: saveDefinitionRequest,
    ifMatch: true,
    response: revisionResponse,
    handler: async ({ app, person, params, body, ifMatch, etag }) => {
      const revision = await saveDefinition(app, person, params.id, ifMatch, body.definition);
      etag(revision.lockVersion);
      return revision;
    },
  }),
  step('submit', 'Hand to the checkers', managers, submitRequest, ({ comment }) => submitRevision(comment)),
  step('sign', 'Sign as the second person', checkers, commentRequest, ({ comment }) => signRevision(comment)),
  step('return', 'Return to the author', checkers, commentRequest, ({ comment }) => returnRevision(comment)),
  step('publish', 'Publish under the next letter', managers, confirmRequest, ({ confirm }) =>
    publishRevision(confirm),
  ),
  step('lock', 'Lock for good', ['admin'], confirmRequest, ({ confirm }) => lockRevision(confirm)),
  step('withdraw', 'Withdraw, with a reason', managers, reasonRequest, ({ reason }) =>
    withdrawRevision(reason),
  ),
]);
