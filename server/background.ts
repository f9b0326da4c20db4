import type { App, Jobs } from './context.ts';
import { startJobs } from './jobs/jobs.ts';

/** What runs beside the requests, from readiness to the end: started in this order, stopped all at once. */
export const background: readonly ((app: App) => Promise<Jobs>)[] = [startJobs];
