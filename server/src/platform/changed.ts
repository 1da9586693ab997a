/** Files that differ from a revision, as git tells. */
import { execFileSync } from 'node:child_process';
import { realpathSync } from 'node:fs';
import { join } from 'node:path';

/** Real paths of the files that were changed since a revision or are not under version control, deleted ones left out; a sentence where git cannot tell. */
export function changedSince(revision: string, folder: string): ReadonlySet<string> | string {
  try {
    const root = git(folder, 'rev-parse', '--show-toplevel').trim();
    const names = [git(root, 'diff', '--name-only', '-z', '--diff-filter=d', revision, '--'), git(root, 'ls-files', '--others', '--exclude-standard', '-z')];
    return new Set(names.flatMap((each) => each.split('\0')).filter((name) => name !== '').flatMap((name) => realPath(join(root, name))));
  } catch (error) {
    const { code, stderr } = error as { code?: string; stderr?: string };
    if (code === 'ENOENT') return 'git is not on this machine';
    return (stderr ?? '').trim().split('\n')[0]?.replace(/^fatal: /, '') || 'git failed';
  }
}

function git(folder: string, ...args: readonly string[]): string {
  return execFileSync('git', ['-C', folder, ...args], { encoding: 'utf8', maxBuffer: 1 << 28, stdio: ['ignore', 'pipe', 'pipe'] });
}

function realPath(path: string): readonly string[] {
  try {
    return [realpathSync(path)];
  } catch {
    return [];
  }
}
