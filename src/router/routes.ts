import type { Me } from '@shared/contracts/auth.ts';
import type { RouteRecordRaw } from 'vue-router';

declare module 'vue-router' {
  interface RouteMeta {
    /** The name of the page, for the window's title and for who listens. */
    title: string;
    /** Open to those who are not signed in. */
    open?: boolean;
    /** What the person must be able to do. */
    needs?: keyof Me['can'];
  }
}

export const routes: RouteRecordRaw[] = [
  { path: '/', name: 'home', component: () => import('../views/HomeView.vue'), meta: { title: 'Home' } },
  {
    path: '/sign-in',
    name: 'sign-in',
    component: () => import('../views/SignInView.vue'),
    meta: { title: 'Sign in', open: true },
  },
  {
    path: '/families',
    name: 'families',
    component: () => import('../views/FamilyListView.vue'),
    meta: { title: 'Families' },
  },
  {
    path: '/verification',
    name: 'verification',
    component: () => import('../views/VerificationView.vue'),
    meta: { title: 'Verification' },
  },
  {
    path: '/families/new',
    name: 'family-new',
    component: () => import('../views/FamilyEditorView.vue'),
    meta: { title: 'New family', needs: 'defineFamilies' },
  },
  {
    path: '/families/:id(\\d+)',
    name: 'family',
    component: () => import('../views/FamilyEditorView.vue'),
    meta: { title: 'Family' },
  },
  {
    path: '/revisions/:id(\\d+)',
    name: 'revision',
    component: () => import('../views/RevisionView.vue'),
    meta: { title: 'Revision' },
  },
  {
    path: '/revisions/:id(\\d+)/results',
    name: 'results',
    component: () => import('../views/ResultsView.vue'),
    meta: { title: 'Results' },
  },
  {
    path: '/revisions/:id(\\d+)/variants/:ordinal(\\d+)/sheet',
    name: 'sheet',
    component: () => import('../views/CalculationSheetView.vue'),
    meta: { title: 'Calculation sheet' },
  },
  {
    path: '/look-up',
    name: 'look-up',
    component: () => import('../views/LookUpView.vue'),
    meta: { title: 'Look up' },
  },
  {
    path: '/exports',
    name: 'exports',
    component: () => import('../views/ExportsView.vue'),
    meta: { title: 'Exports' },
  },
  {
    path: '/sweeps',
    name: 'sweeps',
    component: () => import('../views/SweepsView.vue'),
    meta: { title: 'Sweeps', needs: 'seeDrafts' },
  },
  {
    path: '/people',
    name: 'people',
    component: () => import('../views/PeopleView.vue'),
    meta: { title: 'People', needs: 'managePeople' },
  },
  {
    path: '/settings',
    name: 'settings',
    component: () => import('../views/SettingsView.vue'),
    meta: { title: 'Settings' },
  },
  {
    path: '/audit',
    name: 'audit',
    component: () => import('../views/AuditTrailView.vue'),
    meta: { title: 'Audit trail', needs: 'readAudit' },
  },
  {
    path: '/account',
    name: 'account',
    component: () => import('../views/AccountView.vue'),
    meta: { title: 'Your account' },
  },
  {
    path: '/:rest(.*)*',
    name: 'not-found',
    component: () => import('../views/NotFoundView.vue'),
    meta: { title: 'Not found' },
  },
];
