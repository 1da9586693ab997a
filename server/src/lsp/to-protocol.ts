/** The only place where findings and hovers become what the protocol carries. */
import { type Diagnostic, DiagnosticSeverity, type DiagnosticRelatedInformation, type Hover, MarkupKind } from 'vscode-languageserver/node.js';
import type { Severity } from '../findings/finding.ts';
import type { CheckResult, HoverInfo, PlacedFinding } from '../service/contract.ts';
import { LineIndex } from '../text/line-index.ts';
import { hoverText } from './hover-text.ts';
import { uriOf } from './paths.ts';
import { type Encoding, rangeOf } from './positions.ts';

/** What the client agreed on, and where texts and pages are. */
export interface Target {
  readonly encoding: Encoding;
  /** Text of a file that a related place is in. */
  readonly textOf: (file: string) => string;
  /** Address of the page that explains a code; undefined where the client opens none. */
  readonly pageUri: ((code: string) => string | undefined) | undefined;
  readonly relatedInformation: boolean;
  readonly markdown: boolean;
}

const severities: Readonly<Record<Severity, DiagnosticSeverity>> = {
  error: DiagnosticSeverity.Error,
  warning: DiagnosticSeverity.Warning,
  information: DiagnosticSeverity.Information,
  hint: DiagnosticSeverity.Hint,
};

export function toDiagnostics(result: CheckResult, target: Target): Diagnostic[] {
  const lines = LineIndex.of(result.text);
  return result.findings.map((finding) => toDiagnostic(finding, lines, target));
}

export function toHover(info: HoverInfo, text: string, target: Target): Hover {
  const value = hoverText(info, target.markdown);
  return { contents: { kind: target.markdown ? MarkupKind.Markdown : MarkupKind.PlainText, value }, range: rangeOf(LineIndex.of(text), info.span, target.encoding) };
}

function toDiagnostic(finding: PlacedFinding, lines: LineIndex, target: Target): Diagnostic {
  const { code, severity, message, span, related } = finding;
  return {
    range: rangeOf(lines, span, target.encoding),
    severity: severities[severity],
    code,
    source: 'termwise',
    message,
    ...described(target.pageUri?.(code)),
    ...(target.relatedInformation && related.length > 0 ? { relatedInformation: related.map((each) => toRelated(each, target)) } : {}),
  };
}

function described(href: string | undefined): Pick<Diagnostic, 'codeDescription'> {
  return href === undefined ? {} : { codeDescription: { href } };
}

function toRelated({ file, span, message }: PlacedFinding['related'][number], target: Target): DiagnosticRelatedInformation {
  return { location: { uri: uriOf(file), range: rangeOf(LineIndex.of(target.textOf(file)), span, target.encoding) }, message };
}
