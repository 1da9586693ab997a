import type { Format, Reported } from '../report.ts';

/** The JSON form; its keys are a contract. One finding a line, so that it can be read and compared line by line. */
export function jsonFormat(): Format {
  let first = true;
  return {
    begin: () => '{"version":1,"findings":[',
    file(findings) {
      let text = '';
      for (const finding of findings) {
        text += `${first ? '\n' : ',\n'}${JSON.stringify(entry(finding))}`;
        first = false;
      }
      return text;
    },
    end: (summary) => {
      const { files, functions, notes, byCode, seconds } = summary;
      const counts = JSON.stringify({ files, functions, notes, findings: byCode, seconds: Math.round(seconds * 1000) / 1000 });
      return `${first ? '' : '\n'}],"summary":${counts}}\n`;
    },
  };
}

function entry(finding: Reported): object {
  const { file, line, column, endLine, endColumn, code, severity, message } = finding;
  const related = finding.related.map((each) => ({ file: each.file, line: each.line, column: each.column, message: each.message }));
  return { file, line, column, endLine, endColumn, code, severity, message, related };
}
