/** A hover in words. */
import type { HoverInfo } from '../service/contract.ts';

const mostNotes = 6;
const mostKinds = 4;

/** A heading with the symbol and its unit, then what kind of quantity it is, and where that comes from. */
export function hoverText(info: HoverInfo, markdown: boolean): string {
  const code = (text: string): string => (markdown ? `\`${text.replaceAll('`', "'")}\`` : text);
  const strong = (text: string): string => (markdown ? `**${text}**` : text);
  if (info.conversion) return `${code(info.name)}: taken as the conversion from ${info.conversion.from} to ${info.conversion.to}.`;
  const lines = [
    `${code(info.name)}: ${strong(unitWords(info))}${info.description ? `, ${plain(info.description, markdown)}` : ''}`,
    dimensionWords(info),
    ...(info.group ? [`${info.group.code === info.name ? 'This' : `In ${code(info.group.code)}`}: ${info.group.text}.`] : []),
    ...(info.range ? [rangeWords(info.range, info.unit)] : []),
    ...originWords(info, code),
  ];
  return lines.join('\n\n');
}

function unitWords({ unit, dimension }: HoverInfo): string {
  if (dimension === '1' && (unit === undefined || /^(?:1|-+|dimensionless)?$/.test(unit.trim()))) return 'dimensionless';
  return unit === undefined || unit === '' ? 'unit left open' : `[${unit}]`;
}

function dimensionWords({ dimension, kinds }: HoverInfo): string {
  if (dimension === '1') return 'A pure number.';
  const named = kinds.slice(0, mostKinds).join(', ');
  return `Dimension ${dimension}${named === '' ? '' : `: ${named}${kinds.length > mostKinds ? ', …' : ''}`}.`;
}

function rangeWords({ low, high }: { readonly low: number; readonly high: number }, unit: string | undefined): string {
  const behind = unit ? ` ${unit}` : '';
  return low === high ? `Value ${low}${behind}.` : `Between ${low} and ${high}${behind}.`;
}

function originWords({ origin, notes }: HoverInfo, code: (text: string) => string): readonly string[] {
  const listed = notes.slice(0, mostNotes).map(({ symbol, unit, file, line }) => `${code(symbol)} [${unit === '' ? '-' : unit}], ${file === undefined ? '' : `${file.slice(file.lastIndexOf('/') + 1)}, `}line ${line}`);
  const list = `${listed.join('; ')}${notes.length > mostNotes ? '; …' : ''}`;
  switch (origin) {
    case 'declared':
      return notes.length === 0 ? [] : [`Declared: ${list}.`];
    case 'library':
      return ['From a library.'];
    case 'inferred':
      return [notes.length === 0 ? 'Inferred from its uses.' : `Inferred from ${list}.`];
  }
}

/** Words of a comment, without a meaning in Markdown. */
function plain(text: string, markdown: boolean): string {
  return markdown ? text.replace(/[\\`*_{}[\]<>#|~]/g, '\\$&') : text;
}
