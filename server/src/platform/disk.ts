import { readdirSync, readFileSync } from 'node:fs';
import type { FileSource } from '../service/contract.ts';
import { decode } from './decode.ts';

/** Files of the disk as they are; what cannot be read is not there. Folder listings are kept until `forget`. */
export function diskFiles(): FileSource & { forget(): void } {
  const listings = new Map<string, readonly string[]>();
  return {
    read(file) {
      try {
        const decoded = decode(readFileSync(file));
        return decoded.ok ? decoded.text : undefined;
      } catch {
        return undefined;
      }
    },
    list(folder) {
      let names = listings.get(folder);
      if (!names) {
        names = namesIn(folder);
        listings.set(folder, names);
      }
      return names;
    },
    forget: () => listings.clear(),
  };
}

function namesIn(folder: string): readonly string[] {
  try {
    return readdirSync(folder);
  } catch {
    return [];
  }
}
