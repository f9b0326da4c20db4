/** The door of expressions: read once, checked against the names there are, compiled to a function over numbers. */
export type { Scope } from './check.ts';
export type { Evaluate, Failure, Frame } from './compile.ts';
export {
  frameFor,
  readExpression,
  slotsOf,
  valueIn,
  type Expression,
  type ExpressionResult,
} from './expression.ts';
export { functions, keywords, operators, type FunctionInfo } from './functions.ts';
export { formulaReader } from './formulas.ts';
export { orderOf } from './order.ts';
export { scopeOf } from './scope.ts';
export { EXPRESSION_LIMITS, type ExpressionFault, type NameInfo, type ValueType } from './types.ts';
