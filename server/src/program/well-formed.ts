/** What every front end owes to the stages after it, checked on a whole program: for tests, of any language. */
import type { Span } from '../text/span.ts';
import type { Chunk, Program } from './nodes.ts';

/** The faults of a program lowered from `text`, as sentences; none for a well-formed one. */
export function faultsOf(program: Program, text: string): readonly string[] {
  const faults: string[] = [];
  let end = 0;
  for (const chunk of program.chunks) {
    const { start } = chunk.anchor;
    if (chunk.anchor.file !== program.file) faults.push(`chunk at ${start} names another file: ${chunk.anchor.file}`);
    if (start < end) faults.push(`chunk at ${start} begins before the one above ends`);
    if (text.slice(start, start + chunk.text.length) !== chunk.text) faults.push(`chunk at ${start} is not the text there`);
    end = start + chunk.text.length;
    faults.push(...new ChunkChecker(chunk).check().map((fault) => `chunk at ${start}: ${fault}`));
  }
  return faults;
}

/** What may lie outside of the node that owns it. */
const outside = new Set(['trailing', 'above', 'loose', 'comment', 'comments', 'doc']);

class ChunkChecker {
  private readonly faults: string[] = [];

  constructor(private readonly chunk: Chunk) {}

  check(): readonly string[] {
    const whole = { start: 0, end: this.chunk.text.length };
    this.visit(this.chunk.statements, whole, 'statements');
    this.visit(this.chunk.problems, whole, 'problems');
    this.visit(this.chunk.comments, whole, 'comments');
    this.visit(this.chunk.doc, whole, 'doc');
    this.inOrder(this.chunk.statements, 'statements');
    this.inOrder(this.chunk.comments, 'comments');
    return this.faults;
  }

  private visit(value: unknown, around: Span, path: string): void {
    if (Array.isArray(value)) {
      for (const each of value) this.visit(each, around, path);
    } else if (isNode(value)) {
      this.place(value, around, path);
      this.names(value, path);
      for (const [key, part] of Object.entries(value)) this.visit(part, outside.has(key) || returnsOutputs(value, key) ? { start: 0, end: this.chunk.text.length } : value, `${path}.${key}`);
    } else if (isGroup(value)) {
      for (const [key, part] of Object.entries(value)) this.visit(part, around, `${path}.${key}`);
    }
  }

  private place(span: Span, around: Span, path: string): void {
    const sound = Number.isInteger(span.start) && Number.isInteger(span.end) && span.start <= span.end;
    if (!sound || span.start < around.start || span.end > around.end) this.faults.push(`${path} at ${span.start}-${span.end} is not inside ${around.start}-${around.end}`);
  }

  /** What carries its own source text carries that of its span. */
  private names(node: Span & Readonly<Record<string, unknown>>, path: string): void {
    if (node['kind'] === 'name') this.covers(node, node['name'], path);
    if (node['kind'] === 'number' || (node['kind'] === undefined && typeof node['text'] === 'string')) this.covers(node, node['text'], path);
    if (isNode(node['nameSpan'])) this.covers(node['nameSpan'], node['name'], `${path}.nameSpan`);
    if (isNode(node['opSpan']) && node['op'] !== 'bits' && !this.isOwnSign(node['opSpan'], String(node['op']))) this.covers(node['opSpan'], node['op'], `${path}.opSpan`);
  }

  /** Some languages write an operator in another way, with a dot before it where it goes by elements, or not at all. */
  private isOwnSign(span: Span, op: string): boolean {
    const sign = this.chunk.text.slice(span.start, span.end).replace(/^\.(?=.)/, '');
    return sign === op || (ownSigns[op]?.includes(sign) ?? false);
  }

  private covers(span: Span, expected: unknown, path: string): void {
    const found = this.chunk.text.slice(span.start, span.end);
    // What a language leaves unwritten has no extent: the object of a method, a default export.
    if (span.start === span.end) return;
    if (found !== expected && !(typeof expected === 'string' && (isBlanked(found, expected) || found.toLowerCase() === expected))) this.faults.push(`${path} covers ${JSON.stringify(found)} and stands for ${JSON.stringify(expected)}`);
  }

  private inOrder(spans: readonly Span[], path: string): void {
    spans.forEach((span, at) => {
      const next = spans[at + 1];
      if (next && next.start < span.start) this.faults.push(`${path} at ${span.start} and ${next.start} are out of order`);
    });
  }
}

const ownSigns: Readonly<Record<string, readonly string[]>> = { '**': ['^', '√', '∛', '∜'], '*': [''], '/': ['//'], '//': ['÷', '/'], '-': ['−'], '@': ['⋅', '·', '×'] };

/** The outputs that a function returns are named in its head. */
function returnsOutputs(node: Readonly<Record<string, unknown>>, key: string): boolean {
  return key === 'value' && node['kind'] === 'return';
}

/** Documentation over several comment lines has its marks blanked out. */
function isBlanked(found: string, expected: string): boolean {
  return found.length === expected.length && found.split('').every((character, at) => character === expected[at] || expected[at] === ' ');
}

function isNode(value: unknown): value is Span & Readonly<Record<string, unknown>> {
  return isGroup(value) && typeof (value as { start?: unknown }).start === 'number' && typeof (value as { end?: unknown }).end === 'number';
}

/** A plain object; exact numbers are instances of a class and no part of the tree. */
function isGroup(value: unknown): value is object {
  return typeof value === 'object' && value !== null && Object.getPrototypeOf(value) === Object.prototype;
}
