/** `termwise groups`: the dimensionless groups of the relations in files. */
import { resolve } from 'node:path';
import { type GroupsDocument, type GroupsOptions, type GroupsResult, hostSyntax, latexReport, markdownReport, relationDocument, solveGroups } from '../groups/index.ts';
import { isServed } from '../frontends/registry.ts';
import { defaultNoteSettings } from '../notes/types.ts';
import { diskFiles } from '../platform/disk.ts';
import type { FoundRelation } from '../service/relations.ts';
import type { Surroundings } from './check.ts';
import { cellRegions } from './cells.ts';
import { openDocument } from './document.ts';
import { type GroupsRequest, groupsHelp, readGroupsArguments } from './groups-options.ts';
import { groupsText, placeOf } from './groups-text.ts';
import { readText } from './input.ts';
import { languageNames } from './languages.ts';
import { displayName, slashed } from './names.ts';
import { readProduct } from './groups-product.ts';

/** A relation with its groups, and the file as it is shown. */
export interface SolvedRelation {
  readonly file: string;
  readonly found: FoundRelation;
  /** The line from one; in a notebook that of the cell. */
  readonly line: number;
  /** In a notebook: the cell, all cells counted from 1. */
  readonly cell?: number | undefined;
  readonly result: GroupsResult;
  /** Solves the relation again, with another request. */
  readonly again: (options: GroupsOptions) => GroupsResult;
}

/** Runs the arguments behind `groups`; the answer is the exit status. */
export async function runGroups(args: readonly string[], around: Surroundings): Promise<0 | 1 | 2> {
  const request = readGroupsArguments(args);
  if (request === 'help') {
    around.out(groupsHelp);
    return 0;
  }
  if ('problem' in request) return misuse(request.problem, around);
  const keep = request.keep.map(readProduct);
  const bad = request.keep.find((_text, at) => keep[at] === undefined);
  if (bad !== undefined) return misuse(`--keep ${bad}: expected a product of symbols, as in rho*N*D**2/mu.`, around);
  const options: GroupsOptions = { ...(request.repeating && { repeating: request.repeating }), ...(keep.length > 0 && { keep: keep.filter((each) => each !== undefined) }) };
  const { solved, failed } = await solve(request, options, around);
  around.out(written(solved, request));
  return failed ? 2 : solved.some(({ result }) => result.groups.length === 0) ? 1 : 0;
}

function misuse(problem: string, around: Surroundings): 2 {
  around.complain(`termwise: ${problem}\nSee termwise help groups.\n`);
  return 2;
}

async function solve(request: GroupsRequest, options: GroupsOptions, around: Surroundings): Promise<{ readonly solved: readonly SolvedRelation[]; readonly failed: boolean }> {
  const workspace = await around.createWorkspace(diskFiles(), { severities: {}, notes: defaultNoteSettings });
  const solved: SolvedRelation[] = [];
  let failed = false;
  for (const path of request.paths) {
    const file = slashed(resolve(around.workingFolder, path));
    const shown = displayName(file, around.workingFolder);
    const read = readText(file);
    const opened = !read.ok ? read : isServed(file) ? openDocument(file, read.text, undefined) : { ok: false as const, problem: `its ending names no language (${languageNames.join(', ')})` };
    if (!opened.ok) {
      around.complain(`termwise: ${shown}: ${opened.problem}\n`);
      failed = true;
      continue;
    }
    const { text, language, notebook } = opened.document;
    await workspace.prepare(language);
    workspace.check(file, text, language);
    const relations = workspace.groups.relations(file, { functions: request.functions });
    if (relations.length === 0) around.complain(`termwise: ${shown}: no relation here; say which symbol depends on which, as in \`P depends on N, D, rho, mu\`\n`);
    for (const found of relations) {
      const again = (other: GroupsOptions): GroupsResult => solveGroups(found.relation, other);
      const place = notebook ? cellRegions(notebook)(found.span) : { line: found.line, cell: undefined };
      solved.push({ file: shown, found, line: place.line, cell: place.cell, result: again(options), again });
    }
    workspace.forget(file);
  }
  return { solved, failed };
}

function written(solved: readonly SolvedRelation[], request: GroupsRequest): string {
  switch (request.form) {
    case 'json': {
      const document: GroupsDocument = { version: 1, relations: solved.map(({ file, found, line, cell, result }) => ({ ...relationDocument(result, file, line, hostSyntax[found.language]), ...(cell !== undefined && { cell }) })) };
      return `${JSON.stringify(document)}\n`;
    }
    case 'latex':
      return solved.map((each) => `% ${placeOf(each)}\n${latexReport(each.result)}`).join('\n');
    case 'markdown':
      return solved.map(({ file, found, result }) => `### ${found.relation.dependent ?? file}\n\n${markdownReport(result)}`).join('\n');
    case 'text':
      return solved.map((each) => groupsText(each, request.alternatives)).join('\n');
  }
}
