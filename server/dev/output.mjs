/** Writes one line for the person at the terminal. Standard output stays free for what a command prints. */
export function say(text) {
  process.stderr.write(`${text}\n`);
}

/** A failure the person can mend: shown as a sentence, without a stack. */
export class PlainError extends Error {}

/** Prints a failure: a sentence for what the person can mend, the whole stack for a fault of ours. */
export function sayFailure(error) {
  say(error instanceof PlainError ? error.message : (error?.stack ?? String(error)));
}
