/** What still keeps the program from serving; each is named in words. */
export interface Readiness {
  /** What is waited for, e.g. "the database"; empty when ready. */
  waitingFor(): readonly string[];
  wait(reason: string): void;
  done(reason: string): void;
}

/** Begins with nothing to wait for. */
export function createReadiness(): Readiness {
  const reasons = new Set<string>();
  return {
    waitingFor: () => [...reasons],
    wait: (reason) => void reasons.add(reason),
    done: (reason) => void reasons.delete(reason),
  };
}
