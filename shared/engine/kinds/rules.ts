import type { Rejection } from '../types.ts';

/** A rule of validity. Which side of the limit is allowed follows from `least`. */
export interface Rule {
  readonly id: string;
  /** What is measured, e.g. `Pitch`. */
  readonly subject: string;
  /** What is wrong when it is broken, e.g. `Pitch too small`. */
  readonly title: string;
  readonly clause: string;
  readonly unit: string;
  /** The value must reach the limit; otherwise it must not exceed it. */
  readonly least: boolean;
}

/** Gives the rules of a kind's list with the clause that its basis has for them. Called for every variant of a sweep. */
export function rulesOf<Id extends string>(
  list: readonly { readonly id: Id; readonly subject: string; readonly title: string }[],
): (id: Id, clause: string, unit: string, least?: boolean) => Rule {
  const byId = new Map(list.map((entry) => [entry.id, entry]));
  return (id, clause, unit, least = true) => {
    const entry = byId.get(id);
    if (entry === undefined) throw new Error(`The list has no rule ${id}`);
    return { id, subject: entry.subject, title: entry.title, clause, unit, least };
  };
}

/** Lengths that differ by less are equal: a given 54.0 meets a limit of 2.7 x 20. mm. */
export const TOLERANCE = 1e-6;

/** Whether a value keeps a rule. */
export function keeps(least: boolean, value: number, limit: number): boolean {
  return least ? value >= limit - TOLERANCE : value <= limit + TOLERANCE;
}

/** Gathers broken rules with their numbers. */
export class Rejections {
  readonly list: Rejection[] = [];

  /** Notes a rule when it is broken. */
  check(rule: Rule, value: number, limit: number): void {
    if (!keeps(rule.least, value, limit)) this.add(rule, value, limit);
  }

  /** Notes a broken rule. */
  add(rule: Rule, value: number, limit: number, message?: string): void {
    const relation = rule.least ? 'is below the least' : 'exceeds the greatest';
    const unit = rule.unit === '' ? '' : ` ${rule.unit}`;
    const text = `${rule.subject}: ${short(value)}${unit} ${relation} ${short(limit)}${unit}`;
    const { id, title, clause } = rule;
    this.list.push({ rule: id, title, clause, message: message ?? text, value, limit, unit: rule.unit });
  }
}

function short(value: number): string {
  return String(Math.round(value * 100) / 100);
}
