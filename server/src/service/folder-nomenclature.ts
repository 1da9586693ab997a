/** The nomenclature files in reach of a script: those in its folder and above it, the nearest first. */
import type { NoteInForce } from '../constraints/value.ts';
import type { Nomenclature } from '../notes/nomenclature/model.ts';
import { readNomenclature } from '../notes/nomenclature/read.ts';
import { nomenclatureNotesInForce } from '../notes/nomenclature/in-force.ts';
import { emptyVocabulary, type Vocabulary } from '../quantities/unit-result.ts';
import type { SignatureTable } from '../solver/library.ts';
import type { FileSource } from './contract.ts';
import { join, parent } from '../text/paths.ts';

export interface Reach {
  /** The note on a symbol; `ignoringCase`: the name is in small letters, and the symbol may be written in others where there is only one such. */
  symbol(name: string, ignoringCase?: boolean): NoteInForce | undefined;
  readonly vocabulary: Vocabulary;
  readonly signatures: readonly SignatureTable[];
  /** Equal where the same files with the same contents are in reach. */
  readonly fingerprint: string;
}

/** Nomenclature by folder, read once until told otherwise. */
export class NomenclatureFolders {
  private readonly reaches = new Map<string, Reach>();
  private versions = 0;

  constructor(private readonly source: FileSource) {}

  forget(): void {
    this.reaches.clear();
  }

  reachOf(file: string): Reach {
    return this.inFolder(parent(file));
  }

  private inFolder(folder: string): Reach {
    let reach = this.reaches.get(folder);
    if (!reach) {
      const above = parent(folder);
      reach = this.extend(folder, above === folder ? nothing : this.inFolder(above));
      this.reaches.set(folder, reach);
    }
    return reach;
  }

  private extend(folder: string, outer: Reach): Reach {
    const names = this.source.list(folder).filter((name) => name.endsWith('.nomen')).sort();
    if (names.length === 0) return outer;
    let vocabulary = outer.vocabulary;
    const symbols = new Map<string, NoteInForce>();
    const read: Nomenclature[] = [];
    for (const name of names) {
      const file = join(folder, name);
      const nomenclature = readNomenclature(this.source.read(file) ?? '', file, vocabulary);
      vocabulary = nomenclature.vocabulary;
      for (const [symbol, note] of nomenclatureNotesInForce(nomenclature, file)) if (!symbols.has(symbol)) symbols.set(symbol, note);
      read.push(nomenclature);
    }
    let lowered: ReadonlyMap<string, NoteInForce | undefined> | undefined;
    return {
      symbol(name, ignoringCase) {
        if (!ignoringCase) return symbols.get(name) ?? outer.symbol(name);
        lowered ??= inSmallLetters(symbols);
        return lowered.get(name) ?? outer.symbol(name, ignoringCase);
      },
      vocabulary,
      signatures: [...read.map((each) => each.table), ...outer.signatures],
      fingerprint: `${++this.versions}`,
    };
  }
}

/** Symbols by their names in small letters; two that differ by case only are none. */
function inSmallLetters(symbols: ReadonlyMap<string, NoteInForce>): ReadonlyMap<string, NoteInForce | undefined> {
  const found = new Map<string, NoteInForce | undefined>();
  for (const [name, note] of symbols) found.set(name.toLowerCase(), found.has(name.toLowerCase()) ? undefined : note);
  return found;
}

const nothing: Reach = { symbol: () => undefined, vocabulary: emptyVocabulary, signatures: [], fingerprint: '' };
