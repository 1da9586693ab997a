import { describe, expect, it } from 'vitest';
import type { Comment, Program } from '../../../server/src/program/nodes.ts';
import { formOf, parsePython } from '../../harness/python.ts';

describe('comments', () => {
  it.each([
    ['behind a statement', 'D = 0.05  # [m] bore', '(= D 1/20) # [m] bore'],
    ['behind two statements of one line', 'a = 1; b = 2  # [m]', '(= a 1) # [m] / (= b 2) # [m]'],
    ['behind the last line', 'x = (a\n     + b)  # [m]', '(= x (+ a b)) # [m]'],
    ['behind the first line', 'x = f(  # [m]\n    a,\n)', '(= x (f a)) # [m]'],
    ['behind a loop head', 'for i in r:  # [s]\n  x = i', 'for i in r # [s] /   (= x i)'],
    ['behind a function head', 'def f(V):  # [Pa]\n  return V', 'def f(V # [Pa]) # [Pa] /   (return V)'],
    ['behind an open function head', 'def f(  # [Pa]\n    V,\n):\n  return V', 'def f(V) # [Pa] /   (return V)'],
    ['behind a decorator', '@d  # [Pa]\ndef f(V):\n  return V', 'def f(V) @d # [Pa] /   (return V)'],
    ['above, without a blank line', '# one\n# two\nx = 1', '# one / # two / (= x 1)'],
    ['above, in a block', 'if a:\n  # one\n  x = 1', 'if a /   # one /   (= x 1)'],
    ['above, of another indentation', 'if a:\n    # one\n  # two\n  x = 1', 'if a /   # two /   (= x 1)'],
    ['above a decorated function', '# one\n@d\ndef f(): pass', '# one / def f() @d'],
    ['of several marks', 'x = 1  ### [m] ', '(= x 1) # [m]'],
    ['that are directives of documentation tools', '#: length [m]\nx = 1', '# length [m] / (= x 1)'],
    ['above, with a blank line: of nobody', '# one\n\nx = 1', '(= x 1)'],
    ['that are texts: none', 'x = "# [m]"', '(= x "# [m]")'],
  ])('%s', (_name, text, form) => expect(formOf(text)).toBe(form));

  it.each([
    ['parameters', 'def f(a,  # [m]\n      b=1,  # [s]\n      *, c): pass', 'def f(a # [m], b=1 # [s], !c)'],
    ['entries', 'p = {\n  "a": 1,  # [m]\n  "b": 2,  # [s]\n}', '(= p {"a": 1 {# [m]}, "b": 2 {# [s]}})'],
    ['items', 'p = [\n  1,  # [m]\n  2,\n  3,  # [s]\n]', '(= p (list 1{# [m]} 2 3{# [s]}))'],
  ])('on the lines of %s', (_name, text, form) => expect(formOf(text)).toBe(form));

  it('in a function that stand above nothing are loose', () => {
    expect(formOf('def f(V):\n  # V [m/s]\n\n  x = V\n  # done\n\ny = 1')).toBe('def f(V) /   (= x V) /   loose # V [m/s] /   loose # done / (= y 1)');
  });
  it('at the end of an inner function are loose there only', () => {
    expect(formOf('def f():\n  def g():\n    x = 1\n    # inner\n  y = 2\n  # outer')).toBe('def f() /   def g() /     (= x 1) /     loose # inner /   (= y 2) /   loose # outer');
  });
  it('are all listed, with the range of their text', () => {
    const text = '#!/bin/sh\n\n# é𝒳 one\nx = [1,  #   two  \n  2]\nif a:\n  pass  # three\n  # four\n#';
    const program = parsePython(text);
    expect(commentsOf(program).map((each) => each.text)).toEqual(['!/bin/sh', 'é𝒳 one', 'two', 'three', 'four', '']);
    for (const { start, end, text: words } of commentsOf(program)) expect(text.slice(start, end)).toBe(words);
  });
});

function commentsOf(program: Program): readonly Comment[] {
  return program.chunks.flatMap((chunk) => chunk.comments.map((each) => ({ text: each.text, start: each.start + chunk.anchor.start, end: each.end + chunk.anchor.start })));
}

describe('documentation', () => {
  it.each([
    ['of a module', '"""Pumps [m]"""\nx = 1', 'doc "Pumps [m]" / "Pumps [m]" / (= x 1)'],
    ['of a module below a licence', '# free\n# for all\n\n"""Pumps"""', 'doc "Pumps" / "Pumps"'],
    ['of a function', "def f():\n  r'''A\\b'''", 'def f() /   doc "A\\\\b" /   "A\\\\b"'],
    ['of a class', 'class A:\n  "B"', 'class A() /   doc "B" /   "B"'],
    ['not further down', 'x = 1\n"""text"""', '(= x 1) / "text"'],
    ['not of joined texts', 'def f():\n  "a" "b"', 'def f() /   "ab"'],
    ['not of formatted texts', 'def f():\n  f"a"', 'def f() /   "a"'],
    ['not of bytes', 'def f():\n  b"a"', 'def f() /   "a"'],
    ['of a field', 'class A:\n  x: float\n  """length [m]"""', 'class A() /   (declare x : float) # length [m] /   "length [m]"'],
    ['not of a field that has a comment', 'class A:\n  x = 1  # [s]\n  "[m]"', 'class A() /   (= x 1) # [s] /   "[m]"'],
    ['not of a field over several lines', 'class A:\n  x = 1\n  """a\n  b"""', 'class A() /   (= x 1) /   "a\\n  b"'],
  ])('%s', (_name, text, form) => expect(formOf(text)).toBe(form));

  it('keeps every character between the quotes', () => {
    const text = 'def f(é):\n    """\n    é : float\n        Länge 𝒳 [m]\r\n    \\n\n    """\n';
    const [statement] = parsePython(text).chunks[0]?.statements ?? [];
    const doc = statement?.kind === 'function' ? statement.doc : undefined;
    expect(doc && text.slice(doc.start, doc.end)).toBe(doc?.text);
    expect(doc?.text).toBe(text.slice(text.indexOf('"""') + 3, text.lastIndexOf('"""')));
  });
});
