import type { Chunk } from '../../program/nodes.ts';
import { parseUnit } from '../../quantities/parse-unit.ts';
import type { Vocabulary } from '../../quantities/unit-result.ts';
import { directiveIn } from '../directives.ts';
import type { ChunkNotes, Directive, Note, NoteProblem } from '../types.ts';
import { readLine } from './line.ts';

/** The note of one line of a nomenclature file, and what is wrong with it. */
export function nomenclatureNotes(chunk: Chunk, vocabulary: Vocabulary): ChunkNotes {
  const line = readLine(chunk.text, vocabulary);
  const notes: Note[] = [];
  const problems: NoteProblem[] = [];
  const directives: Directive[] = [];
  for (const comment of chunk.comments) {
    const directive = directiveIn(comment.text, comment.start, false, vocabulary);
    if (directive) directives.push(directive);
  }
  if (line.kind === 'problem') directives.push({ kind: 'malformed', problem: line.problem.message, span: line.problem.span });
  if (line.kind === 'relation') directives.push({ kind: 'depends', dependent: line.dependent, on: line.on, span: line.span });
  if (line.kind === 'unit') {
    const unit = parseUnit(line.of, { vocabulary });
    if (!unit.ok) problems.push({ span: line.ofSpan, text: line.of, fault: unit });
  }
  if (line.kind === 'symbol') {
    if (line.rest) directives.push({ kind: 'malformed', problem: line.rest.message, span: line.rest.span });
    const statement = chunk.statements[0];
    const result = line.unitText === undefined ? undefined : parseUnit(line.unitText, { vocabulary, describes: `${line.name} ${line.description}` });
    if (result && !result.ok) problems.push({ span: line.unitSpan, text: line.unitText ?? '', fault: result });
    else if (result && (statement?.kind === 'assign' || statement?.kind === 'declare')) {
      notes.push({
        target: { kind: 'statement', statement, path: line.name }, unit: result.unit, span: line.unitSpan, form: 'nomenclature', hints: result.hints,
        ...(line.description === '' ? {} : { description: line.description }), ...(line.range ? { range: line.range } : {}),
      });
    }
  }
  return { notes, problems, directives, read: notes.length, unread: [] };
}
