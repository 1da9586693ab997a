/** A group as a product or quotient of two simpler characteristic numbers. */
import { Rational } from '../quantities/rational.ts';
import type { Instance } from './instances.ts';
import type { CompositePart, Exponents, Recognition } from './types.ts';

/** How many numbers are tried as parts; the best known first. */
const partLimit = 80;

/** Finds the pairs whose powers ±1 make up a group: O(parts) look-ups once the parts are indexed. */
export class Composer {
  private readonly parts: readonly Instance[];
  private readonly byPowers = new Map<string, Instance>();

  constructor(instances: readonly Instance[]) {
    const usual = instances.filter(({ form }) => form.entry.standing < 3);
    const best = [...usual].sort((a, b) => a.form.entry.standing - b.form.entry.standing || b.evidence - a.evidence);
    for (const instance of best.slice(0, partLimit)) {
      const key = keyOf(instance.powers);
      if (!this.byPowers.has(key)) this.byPowers.set(key, instance);
    }
    this.parts = [...this.byPowers.values()];
  }

  /** At most two ways to write the group, of parts that are smaller than it is. */
  compose(exponents: Exponents, recognised: readonly Recognition[]): readonly (readonly CompositePart[])[] {
    const power = recognised[0]?.power ?? Rational.one;
    const target = new Map([...exponents].map(([name, value]) => [name, value.div(power)]));
    const limit = sizeOf(target);
    const own = new Set(recognised.map((one) => one.number));
    const found = new Map<string, CompositePart[]>();
    for (const first of this.parts) {
      for (const sign of [Rational.one, Rational.minusOne]) {
        const pair = this.pairWith(first, sign, target);
        if (!pair || pair.some(({ instance }) => sizeOf(instance.powers) >= limit || own.has(nameOf(instance)))) continue;
        if (nameOf(pair[0].instance) === nameOf(pair[1].instance)) continue;
        const ordered = [...pair].sort((a, b) => b.power.compare(a.power) || sizeOf(b.instance.powers) - sizeOf(a.instance.powers));
        const parts = ordered.map((part) => ({ number: nameOf(part.instance), symbol: part.instance.form.entry.symbol, power: part.power.mul(power) }));
        found.set(parts.map((part) => `${part.number}^${part.power}`).join(' '), parts);
      }
    }
    const quotients = (parts: readonly CompositePart[]) => parts.filter((part) => part.power.sign !== power.sign).length;
    return [...found.values()].sort((a, b) => quotients(a) - quotients(b)).slice(0, 2);
  }

  private pairWith(first: Instance, sign: Rational, target: Exponents): readonly [Part, Part] | undefined {
    const left = new Map(target);
    for (const [name, power] of first.powers) left.set(name, (left.get(name) ?? Rational.zero).sub(power.mul(sign)));
    for (const other of [Rational.one, Rational.minusOne]) {
      const second = this.byPowers.get(keyOf(left, other));
      if (second) return [{ instance: first, power: sign }, { instance: second, power: other }];
    }
    return undefined;
  }
}

interface Part {
  readonly instance: Instance;
  readonly power: Rational;
}

function nameOf(instance: Instance): string {
  return instance.form.entry.names[0] as string;
}

function keyOf(powers: Exponents, sign: Rational = Rational.one): string {
  const kept = [...powers].filter(([, power]) => !power.isZero).sort(([a], [b]) => (a < b ? -1 : 1));
  return kept.map(([name, power]) => `${name}^${power.mul(sign)}`).join(' ');
}

function sizeOf(powers: Exponents): number {
  return [...powers.values()].reduce((sum, power) => sum + power.abs().toNumber(), 0);
}
