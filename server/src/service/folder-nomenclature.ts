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
  symbol(name: string): NoteInForce | undefined;
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
    return {
      symbol: (name) => symbols.get(name) ?? outer.symbol(name),
      vocabulary,
      signatures: [...read.map((each) => each.table), ...outer.signatures],
      fingerprint: `${++this.versions}`,
    };
  }
}

const nothing: Reach = { symbol: () => undefined, vocabulary: emptyVocabulary, signatures: [], fingerprint: '' };
