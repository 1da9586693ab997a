import { nameIn } from '../program/name-case.ts';
import type { Chunk, Comment, DocText, LanguageId, Stmt } from '../program/nodes.ts';

/** The identifiers that a chunk's code uses, outside of comments and documentation; gathered at the first question. */
export class Names {
  private found: ReadonlySet<string> | undefined;
  private lengths: boolean | undefined;

  constructor(private readonly chunk: Chunk, private readonly language: LanguageId = 'python') {}

  /** Whether the code of the chunk uses a name; of a dotted name, its last part. */
  readonly occurs = (name: string): boolean => {
    this.found ??= gather(this.chunk, this.language);
    return this.found.has(nameIn(this.language, name.slice(name.lastIndexOf('.') + 1).replace(/\[.*$/, '')));
  };

  /** Whether brackets in the comments give lengths, `[nl]` and `[nl+1]` of a count `nl` in the code: then `[1]` is one too. */
  get givesLengths(): boolean {
    this.lengths ??= this.chunk.comments.some(({ text }) => {
      const name = /\[\s*(n[a-z]{1,4})(?:\s*\+\s*\d+)?\s*\]/.exec(text)?.[1];
      return name !== undefined && this.occurs(name);
    });
    return this.lengths;
  }

  /** Nothing but the comment's marker stands before it on its line. */
  standsAlone(comment: Comment): boolean {
    const { text } = this.chunk;
    const line = text.lastIndexOf('\n', comment.start - 1) + 1;
    return /^[\s#%!/*:;<]*$/.test(text.slice(line, comment.start));
  }
}

function gather(chunk: Chunk, language: LanguageId): ReadonlySet<string> {
  // There a quote behind an operand opens no text.
  const transposes = language === 'matlab' || language === 'julia';
  let code = '';
  let from = 0;
  for (const comment of [...chunk.comments, ...docsIn(chunk.statements)].sort((a, b) => a.start - b.start)) {
    code += `${chunk.text.slice(from, comment.start)} `;
    from = Math.max(from, comment.end);
  }
  code += chunk.text.slice(from);
  const plain = (transposes ? code.replace(/(?<=[\p{L}\p{N}_)\]}.])'|'[^'\n]*'|"[^"\n]*"/gu, ' ') : code).replace(/("""|''')[\s\S]*?\1/g, ' ').replace(/(['"])(?:\\.|(?!\1)[^\\\n])*\1/g, ' ');
  return new Set(nameIn(language, plain).match(/[\p{L}_][\p{L}\p{N}_]*/gu) ?? []);
}

/** Documentation that stands in comments is no code either. */
function docsIn(statements: readonly Stmt[]): readonly DocText[] {
  return statements.flatMap((each) => (each.kind === 'function' || each.kind === 'class' ? [...(each.doc ? [each.doc] : []), ...docsIn(each.body)] : []));
}
