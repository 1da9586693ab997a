import { dirname } from 'node:path';
import { matches } from '../platform/ignored.ts';
import { parent } from '../text/paths.ts';
import { isPath } from './paths.ts';
import type { Session } from './session.ts';

/** Whether the configuration in force for a file leaves it out. */
export function isLeftOut({ configurations }: Session, file: string): boolean {
  if (!isPath(file)) return false;
  const configuration = configurations.at(parent(file));
  return configuration.file !== undefined && matches(configuration.exclude, dirname(configuration.file), file, false);
}
