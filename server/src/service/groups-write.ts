/** Where groups go in a script, and how they are written there. */
import type { Understood } from '../analyze.ts';
import { definitions, groupNames, hostSyntax, type GroupsResult, type RelationSymbol } from '../groups/index.ts';
import type { HostStyle, TextEdit } from '../frontends/frontend.ts';
import type { AssignStmt, Stmt } from '../program/nodes.ts';
import { Scale } from '../quantities/scale.ts';
import type { FoundRelation } from './relations.ts';
import { assignmentsOf } from './groups-symbols.ts';
import { productOf, sameProduct } from './groups-product.ts';

/** Lines of plain words set beside a relation: within its documentation, as comment lines otherwise. */
export function wordsEdit(understood: Understood, found: FoundRelation, style: HostStyle, lines: readonly string[]): TextEdit {
  const { text } = understood.parsed;
  const index = understood.lines;
  const line = index.lineAt(found.span.start);
  const source = index.lineText(line);
  const indent = /^[ \t]*/.exec(source)?.[0] ?? '';
  const marked = lines.map((each) => `${indent}${style.comment} ${each}`);
  if (found.origin === 'function') {
    const start = index.lineStart(index.lineAt(found.where.chunk.anchor.start + (found.where.piece?.fn.start ?? 0)));
    return { start, end: start, text: marked.map((each) => each + lineBreak(text)).join('') };
  }
  if (found.origin === 'selection') return { start: index.lineStart(line), end: index.lineStart(line), text: marked.map((each) => each + lineBreak(text)).join('') };
  const inWords = isDocumentation(found);
  const at = inWords ? found.span.end : index.lineEnd(line);
  return { start: at, end: at, text: (inWords ? lines.map((each) => indent + each) : marked).map((each) => lineBreak(text) + each).join('') };
}

/** Definitions of the groups in the language of the file; undefined where no group can be computed there. */
export function definitionsEdit(understood: Understood, found: FoundRelation, result: GroupsResult, style: HostStyle): TextEdit | undefined {
  return found.language === 'nomenclature' ? nomenclatureEdit(understood, found, result) : scriptEdit(understood, found, result, style);
}

function nomenclatureEdit(understood: Understood, found: FoundRelation, result: GroupsResult): TextEdit | undefined {
  const lines = newDefinitions(topLevel(understood), found, result).map(({ name, expression, words }) => `${name} [1] = ${expression}${words && `   ${words}`}`);
  const at = understood.lines.lineEnd(understood.lines.lineAt(found.span.start));
  return lines.length > 0 ? { start: at, end: at, text: lines.map((each) => lineBreak(understood.parsed.text) + each).join('') } : undefined;
}

function scriptEdit(understood: Understood, found: FoundRelation, result: GroupsResult, style: HostStyle): TextEdit | undefined {
  const fn = found.where.piece?.fn;
  const body = (fn ? fn.body : topLevel(understood)).filter((statement) => !(statement.kind === 'evaluate' && statement.value.kind === 'text'));
  const chunkOf = (statement: Stmt) => understood.parsed.program.chunks.find(({ statements }) => statements.includes(statement)) ?? found.where.chunk;
  const params = new Set(fn?.params.map(({ name }) => name));
  const known = (name: string): boolean => params.has(name) || assignmentsOf(body, name).length > 0 || (fn !== undefined && assignmentsOf(topLevel(understood), name).length > 0);
  const usable = newDefinitions(body, found, result).filter(({ symbols }) => symbols.every(known));
  const names = new Set(usable.flatMap(({ symbols }) => symbols));
  const after = body.findLast((statement) => [...names].some((name) => assignmentsOf([statement], name).length > 0));
  const beside = after ?? body[0];
  if (usable.length === 0 || !beside || (!after && !fn)) return undefined;
  const index = understood.lines;
  const anchor = fn ? found.where.chunk.anchor : chunkOf(beside).anchor;
  const line = index.lineAt(anchor.start + (after ? beside.end : beside.start));
  const indent = /^[ \t]*/.exec(index.lineText(index.lineAt(anchor.start + beside.start)))?.[0] ?? '';
  // A body on the line of its `def` has no place for another statement.
  if (index.position(anchor.start + beside.start).column !== indent.length) return undefined;
  const definitions = usable.map(({ name, expression, words }) => style.define(name, expression, `[1]${words && ` ${words}`}`));
  if (definitions.some((each) => each === undefined)) return undefined;
  const written = definitions.map((each) => `${indent}${each}`);
  const end = lineBreak(understood.parsed.text);
  const at = after ? index.lineEnd(line) : index.lineStart(line);
  return { start: at, end: at, text: written.map((each) => (after ? end + each : each + end)).join('') };
}

interface NewDefinition {
  readonly name: string;
  readonly expression: string;
  readonly symbols: readonly string[];
  readonly words: string;
}

/** Groups that the body does not define already, with names that are free there and expressions that come out in coherent units. */
function newDefinitions(body: readonly Stmt[], found: FoundRelation, result: GroupsResult): readonly NewDefinition[] {
  const syntax = hostSyntax[found.language];
  return definitions(result, syntax).flatMap(({ name, expression, group }) => {
    if (group.exponents.size < 2) return [];
    const assigned = assignmentsOf(body, name);
    if (assigned.some((statement) => defines(statement, group.exponents))) return [];
    const factor = coherenceFactor(group.exponents, result.relation.symbols);
    const written = factor && withFactor(expression, factor, syntax.times, syntax.divide);
    if (written === undefined) return [];
    return [{ name: freeName(name, body), expression: written, symbols: [...group.exponents.keys()], words: groupNames(group).join(' or ') }];
  });
}

function defines(statement: AssignStmt, exponents: GroupsResult['groups'][number]['exponents']): boolean {
  const product = productOf(statement.value);
  return product !== undefined && sameProduct(product, exponents);
}

function freeName(name: string, body: readonly Stmt[]): string {
  return assignmentsOf(body, name).length > 0 ? freeName(`${name}_`, body) : name;
}

/** What the product of the plain numbers has to be multiplied by; undefined where a unit has no scale or is a point on one. */
function coherenceFactor(exponents: GroupsResult['groups'][number]['exponents'], symbols: readonly RelationSymbol[]): Scale | undefined {
  let factor: Scale = Scale.one;
  for (const [name, power] of exponents) {
    const symbol = symbols.find((each) => each.name === name);
    if (!symbol) return undefined;
    if (!symbol.unit) continue;
    if (!symbol.unit.scale || symbol.unit.offset) return undefined;
    factor = factor.mul(symbol.unit.scale.pow(power));
  }
  return factor;
}

/** `1000*x`, `x/60`; undefined for a factor that is no plain fraction. */
function withFactor(expression: string, factor: Scale, times: string, divide: string): string | undefined {
  const { rational, pi, roots, isExact } = factor;
  if (factor.isOne) return expression;
  if (!isExact || roots.length > 0 || !pi.isZero) return undefined;
  return `${rational.num === 1n ? '' : `${rational.num}${times}`}${expression}${rational.den === 1n ? '' : `${divide}${rational.den}`}`;
}

function isDocumentation(found: FoundRelation): boolean {
  const { chunk, piece } = found.where;
  const at = found.span.start - chunk.anchor.start;
  const documents = [chunk.doc, piece?.fn.doc, piece?.owner?.doc, ...chunk.statements.map((each) => (each.kind === 'class' || each.kind === 'function' ? each.doc : undefined))];
  return documents.some((doc) => doc !== undefined && doc.start <= at && at <= doc.end);
}

function topLevel(understood: Understood): readonly Stmt[] {
  return understood.parsed.program.chunks.flatMap(({ statements }) => statements);
}

function lineBreak(text: string): string {
  return /\r\n|\n|\r/.exec(text)?.[0] ?? '\n';
}
