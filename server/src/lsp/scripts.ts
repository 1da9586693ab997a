/** The scripts of folders, as a search of the command would find them. */
import { walk } from '../platform/walk.ts';
import { isPath } from './paths.ts';
import type { Session } from './session.ts';

/** Past so many files a search ends: what was found until then is shown. */
const most = 5000;

export function* scriptsIn({ configurations }: Session, folders: readonly string[]): Generator<string> {
  let count = 0;
  for (const found of walk(folders.filter(isPath), (folder) => configurations.at(folder.replaceAll('\\', '/')))) {
    if (found.kind !== 'file') continue;
    if (++count > most) return;
    yield found.path.replaceAll('\\', '/');
  }
}
