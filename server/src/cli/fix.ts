/** `termwise check --fix`: what was fixed, in words and as a diff. */
import { createTwoFilesPatch } from 'diff';
import type { TextEdit } from '../frontends/frontend.ts';
import { type Notebook, readNotebook } from '../frontends/notebook/index.ts';
import { applyEdits } from '../repairs/apply.ts';
import type { Workspace } from '../service/contract.ts';
import { applyProven, type Repaired } from '../service/fix-all.ts';
import type { Document } from './document.ts';

/** The text of a file with every proven fix, written into the cells where it is a notebook. */
export function fixDocument(workspace: Workspace, file: string, { text, language, notebook }: Document): Repaired {
  if (!notebook) return applyProven(workspace, file, text, language);
  let now: Notebook = notebook;
  const { fixed } = applyProven(workspace, file, text, language, undefined, {
    can: (edits) => now.toFileEdits(edits) !== undefined,
    write(edits) {
      now = changed(now, edits);
      return now.program.text;
    },
  });
  return { text: now.file, fixed };
}

function changed(notebook: Notebook, edits: readonly TextEdit[]): Notebook {
  const read = readNotebook(applyEdits(notebook.file, notebook.toFileEdits(edits) ?? []), notebook.language);
  if (!read.ok) throw new Error(read.problem);
  return read.notebook;
}

/** `3 findings fixed in a.py: scale-mismatch 2, ambiguous-unit 1`. */
export function fixedSentence(name: string, { fixed }: Repaired, past = 'fixed'): string {
  const counts = Object.entries(fixed);
  const all = counts.reduce((sum, [, count]) => sum + count, 0);
  return `${all} finding${all === 1 ? '' : 's'} ${past} in ${name}: ${counts.map(([code, count]) => `${code} ${count}`).join(', ')}`;
}

/** A unified diff of a file, as `patch` and `git apply` read it; empty where nothing changed. */
export function unifiedDiff(name: string, before: string, after: string): string {
  if (before === after) return '';
  const [, from = '', to = '', ...rest] = createTwoFilesPatch(`a/${name}`, `b/${name}`, before, after, '', '', { context: 3 }).split('\n');
  return [from.trimEnd(), to.trimEnd(), ...rest].join('\n');
}
