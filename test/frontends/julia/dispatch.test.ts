import { expect, test } from 'vitest';
import { engine, filesOf } from '../../harness/engine.ts';

const one = '"""\n    head(Q)\n\n# Arguments\n- `Q`: flow [m^3/s]\n"""\nhead(Q::Float64) = 3.0Q\n';
const other = 'head(p::Pump) = p.H\n';
const wrong = 'T = 3.0  # [K]\nh = head(T)\n';

async function codes(files: Record<string, string>, file: string): Promise<string> {
  const workspace = await engine(filesOf(files));
  await workspace.prepare('julia');
  return workspace.check(file, files[file] as string).findings.map((each) => each.code).join();
}

test.each([
  ['one method is checked', { 'p/a.jl': one + wrong }, 'unlike-result'],
  ['two that differ are not', { 'p/a.jl': one + other + wrong }, ''],
  ['one of another file of the module is', { 'p/M.jl': 'module M\ninclude("b.jl")\ninclude("a.jl")\nend\n', 'p/b.jl': one, 'p/a.jl': wrong }, 'unlike-result'],
  ['two in two files are not', { 'p/M.jl': 'module M\ninclude("b.jl")\ninclude("a.jl")\nend\n', 'p/b.jl': other, 'p/a.jl': one + wrong }, ''],
])('%s', async (_name, files, expected) => expect(await codes(files as Record<string, string>, 'p/a.jl')).toBe(expected));
