/** The form that people read. */
import type { FindingCode } from '../../findings/finding.ts';
import { findingCodes } from '../../findings/finding.ts';
import { searchedFor } from '../languages.ts';
import type { Format, Region, Reported, ReportedPlace, Summary } from '../report.ts';
import { painter, type Paint, showLine, type Style, wrap } from '../terminal.ts';

export interface TextOptions {
  readonly color: boolean;
  /** Columns of the terminal. */
  readonly width: number;
  readonly hints: boolean;
  readonly stats: boolean;
}

export function textFormat(options: TextOptions): Format {
  const paint = painter(options.color);
  return {
    begin: () => '',
    file: (findings) => findings.filter((each) => options.hints || each.severity !== 'hint').map((each) => findingText(each, options.width, paint)).join(''),
    end: (summary) => summaryText(summary, options) + (options.stats ? statisticsText(summary) : ''),
  };
}

function findingText(finding: Reported, width: number, paint: Paint): string {
  const place = paint('strong', placeText(finding));
  const gutter = Math.max(...[finding, ...finding.related].map((each) => String(each.line).length), 3);
  const lines = [`${place}  ${paint(finding.severity, finding.severity)}  ${finding.code}`, ...sourceLines(finding, gutter, width, paint, finding.severity)];
  lines.push(...wrap(finding.message, width - 2).map((line) => `  ${line}`));
  for (const related of finding.related) lines.push(...relatedLines(related, finding.file, gutter, width, paint));
  return `${lines.join('\n')}\n\n`;
}

function relatedLines(related: ReportedPlace, file: string, gutter: number, width: number, paint: Paint): readonly string[] {
  const place = related.file !== file ? placeText(related) : related.cell === undefined ? `line ${related.line}` : `cell ${related.cell}, line ${related.line}`;
  const said = wrap(`${place}: ${related.message}`, width - 4).map((line, at) => (at === 0 ? `  - ${line}` : `    ${line}`));
  return [...said, ...sourceLines(related, gutter, width, paint).slice(0, 1)];
}

function placeText({ file, cell, line, column }: ReportedPlace): string {
  return cell === undefined ? `${file}:${line}:${column}` : `${file}: cell ${cell}, line ${line}`;
}

function sourceLines(place: ReportedPlace, gutter: number, width: number, paint: Paint, style: Style = 'faint'): readonly string[] {
  if (place.source.trim() === '') return [];
  const end = place.endLine === place.line ? place.endColumn - 1 : place.source.trimEnd().length;
  const indent = ' '.repeat(gutter + 2);
  const shown = showLine(place.source, place.column - 1, end, Math.max(width - gutter - 5, 20));
  return [
    `${paint('faint', `${String(place.line).padStart(gutter + 2)} |`)} ${shown.text}`,
    `${paint('faint', `${indent} |`)} ${paint(style, shown.underline + beyond(place))}`,
  ];
}

function beyond(place: Region): string {
  return place.endLine > place.line ? `  … to line ${place.endLine}` : '';
}

function summaryText(summary: Summary, options: TextOptions): string {
  if (summary.files === 0) return `No file was checked.${summary.unreadable.length > 0 ? '' : ` Folders are searched for ${searchedFor.join(', ')}.`}\n`;
  const { error, warning, information, hint } = summary.bySeverity;
  const counts = [plural(error, 'error'), plural(warning, 'warning'), information > 0 ? `${information} for information` : ''].filter((each) => each !== '');
  if (options.hints && hint > 0) counts.push(plural(hint, 'hint'));
  const files = plural(summary.files, 'file');
  const lines = [counts.length === 0 ? `Nothing found in ${files}.` : `${counts.join(', ')} in ${summary.flagged === summary.files ? '' : `${summary.flagged} of `}${files}.`];
  if (!options.hints && hint > 0) lines.push(`${plural(hint, 'hint')} not shown; --hints shows ${hint === 1 ? 'it' : 'them'}.`);
  if (summary.notes === 0) lines.push('No unit note was found, so there was nothing to check against: write units in comments (D = 0.05  # [m]), documentation, or a .nomen file.');
  return `${lines.flatMap((line) => wrap(line, options.width)).join('\n')}\n`;
}

/** The figures of `--stats`, as lines. */
export function statisticsText(summary: Summary): string {
  const rows: (readonly [string, string])[] = [
    ['files', String(summary.files)],
    ['functions', String(summary.functions)],
    ['notes read', String(summary.notes)],
    ['brackets not read', String(summary.unread)],
    ...(summary.units ? [['units known', unitShare(summary.units)] as const] : []),
    ...findingCodes.filter((code) => summary.byCode[code]).map((code: FindingCode) => [code, String(summary.byCode[code])] as const),
    ['seconds', summary.seconds.toFixed(2)],
  ];
  const [wide, high] = [0, 1].map((at) => Math.max(...rows.map((row) => (row[at] as string).length)));
  return `\n${rows.map(([name, value]) => `${name.padEnd(wide as number)}  ${value.padStart(high as number)}`).join('\n')}\n`;
}

function plural(count: number, noun: string): string {
  return count === 0 ? '' : `${count} ${noun}${count === 1 ? '' : 's'}`;
}

/** `11 of 14 (79 %)`. */
function unitShare({ known, all }: { readonly known: number; readonly all: number }): string {
  return all === 0 ? '0' : `${known} of ${all} (${Math.round((100 * known) / all)} %)`;
}
