import type { Expr } from '../../program/nodes.ts';
import type { Signature } from '../../program/signature.ts';
import type { Vocabulary } from '../../quantities/unit-result.ts';
import type { LoadedSignatures } from '../../signatures/load.ts';
import type { Span } from '../../text/span.ts';

/** One line of a nomenclature file; spans are relative to the line. */
export type Line =
  | { readonly kind: 'blank' }
  | SymbolLine
  | { readonly kind: 'relation'; readonly dependent: string; readonly on: readonly string[]; readonly span: Span }
  | { readonly kind: 'signature'; readonly signatures: readonly Signature[]; readonly span: Span }
  | { readonly kind: 'unit'; readonly name: string; readonly factor: string; readonly of: string; readonly span: Span; readonly ofSpan: Span }
  | { readonly kind: 'base'; readonly name: string; readonly span: Span }
  | { readonly kind: 'problem'; readonly problem: NomenclatureProblem };

/** A symbol with its unit, and a value, a range or a formula. */
export interface SymbolLine {
  readonly kind: 'symbol';
  readonly name: string;
  readonly nameSpan: Span;
  readonly unitText: string | undefined;
  readonly unitSpan: Span;
  readonly value: Expr | undefined;
  readonly range: { readonly low: number; readonly high: number } | undefined;
  readonly description: string;
  /** What follows an expression that ends too early: it could not be read. */
  readonly rest?: NomenclatureProblem;
}

export interface NomenclatureProblem {
  readonly span: Span;
  readonly message: string;
}

/** A whole file. */
export interface Nomenclature {
  readonly file: string;
  /** Lines with the offset each begins at. */
  readonly lines: readonly { readonly start: number; readonly text: string; readonly line: Line }[];
  readonly vocabulary: Vocabulary;
  readonly table: LoadedSignatures;
}
