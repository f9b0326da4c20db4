import type { Response } from 'express';
import {
  changePasswordRequest,
  demoPeopleResponse,
  meResponse,
  signInRequest,
} from '@shared/contracts/auth.ts';
import type { App } from '../../context.ts';
import { clearCookies, readCookie, setCookie } from '../../http/cookies.ts';
import { problem, ProblemError } from '../../http/problems.ts';
import { defineRoutes, route } from '../../http/route.ts';
import { demoPeopleHere } from '../people/demo-service.ts';
import { presentMe } from './presenter.ts';
import { changePassword, signIn } from './service.ts';
import { endSession, endSessionOf, renewSession, type Tokens } from './session-service.ts';
import { ACCESS_SECONDS } from './tokens.ts';

function handOver(app: App, res: Response, { access, refresh, expires }: Tokens): void {
  const soon = new Date(app.clock.now().getTime() + ACCESS_SECONDS * 1000);
  setCookie(res, app.config, 'access', access, soon);
  if (refresh !== null) setCookie(res, app.config, 'refresh', refresh, expires);
}

export const routes = defineRoutes('auth', [
  route({
    method: 'post',
    path: '/api/auth/sign-in',
    summary: 'Sign in; the answer carries two cookies',
    who: 'public',
    body: signInRequest,
    response: 'empty',
    handler: async ({ app, body, req, res }) => {
      handOver(app, res, await signIn(app, body, req.ip ?? ''));
    },
  }),
  route({
    method: 'post',
    path: '/api/auth/refresh',
    summary: 'Renew the session',
    who: 'public',
    response: 'empty',
    handler: async ({ app, req, res }) => {
      try {
        handOver(app, res, await renewSession(app, readCookie(req, app.config, 'refresh')));
      } catch (error) {
        if (error instanceof ProblemError && error.code === 'unauthenticated') clearCookies(res, app.config);
        throw error;
      }
    },
  }),
  route({
    method: 'post',
    path: '/api/auth/sign-out',
    summary: 'End the session',
    who: 'public',
    response: 'empty',
    handler: async ({ app, person, req, res }) => {
      const refresh = readCookie(req, app.config, 'refresh');
      if (person) await endSession(app, person.sessionId);
      if (refresh !== undefined) await endSessionOf(app, refresh);
      clearCookies(res, app.config);
    },
  }),
  route({
    method: 'get',
    path: '/api/auth/me',
    summary: 'Who is signed in, and what they may do',
    who: 'signed-in',
    response: meResponse,
    handler: ({ person }) => presentMe(person),
  }),
  route({
    method: 'post',
    path: '/api/auth/password',
    summary: 'Change the own password; every other session ends',
    who: 'signed-in',
    body: changePasswordRequest,
    response: 'empty',
    handler: ({ app, person, body, req }) => changePassword(app, person, body, req.ip ?? ''),
  }),
  route({
    method: 'get',
    path: '/api/auth/demo-people',
    summary: 'The invented people of the demo and their password; only in demo mode',
    who: 'public',
    response: demoPeopleResponse,
    handler: async ({ app }) =>
      app.config.demo ? { people: [...(await demoPeopleHere(app))] } : problem('not-found'),
  }),
]);
