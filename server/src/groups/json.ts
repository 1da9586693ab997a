/** The machine-readable form of groups: a contract, version 1. */
import { expression, type HostSyntax, hostSyntax } from './express.ts';
import { recognitionText } from './names.ts';
import type { GroupsResult, Unmatched } from './types.ts';

export interface GroupsDocument {
  readonly version: 1;
  readonly relations: readonly RelationDocument[];
}

export interface RelationDocument {
  readonly file: string;
  /** One-based; in a notebook that of the cell. */
  readonly line: number;
  /** In a notebook only: the cell, all cells counted from 1. */
  readonly cell?: number;
  readonly dependent: string | null;
  readonly symbols: readonly { readonly name: string; readonly dimension: string | null; readonly unit: string | null; readonly description: string | null }[];
  readonly rank: number;
  readonly repeating: readonly string[];
  readonly groups: readonly GroupDocument[];
  readonly unmatched: readonly { readonly symbol: string; readonly reason: string }[];
  /** Other valid sets of repeating symbols than the one used. */
  readonly alternatives: number;
  /** False where `alternatives` is a lower bound. */
  readonly alternativesExact: boolean;
  /** Rows are base dimensions, columns the symbols whose unit is known, in the order of `symbols`. */
  readonly matrix: { readonly bases: readonly string[]; readonly columns: readonly string[]; readonly exponents: readonly (readonly string[])[] };
}

export interface GroupDocument {
  readonly exponents: Readonly<Record<string, string>>;
  readonly recognised: readonly string[];
  readonly expression: string;
}

/** One relation of the document. `recognised` names numbers with power and factor; the expression is in `syntax`. */
export function relationDocument(result: GroupsResult, file: string, line: number, syntax: HostSyntax = hostSyntax.python): RelationDocument {
  return {
    file,
    line,
    dependent: result.relation.dependent ?? null,
    symbols: result.relation.symbols.map(({ name, dimension, unit, description }) => ({
      name,
      dimension: dimension?.toString() ?? null,
      unit: unit?.text ?? null,
      description: description ?? null,
    })),
    rank: result.rank,
    repeating: result.repeating,
    groups: result.groups.map((group) => ({
      exponents: Object.fromEntries([...group.exponents].map(([name, power]) => [name, power.toString()])),
      recognised: group.recognised.map(recognitionText),
      expression: expression(group.exponents, syntax, group.order),
    })),
    unmatched: result.unmatched.map((one) => ({ symbol: one.symbol, reason: unmatchedText(one) })),
    alternatives: Math.max(0, result.sets.count - (result.repeating.length > 0 ? 1 : 0)),
    alternativesExact: result.sets.exact,
    matrix: { bases: result.bases, columns: result.columns, exponents: result.matrix.map((row) => row.map(String)) },
  };
}

/** `mass: nothing else here has mass`. */
export function unmatchedText(one: Unmatched): string {
  switch (one.reason) {
    case 'unknown-unit':
      return 'its unit is not known';
    case 'lone-dimension':
      return `${baseName(one.base)}: nothing else here has ${baseName(one.base)}`;
    case 'lone-combination':
      return `${one.bases.map(baseName).join(', ')}: the other symbols cannot make up this combination`;
  }
}

const baseNames: Readonly<Record<string, string>> = { L: 'length', M: 'mass', T: 'time', I: 'electric current', Θ: 'temperature', N: 'amount of substance', J: 'luminous intensity' };

/** The English name of a base dimension; declared ones are named as they were declared. */
export function baseName(base: string): string {
  return baseNames[base] ?? base;
}
