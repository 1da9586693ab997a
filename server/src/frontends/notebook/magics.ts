/**
 * What a cell holds besides its language: commands to the kernel, as IPython, IJulia and the metakernel of Octave read them.
 * They are replaced by blanks, so that every other character keeps its place.
 * Sources: IPython documentation, "IPython reference: Magic command system"; IJulia manual, "Magics"; metakernel README.
 */
import type { LanguageId } from '../../program/nodes.ts';
import type { Span } from '../../text/span.ts';
import { behindBreak, endOfLine, readLogicalLines } from './logical-lines.ts';

export interface Blanked {
  /** As long as the cell's text. */
  readonly text: string;
  /** Where it differs from the cell's text. */
  readonly spans: readonly Span[];
}

/** The cell as its language alone; undefined where all of it is something else: another language, a file to be written, text that breaks off. */
export function blankCommands(cell: string, language: LanguageId): Blanked | undefined {
  if (language === 'python') return blankPython(cell);
  if (language === 'julia') return blankJulia(cell);
  return blankOctave(cell);
}

/** Cell magics whose body is run by the kernel itself. */
const transparent = /^%%(?:time|timeit|capture|prun|memit|mprun|lprun|debug)\b/;
/** Line magics in front of a statement that is run: `%time y = f(x)`. */
const prefix = /^(?:%time|%timeit|%prun|%memit)[ \t]+(?!-)(?=\S)/;
/** A command on a line of its own: `%cd data`, `!pip list`, `?abs`, `abs?`. */
const command = /^(?:%[A-Za-z_%?]|!|\?|[A-Za-z_][\w.]*\?{1,2}[ \t]*$)/;
/** A command whose answer gets a name: `files = !ls`, `t = %timeit -o f()`. */
const assigned = /^[A-Za-z_][\w, \t]*=[ \t]*(?:!|%[A-Za-z_])/;

function blankPython(cell: string): Blanked | undefined {
  const magic = cell.search(/\S/);
  const hasMagic = magic >= 0 && cell.startsWith('%%', magic);
  if (hasMagic && !transparent.test(cell.slice(magic))) return undefined;
  const start = hasMagic ? endOfLine(cell, magic) : 0;
  const spans: Span[] = hasMagic ? [{ start: magic, end: start }] : [];
  const ended = readLogicalLines(cell, start, (line) => {
    const text = cell.slice(line.start, line.end);
    const lead = line.start + text.length - text.trimStart().length;
    const run = prefix.exec(cell.slice(lead, line.end));
    if (run) spans.push({ start: lead, end: lead + run[0].length });
    if (run || !(command.test(text.trim()) || assigned.test(text.trim()))) return undefined;
    const end = endOfCommand(cell, line.end);
    spans.push({ start: lead, end });
    return end;
  });
  return ended ? { text: withStatements(cell, spans), spans } : undefined;
}

/** A command goes on behind a backslash at the end of its line. */
function endOfCommand(cell: string, lineEnd: number): number {
  let end = lineEnd;
  while (end < cell.length && cell[end - 1] === '\\') end = endOfLine(cell, behindBreak(cell, end));
  return end;
}

/** A statement `0` in place of each command keeps a block that would be empty, and the column of what follows on the line. */
function withStatements(cell: string, spans: readonly Span[]): string {
  return blank(cell, spans, (part, whole) => (whole ? `0${' '.repeat(part.length - 1)}` : `0;${' '.repeat(part.length - 2)}`));
}

/** IJulia: `;` is the shell, `?` the help and `]` the package manager, at the beginning of a cell only. */
function blankJulia(cell: string): Blanked | undefined {
  return /^\s*[;?\]]/.test(cell) ? undefined : { text: cell, spans: [] };
}

/** In Octave `%` begins a comment, so that line magics are none of its statements; a shell command and `%%` of another language are left. */
function blankOctave(cell: string): Blanked | undefined {
  if (/^\s*%%(?:bash|sh|shell|html|javascript|js|latex|python|file|show|processing|dot|activity|macro)\b/.test(cell)) return undefined;
  const spans: Span[] = [];
  for (const found of cell.matchAll(/^[ \t]*(?:![A-Za-z./]|\?|[A-Za-z_]\w*\?[ \t]*$)[^\r\n]*/gm)) spans.push({ start: found.index, end: found.index + found[0].length });
  return { text: blank(cell, spans, (part) => ' '.repeat(part.length)), spans };
}

/** Blanks the spans but for their line breaks; `instead` is asked for the first line of each, and whether nothing else stands on it. */
function blank(cell: string, spans: readonly Span[], instead: (part: string, whole: boolean) => string): string {
  let out = '';
  let at = 0;
  for (const { start, end } of spans) {
    const lines = cell.slice(start, end).split(/([\r\n]+)/);
    const whole = /^[ \t]*(?:[\r\n]|$)/.test(cell.slice(end));
    out += cell.slice(at, start) + lines.map((line, index) => (index === 0 ? instead(line, whole) : /^[\r\n]/.test(line) ? line : ' '.repeat(line.length))).join('');
    at = end;
  }
  return out + cell.slice(at);
}
