import { existsSync, readFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import type { FindingCode } from '../program/codes.ts';

/** The page that explains a finding, as Markdown; it lies beside the bundle, or beside its check in the sources. */
export function pageOf(code: FindingCode): string {
  return readFileSync(pageFile(code), 'utf8');
}

/** Where that page lies. */
export function pageFile(code: FindingCode): string {
  const here = dirname(fileURLToPath(import.meta.url));
  const bundled = join(here, 'pages');
  return join(existsSync(bundled) ? bundled : join(here, '..', 'findings', 'checks'), `${code}.md`);
}
