import { engineCatalogue } from '../catalogue.ts';
import { evaluateCase } from './evaluate-case.ts';
import { print } from './print.ts';
import { readCases, UnreadableInput } from './read-cases.ts';

/*
 * npm run --silent evaluate -- cases.json
 * Prints a JSON array with one result a case, in order. `-` reads standard input.
 * Exit status: 0 also when cases are rejected, 2 when the input cannot be read.
 */
try {
  const cases = readCases(process.argv[2]);
  const lines = cases.map((given) => JSON.stringify(evaluateCase(given, engineCatalogue())));
  print(lines.length === 0 ? '[]\n' : `[\n${lines.join(',\n')}\n]\n`);
} catch (error) {
  if (!(error instanceof UnreadableInput)) throw error;
  process.stderr.write(`${error.message}\n`);
  process.exitCode = 2;
}
