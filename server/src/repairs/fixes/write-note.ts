/** Notes written for the author: the unit that follows from the others, or the one that a name ends in. */
import type { Comment, DocText } from '../../program/nodes.ts';
import type { TextEdit } from '../../frontends/frontend.ts';
import type { Span } from '../../text/span.ts';
import type { Fix, Fixer } from '../fix.ts';
import { type OpenSymbol, openSymbols } from '../open-symbols.ts';
import type { Scene } from '../scene.ts';

export const writeNote: Fixer = { kind: 'note', forPlace: notes };

function notes(span: Span, scene: Scene): readonly Fix[] {
  const chunk = scene.inputs.program.chunks.find(({ anchor, text }) => anchor.start <= span.start && span.end <= anchor.start + text.length);
  if (!chunk) return [];
  const inside = { start: span.start - chunk.anchor.start, end: span.end - chunk.anchor.start };
  const piece = scene.pieceAt(chunk.anchor, inside);
  const open = openSymbols(scene, piece);
  const here = open.filter((symbol) => symbol.chunk === chunk && symbol.span.start <= inside.end && inside.start <= symbol.span.end);
  const each = here.flatMap((symbol) => [...one(symbol, symbol.inferred, 'likely', 1, scene), ...one(symbol, symbol.suffix, 'choice', 1.5, scene)]);
  const onName = piece !== undefined && piece.fn.nameSpan.start <= inside.end && inside.start <= piece.fn.nameSpan.end;
  return [...each, ...(onName ? together(open, scene) : [])];
}

function one(symbol: OpenSymbol, unit: string | undefined, confidence: Fix['confidence'], cost: number, scene: Scene): readonly Fix[] {
  const edit = unit === undefined ? undefined : noteEdit(symbol, unit, scene);
  return edit && unit !== undefined ? [{ kind: 'note', confidence, edits: [edit], says: { what: 'note', symbol: symbol.path, unit }, cost }] : [];
}

/** Every unit of a function that follows from the others. */
function together(open: readonly OpenSymbol[], scene: Scene): readonly Fix[] {
  const seen = new Set<string>();
  const edits = open.flatMap((symbol): readonly TextEdit[] => {
    const edit = symbol.inferred === undefined || seen.has(symbol.path) ? undefined : noteEdit(symbol, symbol.inferred, scene);
    if (!edit) return [];
    seen.add(symbol.path);
    return [edit];
  });
  return edits.length < 2 ? [] : [{ kind: 'note', confidence: 'likely', edits, says: { what: 'notes', count: edits.length }, cost: 2 }];
}

/** Where and how a symbol's unit is written; undefined where the text has no place for it. */
export function noteEdit(symbol: OpenSymbol, unit: string, scene: Scene): TextEdit | undefined {
  const { at, chunk } = symbol;
  const base = chunk.anchor.start;
  if (at.kind === 'assign') return behind(at.statement.trailing, base, base + at.statement.end, unit, scene);
  if (at.owner.doc) return inDocumentation(at.owner.doc, base, symbol.path, unit);
  return at.param.comment ? behind(at.param.comment, base, 0, unit, scene) : aboveFunction(symbol, unit, scene);
}

/** `# [Pa] static`, in front of what the comment says already. */
function behind(comment: Comment | undefined, base: number, end: number, unit: string, scene: Scene): TextEdit | undefined {
  if (comment) return { start: base + comment.start, end: base + comment.start, text: `[${unit}] ` };
  const { lines, style } = scene.inputs;
  const line = lines.lineAt(end);
  const at = lines.lineEnd(line);
  const rest = scene.text.slice(end, at);
  return rest.trim() === '' ? { start: end, end: at, text: `  ${style.comment} [${unit}]` } : undefined;
}

/** In the form the documentation has: at the end of the first line that describes the parameter. */
function inDocumentation(doc: DocText, base: number, name: string, unit: string): TextEdit | undefined {
  const escaped = name.replace(/[$.]/g, '\\$&');
  const numpy = new RegExp(`^[ \\t]*${escaped}[ \\t]*(?::.*)?\\r?\\n([ \\t]+\\S.*?)[ \\t.]*$`, 'm').exec(doc.text);
  const inline = new RegExp(`^[ \\t]*(?::param[ \\t]+(?:\\w+[ \\t]+)?)?${escaped}[ \\t]*(?:\\([^)]*\\))?:[ \\t]+\\S.*?[ \\t.]*$`, 'm').exec(doc.text);
  const numpydoc = numpy && /-{3,}/.test(doc.text) ? numpy : null;
  const found = numpydoc ?? inline;
  if (!found) return undefined;
  const trimmed = found[0].replace(/[ \t.]+$/, '');
  const at = base + doc.start + found.index + trimmed.length;
  return { start: at, end: at, text: ` [${unit}]` };
}

/** `# V [m/s]` above a function without documentation. */
function aboveFunction(symbol: OpenSymbol, unit: string, scene: Scene): TextEdit | undefined {
  const { lines, style } = scene.inputs;
  if (symbol.at.kind !== 'parameter' || symbol.at.owner.decorators.length > 0) return undefined;
  const [first] = symbol.at.owner.body;
  if (!first) return undefined;
  const line = lines.lineAt(symbol.chunk.anchor.start + first.start);
  if (line === lines.lineAt(symbol.chunk.anchor.start + symbol.at.owner.nameSpan.start)) return undefined;
  const start = lines.lineStart(line);
  const indent = /^[ \t]*/.exec(lines.lineText(line))?.[0] ?? '';
  const end = scene.text.includes('\r\n') ? '\r\n' : '\n';
  return { start, end: start, text: `${indent}${style.comment} ${symbol.path} [${unit}]${end}` };
}
