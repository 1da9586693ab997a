/** Sections of a documentation text: numpydoc's underlined headings, Google's headings with a colon, and Markdown's as in the docstrings of Julia. */
import { isBlank, type Line } from './doc-lines.ts';

export type Role = 'parameter' | 'result' | 'field';

export interface Section {
  readonly role: Role | 'skip';
  readonly style: 'underlined' | 'colon' | 'markdown';
  /** Lines of the body, from and to (excluded). */
  readonly from: number;
  readonly to: number;
}

const roles: ReadonlyMap<string, Role | 'skip'> = new Map([
  ...['parameters', 'other parameters', 'args', 'arguments', 'params', 'inputs', 'input', 'keyword arguments', 'keyword args', 'keyword parameters', 'kwargs', 'parameter', 'required parameters', 'optional parameters', 'input arguments', 'input parameters', 'input variables'].map((name) => [name, 'parameter'] as const),
  ...['returns', 'return', 'yields', 'yield', 'outputs', 'output', 'receives', 'output arguments', 'output parameters', 'output variables'].map((name) => [name, 'result'] as const),
  ...['attributes', 'fields', 'attribute', 'properties'].map((name) => [name, 'field'] as const),
  ...['notes', 'note', 'examples', 'example', 'references', 'reference', 'raises', 'raise', 'warnings', 'warning', 'warns', 'see also', 'methods', 'todo', 'usage', 'description', 'summary', 'remarks', 'source', 'sources', 'author', 'authors', 'syntax', 'calls', 'called by', 'version', 'history', 'copyright'].map((name) => [name, 'skip'] as const),
]);

/** All sections in order; what stands before the first belongs to none. */
export function sectionsOf(lines: readonly Line[]): readonly Section[] {
  const heads: { readonly at: number; readonly role: Role | 'skip'; readonly style: Section['style']; readonly indent: number }[] = [];
  lines.forEach((line, at) => {
    const head = headAt(lines, at);
    if (head) heads.push({ at, ...head, indent: line.indent });
  });
  const told = heads.filter((head) => head.style !== 'markdown' || heads.some((each) => each.style === 'markdown' && each.role !== 'skip'));
  return told.map((head, index) => {
    const from = head.at + (head.style === 'underlined' ? 2 : 1);
    const limit = told[index + 1]?.at ?? lines.length;
    const to = head.style !== 'colon' ? limit : dedent(lines, from, limit, head.indent);
    return { role: head.role, style: head.style, from, to };
  });
}

function headAt(lines: readonly Line[], at: number): { readonly role: Role | 'skip'; readonly style: Section['style'] } | undefined {
  const line = lines[at] as Line;
  if (isBlank(line) || line.text.length > 24) return undefined;
  const marked = /^#{1,4}\s+(.*?):?$/.exec(line.text);
  if (marked) return { role: roles.get((marked[1] as string).toLowerCase()) ?? 'skip', style: 'markdown' };
  const below = lines[at + 1];
  const plain = line.text.replace(/\s*:$/, '');
  if (below && /^(?:-{3,}|={3,}|~{3,})$/.test(below.text)) return { role: roles.get(plain.toLowerCase()) ?? 'skip', style: 'underlined' };
  if (!line.text.endsWith(':')) return undefined;
  const role = roles.get(plain.trim().toLowerCase());
  return role ? { role, style: 'colon' } : undefined;
}

/** The first line that stands no deeper than the heading. */
function dedent(lines: readonly Line[], from: number, limit: number, indent: number): number {
  for (let at = from; at < limit; at++) if ((lines[at] as Line).indent <= indent) return at;
  return limit;
}
