import { nearestName } from '../engine/numeric/nearest-name.ts';
import { findFunction, functions } from './functions.ts';
import type { BinaryOperator, ExpressionFault, NameInfo, Node, Place, ValueType } from './types.ts';

/** The names that an expression may use. */
export type Scope = ReadonlyMap<string, NameInfo>;

export interface Checked {
  /** Undefined where a fault leaves it open. */
  readonly type: ValueType | undefined;
  /** The names it uses, each once, in order of appearance. */
  readonly names: readonly string[];
  readonly faults: readonly ExpressionFault[];
}

/** Checks names, arguments and types of a tree; every fault is reported, with what would be accepted. */
export function check(tree: Node, scope: Scope): Checked {
  const checker = new Checker(scope);
  const type = checker.typeOf(tree);
  return { type, names: [...checker.names], faults: checker.faults };
}

const IS: Readonly<Record<ValueType, string>> = {
  number: 'a number',
  truth: 'a comparison, true or false',
  word: 'a word',
};
const WANTED: Readonly<Record<ValueType, string>> = {
  number: 'A number is needed here',
  truth: 'A comparison is needed here, e.g. rows > 2',
  word: 'A word is needed here',
};
/** Arguments of `if`, in order. */
const THEN = 1;

class Checker {
  readonly names = new Set<string>();
  readonly faults: ExpressionFault[] = [];

  constructor(private readonly scope: Scope) {}

  typeOf(node: Node): ValueType | undefined {
    switch (node.kind) {
      case 'number':
      case 'word':
        return node.kind;
      case 'name':
        return this.nameType(node.name, node);
      case 'minus':
        this.want('number', node.operand);
        return 'number';
      case 'not':
        this.want('truth', node.operand);
        return 'truth';
      case 'binary':
        return this.binaryType(node.operator, node.left, node.right, node);
      case 'call':
        return this.callType(node.name, node.args, node);
    }
  }

  private nameType(name: string, place: Place): ValueType | undefined {
    const info = this.scope.get(name);
    if (info !== undefined) {
      if (info.unused !== undefined) this.fault(place, info.unused);
      this.names.add(name);
      return info.type;
    }
    if (findFunction(name) !== undefined) {
      return this.fault(place, `${name} is a function: write ${findFunction(name)?.form}.`);
    }
    const near = nearestName(name, [...this.scope.keys()]);
    const hint =
      near === undefined
        ? 'names are those of the parameters and of the catalogue choices; words to compare with stand in quotes'
        : `did you mean ${near}?`;
    return this.fault(place, `There is no name ${brief(name)}: ${hint}`);
  }

  private binaryType(operator: BinaryOperator, left: Node, right: Node, place: Place): ValueType {
    if (operator === 'and' || operator === 'or') {
      this.want('truth', left);
      this.want('truth', right);
      return 'truth';
    }
    if (operator === '=' || operator === '<>') {
      this.checkEquality(left, right, place);
      return 'truth';
    }
    this.want('number', left);
    this.want('number', right);
    return operator.startsWith('<') || operator.startsWith('>') ? 'truth' : 'number';
  }

  private checkEquality(left: Node, right: Node, place: Place): void {
    const types = [this.typeOf(left), this.typeOf(right)];
    const truth = types.indexOf('truth');
    if (truth >= 0) {
      this.fault([left, right][truth]!, 'Only numbers and words are compared; join comparisons by and, or.');
    } else if (types[0] !== undefined && types[1] !== undefined && types[0] !== types[1]) {
      this.fault(place, `${IS[types[0]]} is compared with ${IS[types[1]]}; both must be of one sort.`);
    } else {
      this.checkWord(left, right);
      this.checkWord(right, left);
    }
  }

  /** A parameter that is one of few words is compared only with those. */
  private checkWord(name: Node, word: Node): void {
    if (name.kind !== 'name' || word.kind !== 'word') return;
    const info = this.scope.get(name.name);
    if (info?.words === undefined || info.words.includes(word.value)) return;
    const near = nearestName(word.value, info.words);
    const some = [...new Set([...(near === undefined ? [] : [near]), ...info.words.slice(0, 5)])];
    const accepted = some.map((one) => `"${one}"`).join(', ');
    const more = some.length < info.words.length ? `for example ${accepted}` : accepted;
    this.fault(word, `${info.label} is never "${brief(word.value)}"; accepted are ${more}.`);
  }

  private callType(name: string, args: readonly Node[], place: Place): ValueType | undefined {
    const info = findFunction(name);
    if (info === undefined) {
      args.forEach((arg) => this.typeOf(arg));
      const own = { start: place.start, end: place.start + name.length };
      if (this.scope.has(name)) return this.fault(own, `${name} is no function; write * for a product.`);
      const names = functions.map((one) => one.name);
      const near = nearestName(name, names);
      const hint = near === undefined ? `accepted are ${names.join(', ')}.` : `did you mean ${near}?`;
      return this.fault(own, `There is no function ${brief(name)}: ${hint}`);
    }
    if (args.length < info.least || args.length > info.most) {
      args.forEach((arg) => this.typeOf(arg));
      return this.fault(place, `${name} was given ${args.length} arguments; write ${info.form}.`);
    }
    args.forEach((arg, index) => this.want(name === 'if' && index < THEN ? 'truth' : 'number', arg));
    return 'number';
  }

  private want(type: ValueType, node: Node): void {
    const found = this.typeOf(node);
    if (found !== undefined && found !== type) this.fault(node, `${WANTED[type]}; this is ${IS[found]}.`);
  }

  private fault({ start, end }: Place, message: string): undefined {
    this.faults.push({ start, end, message });
  }
}

const brief = (text: string): string => (text.length > 40 ? `${text.slice(0, 40)}…` : text);
