/** A nomenclature file as a page: its columns, its parts, and what its characters are. */
import type { TextEdit } from '../frontends/frontend.ts';
import { isNumber, readLine } from '../notes/nomenclature/line.ts';
import type { Line, SymbolLine } from '../notes/nomenclature/model.ts';
import { splitLines } from '../notes/nomenclature/read.ts';
import type { Expr } from '../program/nodes.ts';
import type { Span } from '../text/span.ts';

interface Row {
  readonly start: number;
  readonly text: string;
  readonly line: Line;
}

/** Edits that set symbols, units, values and descriptions of neighbouring lines in columns. Lines that cannot be read stay as they are. */
export function alignedColumns(text: string): readonly TextEdit[] {
  return blocksOf(rowsOf(text)).flatMap((block) => {
    const cells = block.map(cellsOf);
    const widths = [0, 1, 2].map((column) => Math.max(0, ...cells.map((row) => width(row?.[column] ?? ''))));
    return block.flatMap((row, at): readonly TextEdit[] => {
      const own = cells[at];
      if (!own) return [];
      const aligned = own.slice(0, 3).map((cell, column) => cell + ' '.repeat((widths[column] as number) - width(cell))).filter((_, column) => (widths[column] as number) > 0);
      const written = [...aligned, own[3]].join('  ').trimEnd();
      return written === row.text ? [] : [{ start: row.start, end: row.start + row.text.length, text: written }];
    });
  });
}

/** Parts that may be folded away: what follows a comment line up to the next blank line or comment line. Lines from zero. */
export function foldedParts(text: string): readonly { readonly first: number; readonly last: number; readonly comment: boolean }[] {
  const rows = rowsOf(text);
  const parts: { first: number; last: number; comment: boolean }[] = [];
  const isComment = (at: number): boolean => /^\s*#/.test(rows[at]?.text ?? '');
  const isBlank = (at: number): boolean => (rows[at]?.text.trim() ?? '') === '';
  for (let at = 0; at < rows.length; at++) {
    if (isBlank(at) || (at > 0 && !isBlank(at - 1) && !isComment(at))) continue;
    let head = at;
    while (isComment(head + 1)) head++;
    if (isComment(at) && head > at) parts.push({ first: at, last: head, comment: true });
    const from = isComment(at) ? head : at;
    let last = from;
    while (last + 1 < rows.length && !isBlank(last + 1) && !isComment(last + 1)) last++;
    if (last > from) parts.push({ first: from, last, comment: false });
    at = Math.max(last, head);
  }
  return parts;
}

export type TokenKind = 'symbol' | 'unit' | 'number' | 'function' | 'keyword' | 'comment';

/** What the characters of a nomenclature file are, in order. */
export function tokensOf(text: string): readonly (Span & { readonly kind: TokenKind; readonly declared: boolean })[] {
  return rowsOf(text).flatMap((row) => {
    const found: (Span & { kind: TokenKind; declared: boolean })[] = [];
    const add = (span: Span, kind: TokenKind, declared = false): void => {
      if (span.end > span.start) found.push({ start: row.start + span.start, end: row.start + span.end, kind, declared });
    };
    lineTokens(row, add);
    const comment = /(?:^|(?<=\s))#.*$/.exec(row.text);
    if (comment) add({ start: comment.index, end: row.text.length }, 'comment');
    return found.sort((a, b) => a.start - b.start);
  });
}

type Add = (span: Span, kind: TokenKind, declared?: boolean) => void;

function lineTokens({ text, line }: Row, add: Add): void {
  switch (line.kind) {
    case 'symbol':
      add(line.nameSpan, 'symbol', true);
      add(line.unitSpan, 'unit');
      if (line.value) formulaTokens(line.value, add);
      else if (line.range) for (const number of text.slice(line.unitSpan.end).matchAll(/[-+]?\d[\d.]*(?:[eE][-+]?\d+)?/g)) {
        const start = line.unitSpan.end + number.index;
        if (start < text.length - line.description.length) add({ start, end: start + number[0].replace(/\.+$/, '').length }, 'number');
      }
      return;
    case 'relation': {
      const words = /\bdepends\s+on\b/.exec(text);
      for (const name of text.matchAll(/[\p{L}_][\p{L}\p{N}_.]*/gu)) {
        const inside = words && name.index >= words.index && name.index < words.index + words[0].length;
        if (!inside && name.index < line.span.end) add({ start: name.index, end: name.index + name[0].length }, 'symbol');
      }
      if (words) add({ start: words.index, end: words.index + words[0].length }, 'keyword');
      return;
    }
    case 'unit':
    case 'base': {
      const start = text.indexOf('unit');
      add({ start, end: start + 4 }, 'keyword');
      add(line.nameSpan, 'unit', true);
      if (line.kind === 'unit') add(line.ofSpan, 'unit');
      return;
    }
    case 'signature': {
      const name = /[\p{L}_.][\p{L}\p{N}_.]*(?=\s*\()/u.exec(text);
      if (name) add({ start: name.index, end: name.index + name[0].length }, 'function', true);
      for (const unit of text.slice(0, line.span.end).matchAll(/\[([^\]]*)\]/g)) add({ start: unit.index + 1, end: unit.index + 1 + (unit[1] as string).length }, 'unit');
      return;
    }
    case 'blank':
  }
}

function formulaTokens(expr: Expr, add: Add): void {
  if (expr.kind === 'name') add(expr, 'symbol');
  else if (expr.kind === 'number') add(expr, 'number');
  else if (expr.kind === 'call') {
    add(expr.callee, 'function');
    for (const { value } of expr.args) formulaTokens(value, add);
  } else if (expr.kind === 'binary') {
    formulaTokens(expr.left, add);
    formulaTokens(expr.right, add);
  } else if (expr.kind === 'unary') formulaTokens(expr.operand, add);
}

function rowsOf(text: string): readonly Row[] {
  return splitLines(text).map((row) => ({ ...row, line: readLine(row.text) }));
}

/** Symbol lines that follow each other. */
function blocksOf(rows: readonly Row[]): readonly (readonly Row[])[] {
  const blocks: Row[][] = [];
  let open = false;
  for (const row of rows) {
    const fits = row.line.kind === 'symbol' && row.line.problems.length === 0;
    if (fits && open) blocks.at(-1)?.push(row);
    else if (fits) blocks.push([row]);
    open = fits;
  }
  return blocks;
}

/** Name, unit, value or range, and the rest. Undefined for what is no symbol. Formulas are left where they stand: they differ too much in length. */
function cellsOf({ text, line }: Row): readonly [string, string, string, string] | undefined {
  if (line.kind !== 'symbol') return undefined;
  const unit = line.unitText === undefined ? '' : `[${line.unitText.trim()}]`;
  const from = line.unitText === undefined ? line.nameSpan.end : line.unitSpan.end + 1;
  const rest = text.slice(from);
  const behind = restOf(line, rest);
  const middle = rest.slice(0, rest.length - behind.length).trim().replace(/,$/, '');
  const indent = text.slice(0, line.nameSpan.start);
  if (line.value && !isNumber(line.value)) return [indent + line.name, unit, '', `${middle}${behind.trim() === '' ? '' : `  ${behind.trim()}`}`];
  return [indent + line.name, unit, middle, behind.trim()];
}

/** The description and the comment behind it. */
function restOf(line: SymbolLine, rest: string): string {
  const at = line.description === '' ? -1 : rest.lastIndexOf(line.description);
  if (at >= 0) return rest.slice(at);
  const comment = /(?:^|(?<=\s))#.*$/.exec(rest);
  return comment ? rest.slice(comment.index) : '';
}

/** Columns that a text takes, as far as an editor's font is even. */
function width(text: string): number {
  return [...text].length;
}
