/** All unit notes and directives of one chunk: one walk over its statements, one over its comments. */
import type { Chunk, Comment, DocText, LanguageId } from '../program/nodes.ts';
import type { Vocabulary } from '../quantities/unit-result.ts';
import { symbolNotes } from './above-notes.ts';
import { Collector } from './collector.ts';
import { directivesIn } from './directives.ts';
import { linesOf } from './doc-lines.ts';
import { Names } from './names.ts';
import { partOf } from './piece.ts';
import type { ChunkNotes, NoteSettings } from './types.ts';
import { NoteWalk } from './walk.ts';

/** Reads the notes of a chunk; spans are relative to it. Never throws. */
export function readChunkNotes(chunk: Chunk, settings: NoteSettings, vocabulary: Vocabulary, language: LanguageId): ChunkNotes {
  const names = new Names(chunk, language);
  const out = new Collector(settings, vocabulary, language, names);
  const walk = new NoteWalk(out, chunk);
  walk.block(chunk.statements, undefined, undefined);
  readComments(out, chunk, walk, names);
  if (chunk.doc) docLines(out, chunk.doc, () => true, names);
  for (const fn of walk.functions) if (fn.doc) docLines(out, fn.doc, () => false, names);
  for (const cls of walk.classes) if (cls.doc) docLines(out, cls.doc, () => false, names);
  return out.result;
}

function readComments(out: Collector, chunk: Chunk, walk: NoteWalk, names: Names): void {
  const opening = chunk.statements[0]?.start ?? Number.POSITIVE_INFINITY;
  for (let at = 0; at < chunk.comments.length; at++) {
    const comment = chunk.comments[at] as Comment;
    const heads = comment.end <= opening;
    for (const directive of directivesIn(comment, () => heads && isFirst(chunk), out.vocabulary, names.occurs)) out.directive(directive);
    if (!comment.text.includes('[') || walk.used.has(comment.start) || !names.standsAlone(comment)) continue;
    symbolNotes(out, comment, walk.ownerAt(comment), hasCompany(chunk, at), names.occurs);
  }
}

/** The chunk that opens the file; asked when a directive is applied, since chunks move. */
function isFirst(chunk: Chunk): boolean {
  return chunk.anchor.start < 3 || chunk.doc !== undefined;
}

/** A comment line beside another that names a symbol with its unit in the same way is one of a list. */
function hasCompany(chunk: Chunk, at: number): boolean {
  const item = /^\s*(?:[-*•]\s+)?[\p{L}_][\p{L}\p{N}_.]*\s*(?::.*|=.*|[-–—]\s.*)?\s\[[^\]]*\]/u;
  return [chunk.comments[at - 1], chunk.comments[at + 1]].some((each) => each !== undefined && item.test(each.text) && adjacent(chunk, each, chunk.comments[at] as Comment));
}

function adjacent(chunk: Chunk, a: Comment, b: Comment): boolean {
  const [first, second] = a.start < b.start ? [a, b] : [b, a];
  return /^[ \t]*\r?\n[ \t]*\S{1,3}[ \t]*$/.test(chunk.text.slice(first.end, second.start));
}

/** Directives in documentation stand on lines of their own. */
function docLines(out: Collector, doc: DocText, wholeFile: () => boolean, names: Names): void {
  if (!/termwise|empirical|depends on/i.test(doc.text)) return;
  for (const line of linesOf(doc.text)) {
    if (line.text === '') continue;
    for (const directive of directivesIn(partOf(doc, line.start, line.end), wholeFile, out.vocabulary, names.occurs)) out.directive(directive);
  }
}
