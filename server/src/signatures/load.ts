import type { NamedConstant, Signature } from '../program/signature.ts';
import type { Vocabulary } from '../quantities/unit-result.ts';
import { looksLikeSignature, readConstant, readSignature, withoutComment } from './notation.ts';
import { type NotationProblem, notationProblem } from './problem.ts';

/** Signatures and constants by dotted name; methods by `.name`. */
export interface LoadedSignatures {
  readonly functions: Map<string, Signature>;
  readonly methods: Map<string, Signature>;
  readonly constants: Map<string, NamedConstant>;
  readonly problems: readonly (NotationProblem & { readonly file: string })[];
}

/** Reads signature files; what cannot be read is listed and the rest is kept. Of two lines for one name the later counts. */
export function loadSignatures(files: readonly { readonly file: string; readonly text: string }[], vocabulary?: Vocabulary): LoadedSignatures {
  const functions = new Map<string, Signature>();
  const methods = new Map<string, Signature>();
  const constants = new Map<string, NamedConstant>();
  const problems: (NotationProblem & { file: string })[] = [];
  for (const { file, text } of files) {
    let offset = 0;
    for (const raw of text.split('\n')) {
      const line = withoutComment(raw);
      if (looksLikeSignature(line)) {
        const read = readSignature(line, offset, vocabulary);
        for (const signature of read.signatures) (signature.name.startsWith('.') ? methods : functions).set(signature.name, signature);
        for (const problem of read.problems) problems.push({ ...problem, file });
      } else if (line.trim() !== '') {
        const read = readConstant(line, offset, vocabulary);
        if (read) constants.set(read.constant.name, read.constant);
        for (const problem of read?.problems ?? [notationProblem('not-a-line', offset + line.length - line.trimStart().length, offset + line.length)]) problems.push({ ...problem, file });
      }
      offset += raw.length + 1;
    }
  }
  return { functions, methods, constants, problems };
}
