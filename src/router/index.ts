import { createRouter, createWebHistory } from 'vue-router';
import { useSessionStore } from '../stores/session.ts';
import { routes } from './routes.ts';

/** A path of this program to go on to after signing in; anything else leads home. */
export function targetAfterSignIn(to: unknown): string {
  return typeof to === 'string' && /^\/(?![/\\])/.test(to) ? to : '/';
}

export function createAppRouter() {
  const router = createRouter({
    history: createWebHistory(),
    routes,
    scrollBehavior: (to, from, saved) => saved ?? (to.path === from.path ? undefined : { top: 0 }),
  });

  router.beforeEach(async (to) => {
    const session = useSessionStore();
    try {
      await session.ready();
    } catch {
      // The shell says that the server cannot be reached, and offers to try again.
      return true;
    }
    if (to.name === 'sign-in') return session.me ? targetAfterSignIn(to.query.to) : true;
    if (session.me || to.meta.open) return true;
    return { name: 'sign-in', query: to.fullPath === '/' ? {} : { to: to.fullPath } };
  });

  router.afterEach((to) => {
    document.title = `${to.meta.title} · Backmark`;
  });
  return router;
}
