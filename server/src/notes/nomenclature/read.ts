import type { Expr } from '../../program/nodes.ts';
import { moveExpression } from './move.ts';
import { parseUnit } from '../../quantities/parse-unit.ts';
import type { Rational } from '../../quantities/rational.ts';
import { sameUnit } from '../../quantities/unit.ts';
import { emptyVocabulary, type Vocabulary } from '../../quantities/unit-result.ts';
import { loadSignatures } from '../../signatures/load.ts';
import { isNumber, readLine } from './line.ts';
import type { Nomenclature, NomenclatureFormula, NomenclatureSymbol, RelationLine, SymbolLine } from './model.ts';
import { movedBy, type NomenclatureProblem, problemAt } from './problem.ts';
import { declaredUnits } from './vocabulary.ts';

/** Reads a nomenclature file. `base` holds the units declared further out. Never throws; what cannot be read is in `problems`. */
export function readNomenclature(text: string, file: string, base: Vocabulary = emptyVocabulary): Nomenclature {
  const raw = splitLines(text).map((each) => ({ ...each, line: readLine(each.text, base) }));
  const { vocabulary, problems: unitProblems } = declaredUnits(raw, base);
  const lines = raw.map((each) => (each.line.kind === 'signature' && vocabulary !== base ? { ...each, line: readLine(each.text, vocabulary) } : each));
  const problems: NomenclatureProblem[] = [...unitProblems, ...lines.flatMap(({ start, line }) => line.problems.map((problem) => movedBy(problem, start)))];
  const symbols = new Map<string, NomenclatureSymbol>();
  const formulas = new Map<string, NomenclatureFormula>();
  const relations: RelationLine[] = [];
  for (const { start, line } of lines) {
    if (line.kind === 'relation') relations.push({ ...line, span: { start: start + line.span.start, end: start + line.span.end } });
    if (line.kind === 'symbol') addSymbol(line, start, vocabulary, symbols, formulas, problems);
  }
  const table = tableOf(lines, file, vocabulary);
  problems.sort((a, b) => a.span.start - b.span.start);
  return {
    file, lines, symbols, formulas, relations, vocabulary, table, problems,
    signatures: [...table.functions.values(), ...table.methods.values()], constants: [...table.constants.values()],
  };
}

/** Lines without their breaks, with the offset each begins at; `\n`, `\r\n` and a lone `\r` end a line. */
export function splitLines(text: string): readonly { readonly start: number; readonly text: string }[] {
  const lines: { start: number; text: string }[] = [];
  let start = 0;
  for (const match of text.matchAll(/\r\n|\n|\r|$/g)) {
    lines.push({ start, text: text.slice(start, match.index) });
    start = match.index + match[0].length;
  }
  return lines;
}

function addSymbol(line: SymbolLine, start: number, vocabulary: Vocabulary, symbols: Map<string, NomenclatureSymbol>, formulas: Map<string, NomenclatureFormula>, problems: NomenclatureProblem[]): void {
  const read = line.unitText === undefined ? undefined : parseUnit(line.unitText, { vocabulary, describes: `${line.name} ${line.description}` });
  const unitSpan = { start: start + line.unitSpan.start, end: start + line.unitSpan.end };
  if (read && !read.ok) problems.push({ span: unitSpan, kind: 'unknown-unit', message: `\`${line.unitText}\` is not a unit known here.`, unit: { text: line.unitText as string, fault: read } });
  const symbol: NomenclatureSymbol = {
    name: line.name,
    nameSpan: { start: start + line.nameSpan.start, end: start + line.nameSpan.end },
    unit: read?.ok ? read.unit : undefined,
    unitSpan,
    hints: read?.ok ? read.hints : [],
    value: line.value && plainNumber(line.value),
    range: line.range,
    description: line.description,
  };
  const before = symbols.get(line.name);
  if (before) {
    if (before.unit && symbol.unit && !sameUnit(before.unit, symbol.unit)) problems.push(problemAt('symbol-repeated', symbol.nameSpan.start, symbol.nameSpan.end, line.name));
    if (line.value && !isNumber(line.value) && !formulas.has(line.name) && before.value === undefined) formulas.set(line.name, formulaOf({ ...symbol, unit: symbol.unit ?? before.unit }, line.value, start));
    return;
  }
  symbols.set(line.name, symbol);
  if (line.value && !isNumber(line.value)) formulas.set(line.name, formulaOf(symbol, line.value, start));
}

function formulaOf(symbol: NomenclatureSymbol, value: Expr, start: number): NomenclatureFormula {
  return { ...symbol, formula: moveExpression(value, start) };
}

function plainNumber(expr: Expr): Rational | undefined {
  if (expr.kind === 'number') return expr.value;
  if (expr.kind !== 'unary' || expr.operand.kind !== 'number') return undefined;
  return expr.op === '-' ? expr.operand.value?.neg() : expr.operand.value;
}

/** Signatures of the file, and its dotted constants, as a library has them. */
function tableOf(lines: Nomenclature['lines'], file: string, vocabulary: Vocabulary): Nomenclature['table'] {
  const kept = lines.map(({ text, line, start }, at) => {
    const next = lines[at + 1]?.start ?? start + text.length;
    const blank = ' '.repeat(Math.max(0, next - start - 1));
    const isConstant = line.kind === 'symbol' && line.name.includes('.') && line.value !== undefined && (isNumber(line.value) || /\bpi\b/.test(text));
    return line.kind === 'signature' || isConstant ? text.padEnd(blank.length) : blank;
  });
  return loadSignatures([{ file, text: kept.join('\n') }], vocabulary);
}
