/** The forms of every characteristic number, compiled once: kinds of quantity with exponents, and the derived spellings. */
import type { Rational } from '../quantities/rational.ts';
import { Scale } from '../quantities/scale.ts';
import { primitive } from './matrix.ts';
import { factorOf, productOf } from './notation.ts';
import type { NumberEntry } from './numbers/entry.ts';
import { numberFamilies } from './numbers/index.ts';
import { type QuantityKind, quantityKinds } from './quantity-kinds.ts';

/** `number = factor · ∏ kind^exponent`. */
export interface Form {
  readonly entry: NumberEntry;
  readonly field: string;
  readonly factor: Scale;
  readonly roles: readonly Role[];
}

export interface Role {
  readonly kind: QuantityKind;
  readonly exponent: Rational;
}

/** What may stand for a kind in a form: μ/ρ for ν, k/(ρ c) for α, l² for an area. */
const substitutions: Readonly<Record<string, string>> = {
  'kinematic viscosity': 'dynamic viscosity / density',
  'thermal diffusivity': 'thermal conductivity / density / specific heat capacity',
  area: 'length^2',
};

/** Every form of every number, given and derived. */
export const forms: readonly Form[] = numberFamilies.flatMap(({ field, numbers }) =>
  numbers.flatMap((entry) => entry.forms.flatMap((text) => compile(entry, field, text))),
);

/** Forms whose dimensions and exponents agree, up to a common power, with a product of symbols. */
export function formsLike(parts: readonly { readonly dimensionKey: string; readonly exponent: Rational }[]): readonly Form[] {
  return bySignature.get(signatureOf(parts)) ?? [];
}

const bySignature = new Map<string, Form[]>();
for (const form of forms) {
  const key = signatureOf(form.roles.map(({ kind, exponent }) => ({ dimensionKey: kind.dimension.key, exponent })));
  bySignature.set(key, [...(bySignature.get(key) ?? []), form]);
}

/** The same text for a product and all its powers. */
function signatureOf(parts: readonly { readonly dimensionKey: string; readonly exponent: Rational }[]): string {
  const whole = primitive(parts.map(({ exponent }) => exponent));
  const sides = [whole, whole.map((power) => power.neg())].map((powers) =>
    parts.map(({ dimensionKey }, at) => `${dimensionKey}^${powers[at]}`).sort().join('|'),
  );
  return sides.sort()[0] as string;
}

function compile(entry: NumberEntry, field: string, text: string): Form[] {
  const factored = /^((?:\d|pi)\S*) \* (.*)$/.exec(text);
  const factor = factored ? factorOf(factored[1] as string) : Scale.one;
  const given = productOf(factored?.[2] ?? text);
  const all = Object.keys(substitutions).reduce((variants, kind) => variants.flatMap((one) => [one, ...substituted(one, kind)]), [given]);
  return all.map((product) => ({ entry, field, factor, roles: product.map(roleOf) }));
}

type Product = { kind: string; exponent: Rational }[];

function substituted(product: Product, kind: string): Product[] {
  const at = product.findIndex((part) => part.kind === kind);
  if (at < 0) return [];
  const found = product[at] as Product[number];
  // Two lengths in one form are two different lengths, and an area replaced by a length squared could be either.
  if (kind === 'area' && product.filter((part) => part.kind === 'length').length > 1) return [];
  const result = product.filter((_part, index) => index !== at);
  for (const { kind: name, exponent } of productOf(substitutions[kind] as string)) {
    const power = exponent.mul(found.exponent);
    const same = result.findIndex((part) => part.kind === name);
    if (same < 0) result.push({ kind: name, exponent: power });
    else result[same] = { kind: name, exponent: (result[same] as Product[number]).exponent.add(power) };
  }
  return [result.filter((part) => !part.exponent.isZero)];
}

function roleOf({ kind, exponent }: Product[number]): Role {
  const found = quantityKinds.get(kind);
  if (!found) throw new RangeError(`no kind of quantity is called ${kind}`);
  return { kind: found, exponent };
}
