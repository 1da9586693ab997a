import type { Format, Reported, ReportedPlace } from '../report.ts';

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
      const { files, functions, notes, byCode, seconds, units } = summary;
      const counts = JSON.stringify({ files, functions, notes, ...(units ? { units } : {}), findings: byCode, seconds: Math.round(seconds * 1000) / 1000 });
      return `${first ? '' : '\n'}],"summary":${counts}}\n`;
    },
  };
}

function entry(finding: Reported): object {
  const { line, column, endLine, endColumn, code, severity, message } = finding;
  const related = finding.related.map((each) => ({ ...fileOf(each), line: each.line, column: each.column, message: each.message }));
  return { ...fileOf(finding), line, column, endLine, endColumn, code, severity, message, related };
}

/** In a notebook with the number of the cell; lines and columns are those of the cell then. */
function fileOf({ file, cell }: ReportedPlace): object {
  return cell === undefined ? { file } : { file, cell };
}
