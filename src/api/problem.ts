import { problemSchema, type Fault, type Problem } from '@shared/contracts/common.ts';

/** What went wrong with a request, in words for the person at the screen. */
export class ProblemError extends Error {
  readonly problem: Problem;

  constructor(problem: Problem) {
    super(problem.detail ?? problem.title);
    this.name = 'ProblemError';
    this.problem = problem;
  }

  get status(): number {
    return this.problem.status;
  }

  get code(): string {
    return this.problem.code;
  }

  /** Every faulty field; empty when the fault is not a field's. */
  get faults(): readonly Fault[] {
    return this.problem.errors ?? [];
  }
}

const made = (code: string, status: number, title: string, detail: string): ProblemError =>
  new ProblemError({ type: 'about:blank', code, status, title, detail });

export const unreachable = () =>
  made(
    'unreachable',
    0,
    'The server cannot be reached',
    'Check the network, then try again. What you typed is still here.',
  );

export const unexpectedAnswer = (where: string) =>
  made(
    'unexpected-answer',
    0,
    'The answer was not understood',
    `The server answered ${where} in a way that this page does not know. Reload the page; it may be older than the server.`,
  );

/** Reads problem+json, or makes a problem of an answer that has none. */
export async function problemOf(response: Response): Promise<ProblemError> {
  const body: unknown = await response.json().catch(() => undefined);
  const parsed = problemSchema.safeParse(body);
  if (parsed.success) return new ProblemError(parsed.data);
  return made(
    'unknown',
    response.status,
    'The request failed',
    `The server answered with status ${response.status}.`,
  );
}

/** True for the two answers that say that somebody else was quicker. */
export const isConflict = (error: unknown): error is ProblemError =>
  error instanceof ProblemError && (error.status === 412 || error.code === 'stale-version');

/** An aborted request is not a fault; whoever aborted it no longer wants the answer. */
export const isAbort = (error: unknown): boolean =>
  error instanceof DOMException && error.name === 'AbortError';
