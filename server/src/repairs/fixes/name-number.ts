/** A bare number that hides a unit: named as a noted constant, or its relation declared empirical. */
import { literalNumber, readLiteral } from '../../constraints/literal.ts';
import type { Detected } from '../../findings/collect.ts';
import { hiddenNumbers, neededDimension } from '../../solver/hidden.ts';
import type { Dimension } from '../../quantities/dimension.ts';
import { knownConstant } from '../../quantities/known-constants.ts';
import { coherentUnit } from '../../quantities/print-unit.ts';
import type { Expr, NumberExpr } from '../../program/nodes.ts';
import { contradictionsOf, goalsOf, type Contradiction } from '../goals.ts';
import type { Fix, Fixer } from '../fix.ts';
import { positionsOf } from '../positions.ts';
import type { Scene } from '../scene.ts';
import { empirical } from './empirical.ts';

export const nameNumber: Fixer = { kind: 'name-number', forFinding: namings };

/** Names for constants that formulas carry under one symbol; common practice. */
const symbols: readonly (readonly [RegExp, string])[] = [
  [/gravit|free fall/i, 'g'], [/Stefan/i, 'sigma_sb'], [/molar gas/i, 'R_univ'], [/gas constant/i, 'R_gas'], [/Boltzmann/i, 'k_B'], [/Planck/i, 'h_planck'],
  [/speed of light/i, 'c_light'], [/Avogadro/i, 'N_A'], [/Faraday/i, 'F_const'], [/standard atmosphere$|atmospheric pressure/i, 'p_atm'], [/^density of water/i, 'rho_w'], [/^specific weight/i, 'gamma_w'], [/^specific heat of water/i, 'c_w'],
];

function namings(detected: Detected, scene: Scene): readonly Fix[] {
  if (detected.code !== 'hidden-unit') return [];
  const faults = contradictionsOf(detected).filter((fault) => fault.hidden && scene.isHere(fault.constraint.anchor));
  const [first] = faults;
  if (!first) return [];
  const asFault = hiddenNumbers(first.constraint, first.involved);
  const need = neededDimension(first, asFault);
  return [...(need ? numbersOf(first, scene).flatMap((number) => named(number, first, scene)) : []), ...empirical(first, scene)];
}

interface Bare {
  readonly expr: NumberExpr;
  readonly start: number;
  /** What it would have to carry. */
  readonly dimension: Dimension;
}

/** The impure numbers that multiply into a contradiction, each with the dimension that it would have to carry alone. */
function numbersOf(fault: Contradiction, scene: Scene): readonly Bare[] {
  return goalsOf(fault).filter((goal) => goal.distance === 0).flatMap((goal) => {
    const sightings = scene.sightings(scene.pieceAt(goal.anchor, goal.roots[0]?.expr ?? fault.constraint.span));
    return positionsOf(goal, sightings).flatMap(({ anchor, expr, ratio }): readonly Bare[] => {
      if (expr.kind !== 'number' || !expr.value || readLiteral(expr.value, expr.text).pure) return [];
      return [{ expr, start: anchor.start + expr.start, dimension: ratio }];
    });
  });
}

function named({ expr, start, dimension }: Bare, fault: Contradiction, scene: Scene): readonly Fix[] {
  const size = literalNumber(readLiteral(expr.value as NonNullable<NumberExpr['value']>, expr.text));
  const known = knownConstant(size, dimension);
  const statement = scene.statementAt(fault.constraint.anchor, placeIn(expr));
  if (!statement || statement.kind === 'if' || statement.kind === 'loop') return [];
  const { lines, style } = scene.inputs;
  const line = lines.lineAt(start);
  const first = lines.lineAt(fault.constraint.anchor.start + statement.start);
  const indent = /^[ \t]*/.exec(lines.lineText(first))?.[0] ?? '';
  if (lines.lineStart(first) + indent.length !== fault.constraint.anchor.start + statement.start || line < first) return [];
  const unit = known ? known.unit : coherentUnit(dimension);
  const name = freeName(known ? (symbols.find(([pattern]) => pattern.test(known.name))?.[1] ?? 'coeff') : 'coeff', scene.text);
  const breaks = scene.text.includes('\r\n') ? '\r\n' : '\n';
  const above = lines.lineStart(first);
  const written = style.define(name, expr.text, `[${unit}]${known ? ` ${known.name}` : ''}`);
  if (written === undefined) return [];
  const definition = `${indent}${written}${breaks}`;
  return [{
    kind: 'name-number', confidence: known ? 'likely' : 'choice', cost: known ? 0.5 : 3,
    edits: [{ start: above, end: above, text: definition }, { start, end: start + expr.end - expr.start, text: name }],
    says: { what: 'name-number', number: expr.text, name, unit, ...(known ? { constant: known.name } : {}) },
  }];
}

function placeIn(expr: Expr): { readonly start: number; readonly end: number } {
  return { start: expr.start, end: expr.end };
}

/** The name, or the name with a number behind it, where the text has it already. */
function freeName(name: string, text: string): string {
  const taken = (each: string): boolean => new RegExp(`(?<![\\w.])${each}(?!\\w)`).test(text);
  if (!taken(name)) return name;
  let at = 1;
  while (taken(`${name}_${at}`)) at++;
  return `${name}_${at}`;
}
