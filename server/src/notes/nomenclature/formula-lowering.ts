import type { Expr } from '../../program/nodes.ts';
import type { Rational } from '../../quantities/rational.ts';
import type { Vocabulary } from '../../quantities/unit-result.ts';
import { pureNumber } from '../../quantities/unit.ts';
import { Dimension } from '../../quantities/dimension.ts';
import type { Span } from '../../text/span.ts';
import type { Interval } from './interval.ts';
import { applied } from './formula-functions.ts';
import { zeroFor } from './formula-result.ts';
import { literalTerm, negative, piTerm, power, product, quotient, sum, symbolTerm, type Term, termOf } from './formula-term.ts';
import type { Nomenclature, NomenclatureSymbol } from './model.ts';
import { Refusal, refuse } from './no-value.ts';

const deepest = 200;

/** Turns formulas into arithmetic on plain numbers, formulas that they name included; `box` fills with the symbols they read. */
export class FormulaLowering {
  readonly box = new Map<string, Interval>();
  private readonly done = new Map<string, Term | Refusal>();
  private readonly open = new Set<string>();

  constructor(private readonly nomenclature: Nomenclature) {}

  get vocabulary(): Vocabulary {
    return this.nomenclature.vocabulary;
  }

  /** The term of a formula. Throws a Refusal where it has no value. */
  formula(name: string, expr: Expr): Term {
    const known = this.done.get(name);
    if (known instanceof Refusal) throw known;
    if (known) return known;
    if (this.open.has(name)) refuse({ kind: 'circle', symbol: name, span: spanOf(expr) });
    if (this.open.size > deepest) refuse({ kind: 'too-long', span: spanOf(expr) });
    this.open.add(name);
    try {
      const term = this.term(expr);
      this.done.set(name, term);
      return term;
    } catch (error) {
      if (error instanceof Refusal && error.reason.kind !== 'circle' && error.reason.kind !== 'too-long') this.done.set(name, error);
      throw error;
    } finally {
      this.open.delete(name);
    }
  }

  private term(expr: Expr): Term {
    switch (expr.kind) {
      case 'number':
        return expr.value ? literalTerm(expr.value) : refuse({ kind: 'undefined', span: spanOf(expr) });
      case 'name':
        return this.symbol(expr.name, spanOf(expr));
      case 'unary':
        return expr.op === '-' ? negative(this.term(expr.operand)) : this.term(expr.operand);
      case 'binary':
        return this.binary(expr);
      case 'call':
        return expr.callee.kind === 'name' ? applied(expr.callee.name, expr.args.map((each) => this.term(each.value)), spanOf(expr)) : refuse({ kind: 'unknown-function', name: '', span: spanOf(expr) });
      default:
        return refuse({ kind: 'undefined', span: spanOf(expr) });
    }
  }

  private binary(expr: Extract<Expr, { kind: 'binary' }>): Term {
    const span = spanOf(expr);
    const [left, right] = [this.term(expr.left), this.term(expr.right)];
    switch (expr.op) {
      case '+':
        return sum(left, right, 1, span);
      case '-':
        return sum(left, right, -1, span);
      case '*':
        return product(left, right, span);
      case '/':
        return quotient(left, right, span);
      case '**':
        return this.raised(left, right, spanOf(expr.right), span);
      default:
        return refuse({ kind: 'undefined', span });
    }
  }

  private raised(base: Term, exponent: Term, exponentSpan: Span, span: Span): Term {
    if (!exponent.dimension.isOne) return refuse({ kind: 'exponent', span: exponentSpan });
    const constant = exponent.literal ?? this.constantOf(exponent);
    if (constant) return power(base, constant, span);
    if (!base.dimension.isOne) return refuse({ kind: 'exponent', span: exponentSpan });
    return termOf({ kind: 'exponential', base: base.node, exponent: exponent.node, span }, Dimension.one);
  }

  /** The exact number of a symbol without a unit that stands as an exponent. */
  private constantOf(exponent: Term): Rational | undefined {
    const symbol = exponent.node.kind === 'variable' ? this.nomenclature.symbols.get(exponent.node.name) : undefined;
    return symbol?.unit?.scale?.isOne === false ? undefined : symbol?.value;
  }

  private symbol(name: string, span: Span): Term {
    const formula = this.nomenclature.formulas.get(name);
    if (formula) return this.carried(formula, this.formula(name, formula.formula), span);
    const symbol = this.nomenclature.symbols.get(name);
    if (!symbol) return name === 'pi' ? piTerm() : refuse({ kind: 'unknown-symbol', symbol: name, span });
    const unit = symbol.unit ?? (symbol.unitSpan.end > symbol.unitSpan.start ? undefined : pureNumber);
    if (!unit?.scale || unit.level) return refuse({ kind: 'no-unit', symbol: name, span });
    this.box.set(name, this.interval(symbol, unit.scale.toNumber(), unit.offset?.kind === 'temperature' ? unit.offset.zero.toNumber() : 0, span));
    return symbolTerm(name, unit);
  }

  /** A formula in another: of the unit its own note says. */
  private carried(formula: NomenclatureSymbol, term: Term, span: Span): Term {
    const { unit } = formula;
    if (!unit) return { ...term, literal: undefined };
    zeroFor(term, unit, span);
    return { ...term, unit, literal: undefined, rotation: unit.rotation ?? term.rotation, pi: false, gauges: unit.offset?.kind === 'gauge' ? 1 : 0, gaugeOpen: false };
  }

  private interval(symbol: NomenclatureSymbol, scale: number, zero: number, span: Span): Interval {
    const inSi = (value: number): number => value * scale + zero;
    if (symbol.value) return { low: inSi(symbol.value.toNumber()), high: inSi(symbol.value.toNumber()) };
    return symbol.range ? { low: inSi(symbol.range.low), high: inSi(symbol.range.high) } : refuse({ kind: 'no-value', symbol: symbol.name, span });
  }
}

function spanOf(expr: Span): Span {
  return { start: expr.start, end: expr.end };
}
