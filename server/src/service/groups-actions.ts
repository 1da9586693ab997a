/** What can be done with the groups of a relation: each a title and edits of the text, in offsets. */
import type { Understood } from '../analyze.ts';
import type { HostStyle, TextEdit } from '../frontends/frontend.ts';
import { definitions, equation, groupNames, hostSyntax, type GroupsResult, repeatingSets, solveGroups, systemOf } from '../groups/index.ts';
import type { Stmt } from '../program/nodes.ts';
import type { Span } from '../text/span.ts';
import { type GroupAtPlace, groupsAround } from './groups-at.ts';
import { productOf, sameProduct } from './groups-product.ts';
import { assignmentsOf, chunkAt, statementsOf, type TextOf, whereOf } from './groups-symbols.ts';
import { definitionsEdit, wordsEdit } from './groups-write.ts';
import { relationOfSelection } from './relation-of-selection.ts';
import { type FoundRelation, relationsOf } from './relations.ts';

export interface GroupAction {
  readonly kind: 'comment' | 'define' | 'equation' | 'other-set' | 'replace' | 'missing-units';
  readonly title: string;
  /** In offsets of the checked text. Empty where there is only something to say. */
  readonly edits: readonly TextEdit[];
}

/** Other sets of repeating symbols that are offered. */
const mostSets = 6;

/**
 * The actions at an offset: those of the relation on its line, and the name for the product that stands there. `selection`: statements
 * that are a relation, where no other stands there.
 */
export function groupActions(understood: Understood, style: HostStyle, offset: number, textOf: TextOf, selection?: Span): readonly GroupAction[] {
  const line = understood.lines.lineAt(offset);
  const found = relationsOf(understood, textOf, { functions: true }).filter(({ span }) => understood.lines.lineAt(span.start) <= line && line <= understood.lines.lineAt(span.end));
  const selected = selection && found.length === 0 ? relationOfSelection(understood, selection, textOf) : undefined;
  return [...[...found, ...(selected ? [selected] : [])].flatMap((relation) => relationActions(understood, style, relation)), ...replacements(understood, offset, textOf)];
}

function relationActions(understood: Understood, style: HostStyle, found: FoundRelation): GroupAction[] {
  const result = solveGroups(found.relation);
  const unknown = result.unmatched.filter(({ reason }) => reason === 'unknown-unit').map(({ symbol }) => symbol);
  if (unknown.length > 0) return [{ kind: 'missing-units', title: `Dimensionless groups need the unit of ${unknown.join(', ')}`, edits: [] }];
  if (result.groups.length === 0) return [];
  const syntax = hostSyntax[found.language];
  const actions: GroupAction[] = [{ kind: 'comment', title: 'Write the dimensionless groups here', edits: [wordsEdit(understood, found, style, groupLines(result, found))] }];
  const defined = definitionsEdit(understood, found, result, style);
  if (defined) actions.push({ kind: 'define', title: 'Define the dimensionless groups', edits: [defined] });
  const solved = equation(result, syntax);
  if (solved) actions.push({ kind: 'equation', title: `Write ${solved}`, edits: [wordsEdit(understood, found, style, [solved])] });
  return [...actions, ...otherSets(understood, style, found, result)];
}

/** `Re = rho*N*D**2/mu   Reynolds number`, one line a group. */
export function groupLines(result: GroupsResult, { language }: Pick<FoundRelation, 'language'>): readonly string[] {
  return definitions(result, hostSyntax[language]).map(({ name, expression, group }) => {
    const words = groupNames(group).join(' or ');
    return `${name === expression ? name : `${name} = ${expression}`}${words && `   ${words}`}`;
  });
}

function otherSets(understood: Understood, style: HostStyle, found: FoundRelation, used: GroupsResult): GroupAction[] {
  const actions: GroupAction[] = [];
  for (const set of repeatingSets(systemOf(found.relation))) {
    const names = set.map(({ name }) => name);
    if (names.length === used.repeating.length && names.every((name) => used.repeating.includes(name))) continue;
    const result = solveGroups(found.relation, { repeating: names });
    if (result.groups.length === 0) continue;
    actions.push({ kind: 'other-set', title: `Write the groups with ${names.join(', ')} repeating`, edits: [wordsEdit(understood, found, style, groupLines(result, found))] });
    if (actions.length === mostSets) break;
  }
  return actions;
}

/** The product at an offset by the name that an earlier line gave to the same product, where nothing in it changed meanwhile. */
function replacements(understood: Understood, offset: number, textOf: TextOf): GroupAction[] {
  for (const group of groupsAround(understood, offset, textOf)) {
    const found = replacement(understood, group);
    if (found) return [found];
  }
  return [];
}

function replacement(understood: Understood, group: GroupAtPlace): GroupAction | undefined {
  const chunk = chunkAt(understood, group.span.start);
  if (!chunk) return undefined;
  const inChunk = { start: group.span.start - chunk.anchor.start, end: group.span.end - chunk.anchor.start };
  const where = whereOf(understood, chunk, inChunk);
  const chunks = where.piece ? [chunk] : understood.parsed.program.chunks;
  const body = chunks.flatMap(({ anchor, statements }) => (where.piece ? where.piece.fn.body : statements).map((statement) => ({ statement, start: anchor.start })));
  const named = body.flatMap(({ statement, start }) => {
    const target = statement.kind === 'assign' && !statement.op && statement.targets.length === 1 ? statement.targets[0] : undefined;
    const product = statement.kind === 'assign' && target?.kind === 'name' ? productOf(statement.value) : undefined;
    if (!product || target?.kind !== 'name' || !sameProduct(product, group.exponents) || start + statement.end > group.span.start) return [];
    const changed = [target.name, ...product.keys()].some((name) => changesBetween(body, name, start + statement.end, group.span.end) || writtenInLoop(body, name, group.span.start));
    return changed ? [] : [target.name];
  });
  const name = named.at(-1);
  if (name === undefined) return undefined;
  const code = understood.parsed.text.slice(group.span.start, group.span.end);
  return { kind: 'replace', title: `Replace ${code} by ${name}`, edits: [{ start: group.span.start, end: group.span.end, text: name }] };
}

type Body = readonly { readonly statement: Stmt; readonly start: number }[];

function changesBetween(body: Body, name: string, from: number, to: number): boolean {
  return body.some(({ statement, start }) => assignmentsOf([statement], name).some((each) => start + each.start >= from && start + each.start < to && !(start + each.value.start <= to && to <= start + each.value.end)));
}

/** A loop around the place may change a symbol after it, before it comes by again. */
function writtenInLoop(body: Body, name: string, at: number): boolean {
  return body.some(({ statement, start }) =>
    statementsOf([statement]).some((each) => each.kind === 'loop' && start + each.start <= at && at < start + each.end && (assignmentsOf(each.body, name).length > 0 || (each.target?.kind === 'name' && each.target.name === name))),
  );
}
