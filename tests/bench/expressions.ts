import { frameFor, type NameInfo, readExpression, slotsOf } from '@shared/expressions/index.ts';
import { median, timed } from './timing.ts';

const COUNT = 2_000_000;
const ROUNDS = 5;

const examples = [
  '2*edge + (rows-1)*pitch',
  'if(edge >= 1.2 * hole and rows > 2, ceil(2.5 * hole, 5), min(pitch, 70))',
];

/** Prints how many values a second the compiled expressions give, beside the same arithmetic written out. */
export function benchExpressions(): void {
  const names = ['edge', 'rows', 'pitch', 'hole'];
  const scope = new Map(
    names.map((name): [string, NameInfo] => [name, { name, type: 'number', label: name, unit: '' }]),
  );
  const slots = slotsOf(scope);
  const frame = frameFor(slots);
  frame.numbers.set([40, 4, 70, 22]);
  let sum = 0;
  const rate = (one: () => number) =>
    COUNT /
    median(
      Array.from({ length: ROUNDS }, () =>
        timed(() => {
          for (let index = 0; index < COUNT; index++) {
            frame.numbers[0] = 40 + (index & 15);
            sum += one();
          }
        }),
      ),
    );
  const { numbers } = frame;
  const plain = rate(() => 2 * numbers[0]! + (numbers[1]! - 1) * numbers[2]!);
  for (const text of examples) {
    const read = readExpression(text, scope, 'number', slots);
    if (!read.ok) throw new Error(read.faults[0]?.message);
    const compiled = rate(() => read.expression.evaluate(frame));
    console.log(`${(compiled / 1e6).toFixed(1)} million values/s: ${text}`);
  }
  console.log(
    `${(plain / 1e6).toFixed(1)} million values/s: the first written out (checksum ${sum.toFixed(0)})`,
  );
}
