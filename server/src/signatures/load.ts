import type { NamedConstant, Signature } from '../program/signature.ts';
import type { Vocabulary } from '../quantities/unit-result.ts';
import { looksLikeSignature, type NotationProblem, readConstant, readSignature } from './notation.ts';

/** Signatures and constants by dotted name; methods by `.name`. */
export interface LoadedSignatures {
  readonly functions: Map<string, Signature>;
  readonly methods: Map<string, Signature>;
  readonly constants: Map<string, NamedConstant>;
  readonly problems: readonly (NotationProblem & { readonly file: string })[];
}

/** Reads signature files; what cannot be read is listed and the rest is kept. */
export function loadSignatures(files: readonly { readonly file: string; readonly text: string }[], vocabulary?: Vocabulary): LoadedSignatures {
  const functions = new Map<string, Signature>();
  const methods = new Map<string, Signature>();
  const constants = new Map<string, NamedConstant>();
  const problems: (NotationProblem & { file: string })[] = [];
  for (const { file, text } of files) {
    let offset = 0;
    for (const raw of text.split('\n')) {
      const line = raw.replace(/(?:^|\s)#.*$/, '').trimEnd();
      if (looksLikeSignature(line)) {
        const read = readSignature(line, offset, vocabulary);
        if (read.ok) for (const signature of read.value) (signature.name.startsWith('.') ? methods : functions).set(signature.name, signature);
        else problems.push({ ...read.problem, file });
      } else if (line.trim() !== '') {
        const read = readConstant(line, offset, vocabulary);
        if (read?.ok) constants.set(read.value.name, read.value);
        else problems.push(read ? { ...read.problem, file } : { span: { start: offset, end: offset + line.length }, message: 'This line is neither a signature nor a constant.', file });
      }
      offset += raw.length + 1;
    }
  }
  return { functions, methods, constants, problems };
}
