/** What the formats are given: findings in lines and columns, a file at a time. */
import type { FindingCode, Severity } from '../findings/finding.ts';
import type { CheckResult } from '../service/contract.ts';
import { LineIndex } from '../text/line-index.ts';
import type { Span } from '../text/span.ts';
import type { CellRegion } from './cells.ts';

/** Lines and columns from one, columns in UTF-16 units; the end is behind the last character. */
export interface Region {
  readonly line: number;
  readonly column: number;
  readonly endLine: number;
  readonly endColumn: number;
}

export interface ReportedPlace extends Region {
  /** Relative to the working folder with slashes where it lies in it, else absolute. */
  readonly file: string;
  readonly message: string;
  /** The first line of the region. */
  readonly source: string;
  /** In a notebook: the cell, all cells counted from 1. Lines and columns are then those of the cell. */
  readonly cell?: number;
  /** In a notebook: the region of the file as it is stored. */
  readonly stored?: Region;
}

export interface Reported extends ReportedPlace {
  readonly code: FindingCode;
  readonly severity: Severity;
  readonly related: readonly ReportedPlace[];
}

export interface Summary {
  readonly files: number;
  readonly functions: number;
  readonly notes: number;
  readonly unread: number;
  /** Files with at least one finding that is no hint. */
  readonly flagged: number;
  readonly byCode: Readonly<Partial<Record<FindingCode, number>>>;
  readonly bySeverity: Readonly<Record<Severity, number>>;
  readonly seconds: number;
  /** Symbols that take part in arithmetic, and how many of them have a known unit; counted on request. */
  readonly units: { readonly known: number; readonly all: number } | undefined;
  /** Files and folders that could not be read, with the reason. */
  readonly unreadable: readonly { readonly file: string; readonly problem: string }[];
}

/** One form of output. Parts come in order and are written at once, so that no format has to hold what it has shown. */
export interface Format {
  begin(): string;
  file(findings: readonly Reported[]): string;
  end(summary: Summary): string;
}

export interface Places {
  /** The texts of other files. */
  readonly textOf: (file: string) => string | undefined;
  /** A path as it is shown. */
  readonly nameOf: (file: string) => string;
  /** Where the result is one of a notebook: places in its program as places in its cells. */
  readonly inCells?: ((span: Span) => CellRegion) | undefined;
}

/** Turns the offsets of one result into places. */
export function reportedOf(result: CheckResult, { textOf, nameOf, inCells }: Places): readonly Reported[] {
  const indexes = new Map<string, LineIndex>();
  const indexOf = (file: string): LineIndex => {
    let index = indexes.get(file);
    if (!index) {
      index = new LineIndex(file === result.file ? result.text : (textOf(file) ?? ''));
      indexes.set(file, index);
    }
    return index;
  };
  const place = (file: string, span: Span, message: string): ReportedPlace => {
    if (inCells && file === result.file) return { file: nameOf(file), ...inCells(span), message };
    const index = indexOf(file);
    const region = regionOf(index, span);
    return { file: nameOf(file), ...region, message, source: index.lineText(region.line - 1) };
  };
  return result.findings.map((finding) => ({
    ...place(result.file, finding.span, finding.message),
    code: finding.code,
    severity: finding.severity,
    related: finding.related.map((each) => place(each.file, each.span, each.message)),
  }));
}

/** A span in lines and columns. */
export function regionOf(index: LineIndex, span: Span): Region {
  const start = index.position(Math.min(span.start, index.text.length));
  const end = index.position(Math.min(Math.max(span.end, span.start), index.text.length));
  return { line: start.line + 1, column: start.column + 1, endLine: end.line + 1, endColumn: end.column + 1 };
}
