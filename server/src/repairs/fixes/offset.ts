/** A point on a scale where an amount is needed: made absolute, or turned into a difference or a mean. */
import type { Value } from '../../constraints/value.ts';
import type { Detected } from '../../findings/collect.ts';
import { sameUnit, type Unit } from '../../quantities/unit.ts';
import type { Anchor } from '../../text/span.ts';
import type { Fix, Fixer } from '../fix.ts';
import type { Scene } from '../scene.ts';
import { type ScopeSymbol, symbolsAt } from '../scope.ts';
import { factorText, isLoose, spaced, withBrackets } from '../source.ts';

export const offset: Fixer = { kind: 'offset', forFinding: offsets };

const atmospheric = /atm|amb|baro|(?:^|_)p_?0(?:$|_)|^p_?a$|(?:^|_)sea/i;
const mostReferences = 2;
/** The standard atmosphere in Pa: ISO 2533. */
const atmosphere = 101325;

function offsets(detected: Detected, scene: Scene): readonly Fix[] {
  if (detected.cause.kind !== 'fault') return [];
  const { fault } = detected.cause;
  if (fault.kind === 'weight') return mean(fault.constraint.left, fault.weight, scene, fault.constraint.anchor.start);
  if (fault.kind !== 'point' || !scene.isHere(fault.constraint.anchor)) return [];
  const point = pointIn(fault.constraint.value);
  return point ? atPoint(point, fault.constraint.anchor, scene) : [];
}

/** The symbol in a value that counts from a zero of its own; the value itself where there is no one symbol. */
function pointIn(value: Value, depth = 0): Value | undefined {
  if (value.version?.note) return value.expr && value.version.note.unit.offset ? value : undefined;
  if (depth > 12) return undefined;
  const inside = value.from.flatMap((part) => pointIn(part, depth + 1) ?? []);
  return inside.length === 1 ? inside[0] : depth === 0 && value.expr ? value : undefined;
}

function atPoint(value: Value, anchor: Anchor, scene: Scene): readonly Fix[] {
  const expr = value.expr as NonNullable<Value['expr']>;
  const span = withBrackets(scene.text, { start: anchor.start + expr.start, end: anchor.start + expr.end });
  const code = scene.text.slice(span.start, span.end);
  const alone = /[(,]\s*$/.test(scene.text.slice(0, span.start)) && /^\s*[,)]/.test(scene.text.slice(span.end));
  const make = (inner: string, confidence: Fix['confidence'], cost: number, unit?: string): Fix => {
    const text = alone ? inner : `(${inner})`;
    return { kind: 'offset', confidence, edits: [{ ...span, text }], says: { what: 'rewrite', from: code, to: text, ...(unit ? { unit } : {}) }, cost };
  };
  const [plus, minus] = [spaced(scene, span.start, '+'), spaced(scene, span.start, '-')];
  const scope = symbolsAt(scene, anchor, expr).filter((symbol) => symbol.path !== value.version?.path);
  const unit = value.version?.note?.unit;
  if (unit?.offset?.kind === 'gauge') {
    const around = scope.filter((symbol) => symbol.note && isAtmospheric(symbol) && sameSize(symbol.note.unit, unit));
    const size = unit.scale && Number((atmosphere / unit.scale.toNumber()).toPrecision(6));
    return [...around.map((symbol) => make(`${code}${plus}${symbol.path}`, 'likely', 1)), ...(size ? [make(`${code}${plus}${size}`, 'choice', 3)] : [])];
  }
  const head = isLoose(expr) && expr.kind !== 'binary' ? factorText(code, expr) : code;
  const fahrenheit = value.measure?.readings.some((reading) => !reading.scale.isOne) === true;
  const absolute = fahrenheit
    ? [make(`(${head}${plus}459.67)${spaced(scene, span.start, '/')}1.8`, 'likely', 1, 'K'), make(`${head}${plus}459.67`, 'likely', 1.5, 'degR')]
    : [make(`${head}${plus}273.15`, 'likely', 1, 'K')];
  const references = scope.filter((symbol) => unit && symbol.note && sameUnit(symbol.note.unit, unit)).slice(0, mostReferences);
  return [...absolute, ...references.map((symbol) => make(`${head}${minus}${symbol.path}`, 'choice', 2, 'K'))];
}

/** An absolute pressure counted in the same unit as a gauge pressure. */
function sameSize(absolute: Unit, gauge: Unit): boolean {
  return absolute.dimension === gauge.dimension && !absolute.offset && absolute.scale !== undefined && gauge.scale !== undefined && absolute.scale.equals(gauge.scale);
}

function isAtmospheric({ path, note }: ScopeSymbol): boolean {
  return atmospheric.test(path.slice(path.lastIndexOf('.') + 1)) || /atmospher|ambient|baromet/i.test(note?.note.description ?? '');
}

/** Several temperatures added up: their mean, or what their number says. */
function mean(value: Value, weight: number, scene: Scene, start: number): readonly Fix[] {
  const { expr } = value;
  const count = Math.round(weight);
  if (!expr || Math.abs(count - weight) > 1e-6 || count < 2) return [];
  const span = withBrackets(scene.text, { start: start + expr.start, end: start + expr.end });
  const code = scene.text.slice(span.start, span.end);
  const text = `${factorText(code, expr)}${spaced(scene, span.start, '/')}${count}`;
  return [{ kind: 'offset', confidence: 'choice', edits: [{ ...span, text }], says: { what: 'rewrite', from: code, to: text }, cost: 1 }];
}
