import { build, ensureBuilt } from './build.mjs';
import { sayFailure } from './output.mjs';

/* Builds client and server; with --when-changed only if the sources are not those of the last build. */
try {
  if (process.argv.includes('--when-changed')) await ensureBuilt();
  else await build();
} catch (error) {
  sayFailure(error);
  process.exitCode = 1;
}
