import type { FindingCode, Severity } from '../findings/finding.ts';
import { findingCodes } from '../findings/finding.ts';
import type { CheckResult, SymbolGroup } from '../service/contract.ts';
import type { Summary } from './report.ts';

/** Counts over the files of one run. */
export class Tally {
  files = 0;
  private functions = 0;
  private notes = 0;
  private unread = 0;
  private flagged = 0;
  private units: { known: number; all: number } | undefined;
  private readonly codes = new Map<FindingCode, number>();
  private readonly severities: Record<Severity, number> = { error: 0, warning: 0, information: 0, hint: 0 };
  private readonly unreadable: { file: string; problem: string }[] = [];

  count(result: CheckResult): void {
    this.files++;
    this.functions += result.statistics.functions;
    this.notes += result.statistics.notes;
    this.unread += result.statistics.unread.length;
    if (result.findings.some((each) => each.severity !== 'hint')) this.flagged++;
    for (const { code, severity } of result.findings) {
      this.codes.set(code, (this.codes.get(code) ?? 0) + 1);
      this.severities[severity]++;
    }
  }

  countUnits(groups: readonly SymbolGroup[]): void {
    this.units ??= { known: 0, all: 0 };
    for (const { symbols } of groups) {
      this.units.all += symbols.length;
      this.units.known += symbols.filter(({ origin }) => origin !== 'unknown').length;
    }
  }

  countUnreadable(file: string, problem: string): void {
    this.unreadable.push({ file, problem });
  }

  summary(seconds: number): Summary {
    const { files, functions, notes, unread, flagged, unreadable, units } = this;
    const byCode = Object.fromEntries(findingCodes.flatMap((code) => (this.codes.has(code) ? [[code, this.codes.get(code)]] : [])));
    return { files, functions, notes, unread, flagged, byCode, bySeverity: { ...this.severities }, seconds, unreadable, units };
  }
}
