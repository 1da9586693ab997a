import type { Expr } from '../../program/nodes.ts';
import type { NamedConstant, Signature } from '../../program/signature.ts';
import type { Rational } from '../../quantities/rational.ts';
import type { Unit } from '../../quantities/unit.ts';
import type { UnitHint, Vocabulary } from '../../quantities/unit-result.ts';
import type { LoadedSignatures } from '../../signatures/load.ts';
import type { Span } from '../../text/span.ts';
import type { NomenclatureProblem } from './problem.ts';

export type { NomenclatureFault, NomenclatureProblem } from './problem.ts';

/** One line of a nomenclature file; spans are relative to the line. Whatever could be read is there, beside the problems. */
export type Line = (BlankLine | SymbolLine | RelationLine | SignatureLine | UnitLine | BaseLine) & { readonly problems: readonly NomenclatureProblem[] };

/** Nothing, a comment, or a line that could not be read at all. */
export interface BlankLine {
  readonly kind: 'blank';
}

/** A symbol with its unit, and a value, a range or a formula. */
export interface SymbolLine {
  readonly kind: 'symbol';
  readonly name: string;
  readonly nameSpan: Span;
  readonly unitText: string | undefined;
  readonly unitSpan: Span;
  readonly value: Expr | undefined;
  readonly range: Range | undefined;
  readonly description: string;
}

export interface Range {
  readonly low: number;
  readonly high: number;
}

/** `P depends on N, D`. */
export interface RelationLine {
  readonly kind: 'relation';
  readonly dependent: string;
  readonly on: readonly string[];
  readonly span: Span;
}

export interface SignatureLine {
  readonly kind: 'signature';
  readonly signatures: readonly Signature[];
  readonly span: Span;
}

/** `unit crate = 18.5 kg`; the factor is a product of numbers and π. */
export interface UnitLine {
  readonly kind: 'unit';
  readonly name: string;
  readonly nameSpan: Span;
  readonly factor: string;
  readonly of: string;
  readonly ofSpan: Span;
}

/** `unit item`: a base dimension of its own, counted in that unit. */
export interface BaseLine {
  readonly kind: 'base';
  readonly name: string;
  readonly nameSpan: Span;
}

/** A symbol as the file declares it; spans are those of the file. */
export interface NomenclatureSymbol {
  readonly name: string;
  readonly nameSpan: Span;
  /** Undefined where the line has no unit, or one that cannot be read. */
  readonly unit: Unit | undefined;
  readonly unitSpan: Span;
  readonly hints: readonly UnitHint[];
  /** A plain number behind `=`, counted in the unit. */
  readonly value: Rational | undefined;
  readonly range: Range | undefined;
  readonly description: string;
}

/** A symbol that a formula gives: `Re [1] = rho*N*D^2/mu`. */
export interface NomenclatureFormula extends NomenclatureSymbol {
  /** In the common form; spans are those of the file. */
  readonly formula: Expr;
}

/** A whole file. `symbols` holds every symbol once, formulas included: the first line of a symbol counts. */
export interface Nomenclature {
  readonly file: string;
  /** Lines with the offset each begins at. */
  readonly lines: readonly { readonly start: number; readonly text: string; readonly line: Line }[];
  readonly symbols: ReadonlyMap<string, NomenclatureSymbol>;
  readonly formulas: ReadonlyMap<string, NomenclatureFormula>;
  readonly relations: readonly RelationLine[];
  readonly signatures: readonly Signature[];
  /** Library constants that the file declares: dotted names with a number. */
  readonly constants: readonly NamedConstant[];
  /** The units of files further out, and the file's own. */
  readonly vocabulary: Vocabulary;
  /** Signatures and constants by name. */
  readonly table: LoadedSignatures;
  /** What could not be read; spans are those of the file. */
  readonly problems: readonly NomenclatureProblem[];
}
