import type { Chunk } from '../../program/nodes.ts';
import { parseUnit } from '../../quantities/parse-unit.ts';
import type { Vocabulary } from '../../quantities/unit-result.ts';
import { directiveIn } from '../directives.ts';
import type { ChunkNotes, Directive, Note, NoteProblem } from '../types.ts';
import { readLine } from './line.ts';
import type { SymbolLine } from './model.ts';
import type { NomenclatureProblem } from './problem.ts';

/** The note of one line of a nomenclature file, and what is wrong with it. `vocabulary` holds the units of all files in reach. */
export function nomenclatureNotes(chunk: Chunk, vocabulary: Vocabulary): ChunkNotes {
  const line = readLine(chunk.text, vocabulary);
  const notes: Note[] = [];
  const problems: NoteProblem[] = [];
  const directives: Directive[] = [];
  for (const comment of chunk.comments) {
    const directive = directiveIn(comment.text, comment.start, false, vocabulary);
    if (directive) directives.push(directive);
  }
  for (const problem of line.problems) report(problem, problems, directives);
  if (line.kind === 'relation' && line.on.length > 0) directives.push({ kind: 'depends', dependent: line.dependent, on: line.on, span: line.span });
  if (line.kind === 'unit') {
    const unit = parseUnit(line.of, { vocabulary });
    if (!unit.ok) problems.push({ span: line.ofSpan, text: line.of, fault: unit });
  }
  if (line.kind === 'symbol') symbolNote(line, chunk, vocabulary, notes, problems);
  return { notes, problems, directives, read: notes.length, unread: [] };
}

function report(problem: NomenclatureProblem, problems: NoteProblem[], directives: Directive[]): void {
  if (problem.unit) problems.push({ span: problem.span, text: problem.unit.text, fault: problem.unit.fault });
  else directives.push({ kind: 'malformed', problem: problem.message, span: problem.span });
}

function symbolNote(line: SymbolLine, chunk: Chunk, vocabulary: Vocabulary, notes: Note[], problems: NoteProblem[]): void {
  const statement = chunk.statements[0];
  if (line.unitText === undefined || (statement?.kind !== 'assign' && statement?.kind !== 'declare')) return;
  const result = parseUnit(line.unitText, { vocabulary, describes: `${line.name} ${line.description}` });
  if (!result.ok) problems.push({ span: line.unitSpan, text: line.unitText, fault: result });
  else {
    notes.push({
      target: { kind: 'statement', statement, path: line.name }, unit: result.unit, span: line.unitSpan, form: 'nomenclature', hints: result.hints,
      ...(line.description === '' ? {} : { description: line.description }), ...(line.range ? { range: line.range } : {}),
    });
  }
}
