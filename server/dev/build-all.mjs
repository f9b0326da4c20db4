import { build } from './build.mjs';
import { sayFailure } from './output.mjs';

try {
  await build();
} catch (error) {
  sayFailure(error);
  process.exitCode = 1;
}
