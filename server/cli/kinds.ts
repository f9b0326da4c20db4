import { engineCatalogue } from '../catalogue.ts';
import { describeKinds } from './describe-kinds.ts';
import { print } from './print.ts';

/*
 * npm run --silent kinds
 * Prints the parameters of every detail kind, the design bases, and the catalogue names, as JSON.
 */
print(`${JSON.stringify(describeKinds(engineCatalogue()), null, 2)}\n`);
