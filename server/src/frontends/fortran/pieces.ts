/**
 * Where the pieces of a file part: at the procedures of a module or a program and at the units themselves, so that an edit leaves all
 * procedures but one as they were. Found by a scan of the lines, without reading what stands in them.
 */
import type { Span } from '../../text/span.ts';
import { fixedField, isFixedComment, lineEnd, nextLine, type SourceForm } from './tokens.ts';

const type = '(?:(?:integer|real|complex|character|logical|type|class|double\\s*precision|byte)\\s*(?:\\*\\s*\\d+)?\\s*(?:\\((?:[^()]|\\([^()]*\\))*\\))?\\s*)';
const head = new RegExp(`^(?:(?:pure|elemental|impure|recursive|non_recursive|module)\\s+|${type})*(?:function|subroutine)\\s+[a-z]|^(?:(?:pure|elemental|impure|recursive)\\s+)*module\\s+procedure\\s+\\w+\\s*(?:!|$)`, 'i');
const container = /^(?:program\s+[a-z]\w*\s*(?:!|;|$)|module\s+(?!procedure\b)[a-z]\w*\s*(?:!|;|$)|submodule\s*\(|block\s*data\b)/i;
const unitEnd = /^end\s*(?:(?:function|subroutine|procedure|program|module|submodule|block\s*data)\b\s*(?:\w*\s*(?:!|;|$))|(?:!|;|$))/i;
const interfaceStart = /^(?:abstract\s+)?interface\b(?!\s*(?:[=%]|\((?!.*\)\s*$)))/i;
const interfaceEnd = /^end\s*interface\b/i;
const typeStart = /^type\s*(?:,|::|\s[a-z]\w*\s*(?:!|$))/i;
const typeEnd = /^end\s*type\b/i;
const contains = /^contains\s*(?:!|;|$)/i;
/** The letters that such a line can begin with. */
const telling = /[a-z]/i;

/** Splits a file; every piece ends behind a line, and all of them together are the text. */
export function splitPieces(text: string, form: SourceForm): readonly Span[] {
  const splitter = new Splitter(text, form);
  return splitter.run();
}

class Splitter {
  private readonly pieces: Span[] = [];
  private start = 0;
  /** Units that are open: containers and procedures. */
  private readonly open: ('container' | 'procedure')[] = [];
  private inInterface = false;
  private inType = false;
  private goesOn = false;

  constructor(private readonly text: string, private readonly form: SourceForm) {}

  run(): readonly Span[] {
    const { text } = this;
    for (let at = 0; at < text.length; ) {
      const end = lineEnd(text, at);
      const next = nextLine(text, end);
      this.line(at, end, next);
      at = next;
    }
    if (this.start < text.length) this.close(text.length);
    return this.pieces;
  }

  private close(end: number): void {
    if (end > this.start) this.pieces.push({ start: this.start, end });
    this.start = end;
  }

  /** The statement of a line, where it may be one that parts pieces. */
  private line(start: number, end: number, next: number): void {
    const { text } = this;
    let at = start;
    if (this.form === 'fixed') {
      if (isFixedComment(text, start, end)) return;
      const field = fixedField(text, start, end);
      if (field.continues) return;
      at = field.start;
    }
    while (at < end && (text.charCodeAt(at) === 32 || text.charCodeAt(at) === 9)) at++;
    if (at >= end || text[at] === '!' || text[at] === '#') return;
    const continued = this.goesOn;
    this.goesOn = this.form === 'free' && holdsAmpersand(text, at, end) && /&[ \t]*(?:!.*)?$/.test(text.slice(at, end));
    if (!continued && telling.test(text[at] as string)) this.statement(text.slice(at, Math.min(end, at + 200)), next);
  }

  private statement(line: string, next: number): void {
    if (this.inInterface) {
      if (interfaceEnd.test(line)) this.inInterface = false;
    } else if (this.inType) {
      if (typeEnd.test(line)) this.inType = false;
    } else if (interfaceStart.test(line)) this.inInterface = true;
    else if (typeStart.test(line)) this.inType = true;
    else if (unitEnd.test(line)) this.unitEnds(next);
    else if (container.test(line)) this.open.push('container');
    else if (head.test(line)) this.open.push('procedure');
    else if (contains.test(line) && !this.open.includes('procedure')) this.close(next);
  }

  /** A procedure that stands in nothing but containers is a piece; the end of a container goes with what stands before it. */
  private unitEnds(next: number): void {
    const closed = this.open.pop();
    if (closed === 'procedure' && !this.open.includes('procedure')) this.close(next);
    else if (closed !== 'procedure' && this.open.length === 0) this.join(next);
  }

  private join(next: number): void {
    const last = this.pieces.at(-1);
    const between = this.text.slice(this.start, next);
    if (last && /^(?:[ \t]*(?:!.*)?\r?\n)*[ \t]*end\b[^\n]*\n?$/i.test(between)) {
      this.pieces[this.pieces.length - 1] = { start: last.start, end: next };
      this.start = next;
    } else this.close(next);
  }
}

function holdsAmpersand(text: string, start: number, end: number): boolean {
  for (let at = end - 1; at > start; at--) if (text.charCodeAt(at) === 38) return true;
  return false;
}
