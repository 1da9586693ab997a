import { parent } from '../text/paths.ts';
import type { Session } from './session.ts';

/** Whether the configuration in force for a file leaves it out. */
export function isLeftOut({ configurations }: Session, file: string): boolean {
  const { file: own, exclude } = configurations.at(parent(file));
  const folder = own === undefined ? undefined : parent(own);
  return folder !== undefined && file.startsWith(`${folder}/`) && exclude.ignores(file.slice(folder.length + 1));
}
