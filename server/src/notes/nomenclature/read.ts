import { Dimension } from '../../quantities/dimension.ts';
import { parseFactor } from '../../quantities/factor.ts';
import { parseUnit } from '../../quantities/parse-unit.ts';
import { Scale } from '../../quantities/scale.ts';
import { scaledBy, type Unit } from '../../quantities/unit.ts';
import { emptyVocabulary, type Vocabulary } from '../../quantities/unit-result.ts';
import { loadSignatures } from '../../signatures/load.ts';
import { readLine } from './line.ts';
import type { Nomenclature } from './model.ts';

/** Reads a nomenclature file. `base` holds the units declared further out. Never throws. */
export function readNomenclature(text: string, file: string, base: Vocabulary = emptyVocabulary): Nomenclature {
  const raw = splitLines(text);
  const vocabulary = declaredUnits(raw.map((each) => each.text), base);
  const lines = raw.map((each) => ({ ...each, line: readLine(each.text, vocabulary) }));
  const signatures = lines.filter((each) => each.line.kind === 'signature').map((each) => each.text).join('\n');
  return { file, lines, vocabulary, table: loadSignatures([{ file, text: signatures }], vocabulary) };
}

export function splitLines(text: string): readonly { readonly start: number; readonly text: string }[] {
  const lines: { start: number; text: string }[] = [];
  let start = 0;
  for (const raw of text.split('\n')) {
    lines.push({ start, text: raw.endsWith('\r') ? raw.slice(0, -1) : raw });
    start += raw.length + 1;
  }
  return lines;
}

/** `unit crate = 18.5 kg` and `unit item` (a base dimension of its own), each usable in the lines after it and before. */
export function declaredUnits(lines: readonly string[], base: Vocabulary): Vocabulary {
  const units = new Map(base.units);
  const made: string[] = [];
  for (const text of lines) {
    if (!/^\s*unit\s/.test(text)) continue;
    const line = readLine(text);
    if (line.kind === 'base') units.set(line.name, { dimension: Dimension.base(line.name), scale: Scale.one, text: line.name });
    else if (line.kind === 'unit') {
      const unit = declaredUnit(line.factor, line.of, { units, fingerprint: `${base.fingerprint}${made.join('|')}` }, line.name);
      if (unit) units.set(line.name, unit);
    } else continue;
    made.push(text.trim());
  }
  return made.length === 0 ? base : { units, fingerprint: `${base.fingerprint}|${made.join('|')}` };
}

function declaredUnit(factor: string, of: string, vocabulary: Vocabulary, name: string): Unit | undefined {
  const unit = parseUnit(of, { vocabulary });
  if (!unit.ok) return undefined;
  try {
    return { ...scaledBy(unit.unit, parseFactor(factor), name), text: name };
  } catch {
    return undefined;
  }
}
