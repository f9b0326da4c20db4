import { parseArgs } from 'node:util';
import { fuzzers } from './registry.ts';

/*
 * npm run fuzz -- [--cases 10000] [--seed 1] [NAME…]
 * Runs the named fuzzers, or all, each for so many random cases. A seed repeats a run; without one it is drawn and printed.
 * Exit status: 0 all hold, 1 a case breaks one, 2 not understood.
 */
const MOST_CASES = 1e9;
const SEEDS = 2 ** 31;

interface Asked {
  readonly names: readonly string[];
  readonly cases: number;
  readonly seed: number;
}

function wholeNumber(name: string, text: string, least: number, most: number): number {
  const value = Number(text);
  if (/^\d+$/.test(text) && value >= least && value <= most) return value;
  throw new Error(`--${name} ${text} is not a whole number from ${least} to ${most}.`);
}

function asked(args: string[]): Asked {
  const options = { cases: { type: 'string' }, seed: { type: 'string' } } as const;
  const { values, positionals } = parseArgs({ args, options, allowPositionals: true });
  const known = fuzzers.map(({ name }) => name);
  for (const name of positionals) {
    if (!known.includes(name)) throw new Error(`"${name}" is no fuzzer; there are ${known.join(', ')}.`);
  }
  return {
    names: positionals.length > 0 ? positionals : known,
    cases: wholeNumber('cases', values.cases ?? '10000', 1, MOST_CASES),
    seed: wholeNumber('seed', values.seed ?? String(Math.floor(Math.random() * SEEDS)), 0, SEEDS - 1),
  };
}

function runAll({ names, cases, seed }: Asked): number {
  let broken = 0;
  console.log(`${cases} cases each, seed ${seed}`);
  for (const { name, about, run } of fuzzers.filter((one) => names.includes(one.name))) {
    const start = performance.now();
    try {
      run(cases, seed);
      console.log(`holds   ${name}: ${about} (${((performance.now() - start) / 1000).toFixed(1)} s)`);
    } catch (error) {
      broken += 1;
      const { cause, message } = error as Error;
      const broke = cause instanceof Error ? `${cause.message}\n` : '';
      console.log(`BROKEN  ${name}: ${about}\n${broke}${message}`);
    }
  }
  return broken === 0 ? 0 : 1;
}

function main(): number {
  let what: Asked;
  try {
    what = asked(process.argv.slice(2));
  } catch (error) {
    console.error((error as Error).message);
    return 2;
  }
  return runAll(what);
}

process.exitCode = main();
