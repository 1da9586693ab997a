/** Dimensionless groups of the files that are checked: what the workspace offers beside its checks. */
import type { Understood } from '../analyze.ts';
import type { HostStyle } from '../frontends/frontend.ts';
import type { Span } from '../text/span.ts';
import { type GroupAction, groupActions } from './groups-actions.ts';
import { type GroupAtPlace, groupAt } from './groups-at.ts';
import type { TextOf } from './groups-symbols.ts';
import { type FoundRelation, type RelationOptions, relationsOf } from './relations.ts';

/** For a file that was checked last with the text it has now; empty for any other. */
export interface GroupsService {
  relations(file: string, options?: RelationOptions): readonly FoundRelation[];
  /** `selection`: statements to be taken as a relation where none is stated. */
  actions(file: string, offset: number, selection?: Span): readonly GroupAction[];
  at(file: string, offset: number): GroupAtPlace | undefined;
}

/** `lookup` gives what was last understood of a file. */
export function groupsService(lookup: (file: string) => { readonly understood: Understood; readonly style: HostStyle } | undefined, textOf: TextOf): GroupsService {
  return {
    relations(file, options) {
      const held = lookup(file);
      return held ? relationsOf(held.understood, textOf, options) : [];
    },
    actions(file, offset, selection) {
      const held = lookup(file);
      return held ? groupActions(held.understood, held.style, offset, textOf, selection) : [];
    },
    at(file, offset) {
      const held = lookup(file);
      return held && groupAt(held.understood, offset, textOf);
    },
  };
}
