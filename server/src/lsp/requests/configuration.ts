/** Problems of `termwise.json`, shown in the file itself. */
import { type Connection, DiagnosticSeverity } from 'vscode-languageserver/node.js';
import type { ConfigurationProblem } from '../../service/configuration.ts';
import { uriOf } from '../paths.ts';

/** Tells a client of the problems of each file, once for as long as they are the same. */
export function configurationProblems(connection: Connection): (file: string, problems: readonly ConfigurationProblem[]) => void {
  const told = new Map<string, string>();
  return (file, problems) => {
    const text = JSON.stringify(problems);
    if ((told.get(file) ?? '[]') === text) return;
    told.set(file, text);
    const diagnostics = problems.map(({ line, column, message }) => {
      const start = { line: line - 1, character: column - 1 };
      return { range: { start, end: { ...start, character: column } }, severity: DiagnosticSeverity.Error, source: 'termwise', message };
    });
    void connection.sendDiagnostics({ uri: uriOf(file), diagnostics });
  };
}
