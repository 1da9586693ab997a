/** A vitest reporter that writes its counts to the file named by TERMWISE_COUNTS. A file that fails to load counts as a failure. */
import { writeFileSync } from 'node:fs';

export default class CountReporter {
  onTestRunEnd(modules, unhandledErrors) {
    const counts = { passed: 0, failed: unhandledErrors.length, skipped: 0 };
    for (const module of modules) {
      for (const test of module.children.allTests()) counts[stateOf(test)]++;
      if (module.errors().length > 0) counts.failed++;
      for (const suite of module.children.allSuites()) if (suite.errors().length > 0) counts.failed++;
    }
    if (process.env.TERMWISE_COUNTS) writeFileSync(process.env.TERMWISE_COUNTS, JSON.stringify(counts));
  }
}

function stateOf(test) {
  const { state } = test.result();
  return state === 'passed' || state === 'skipped' ? state : 'failed';
}
