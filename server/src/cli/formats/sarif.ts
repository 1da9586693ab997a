/** SARIF 2.1.0, the OASIS standard for results of static analysis, written a result at a time. */
import type { Location, Notification, ReportingDescriptor, Result, Run } from 'sarif';
import { checks } from '../../findings/registry.ts';
import type { Severity } from '../../findings/finding.ts';
import type { Format, Region, Reported, ReportedPlace, Summary } from '../report.ts';

const schema = 'https://docs.oasis-open.org/sarif/sarif/v2.1.0/errata01/os/schemas/sarif-schema-2.1.0.json';
const baseId = 'WORKINGFOLDER';

/** `folderUri`: the working folder as a file URI with a slash at its end. */
export function sarifFormat(version: string, folderUri: string): Format {
  let first = true;
  return {
    begin() {
      const head: Omit<Run, 'results'> = {
        tool: { driver: { name: 'Termwise', semanticVersion: version, rules: rules() } },
        columnKind: 'utf16CodeUnits',
        originalUriBaseIds: { [baseId]: { uri: folderUri } },
      };
      return `{"$schema":${JSON.stringify(schema)},"version":"2.1.0","runs":[${JSON.stringify(head).slice(0, -1)},"results":[`;
    },
    file(findings) {
      let text = '';
      for (const finding of findings) {
        text += `${first ? '\n' : ',\n'}${JSON.stringify(resultOf(finding))}`;
        first = false;
      }
      return text;
    },
    end: (summary) => `${first ? '' : '\n'}],"invocations":[${JSON.stringify(invocation(summary))}]}]}\n`,
  };
}

function rules(): ReportingDescriptor[] {
  return checks.map((check) => ({
    id: check.code,
    shortDescription: { text: check.summary },
    defaultConfiguration: { level: levelOf(check.severity) },
  }));
}

function resultOf(finding: Reported): Result {
  return {
    ruleId: finding.code,
    ruleIndex: checks.findIndex((check) => check.code === finding.code),
    level: levelOf(finding.severity),
    message: { text: finding.message },
    locations: [locationOf(finding)],
    ...(finding.related.length > 0 && { relatedLocations: finding.related.map((each, at) => ({ id: at, ...locationOf(each), message: { text: each.message } })) }),
  };
}

function locationOf(place: ReportedPlace): Location {
  const physicalLocation = { artifactLocation: artifactOf(place.file), region: regionOf(place.stored ?? place) };
  return place.cell === undefined ? { physicalLocation } : { physicalLocation, logicalLocations: [{ name: `cell ${place.cell}`, fullyQualifiedName: `cell ${place.cell}, line ${place.line}` }] };
}

function artifactOf(file: string): { uri: string; uriBaseId?: string } {
  const path = file.split('/').map(encodeURIComponent).join('/');
  if (file.startsWith('/')) return { uri: `file://${path}` };
  if (/^[A-Za-z]:\//.test(file)) return { uri: `file:///${file.slice(0, 2)}${path.slice(4)}` };
  return { uri: path, uriBaseId: baseId };
}

function regionOf({ line, column, endLine, endColumn }: Region): { startLine: number; startColumn: number; endLine: number; endColumn: number } {
  return { startLine: line, startColumn: column, endLine, endColumn };
}

function invocation(summary: Summary): { executionSuccessful: boolean; toolExecutionNotifications?: Notification[] } {
  const notifications = summary.unreadable.map(({ file, problem }): Notification => ({ level: 'error', message: { text: `${file}: ${problem}` }, locations: [{ physicalLocation: { artifactLocation: artifactOf(file) } }] }));
  return { executionSuccessful: notifications.length === 0, ...(notifications.length > 0 && { toolExecutionNotifications: notifications }) };
}

function levelOf(severity: Severity): 'error' | 'warning' | 'note' {
  return severity === 'error' || severity === 'warning' ? severity : 'note';
}
