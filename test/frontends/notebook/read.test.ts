import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { joinCells, notebookLanguage, readNotebook } from '../../../server/src/frontends/notebook/index.ts';
import { notebookFile, readable } from './helpers.ts';

describe('files', () => {
  test('code cells make one program, a blank line between them', () => {
    const { program, cells, language } = readable(notebookFile(['V = 2.0  # [m/s]', 'md:# Flow', 'Q = V*A\nprint(Q)']));
    expect(language).toBe('python');
    expect(cells).toHaveLength(3);
    expect(program.text).toBe('V = 2.0  # [m/s]\n\nQ = V*A\nprint(Q)');
    expect(program.toCell({ start: program.text.indexOf('print'), end: program.text.length })).toEqual({ cell: 2, start: 8, end: 16 });
  });

  // nbformat documentation, "The Notebook file format": a multi-line string is a string or a list of strings.
  test('a source may be one string', () => {
    const file = JSON.stringify({ cells: [{ cell_type: 'code', source: 'a = 1\nb = "\\u00b0"' }], metadata: {}, nbformat: 4 });
    const { program, toFile } = readable(file);
    expect(program.text).toBe('a = 1\nb = "\\u00b0"');
    const raw = toFile({ cell: 0, start: 6, end: 18 });
    expect(file.slice(raw.start, raw.end)).toBe('b = \\"\\\\u00b0\\"');
  });

  // nbformat documentation, "Changelog", version 3: worksheets hold the cells, code stands under `input`, each cell names its language.
  test('worksheets of version 3', () => {
    const sheet = { cells: [{ cell_type: 'heading', level: 1, source: ['Title'] }, { cell_type: 'code', language: 'python', input: ['x = 1\n', 'y = 2'] }, { cell_type: 'code', language: 'ruby', input: ['z = 3'] }] };
    const { program } = readable(JSON.stringify({ metadata: { name: '' }, nbformat: 3, worksheets: [sheet] }));
    expect(program.text).toBe('x = 1\ny = 2');
    expect(program.toCell({ start: 0, end: 1 })?.cell).toBe(1);
    expect(program.toProgram({ cell: 2, offset: 0 })).toBeUndefined();
  });

  test.each([
    ['python', 'python'], ['Python3', 'python'], ['julia', 'julia'], ['julia-1.10', 'julia'], ['octave', 'matlab'], ['MATLAB', 'matlab'], ['R', undefined], ['ir', undefined], ['constructor', undefined],
  ])('kernel %s', (name, language) => {
    expect(notebookLanguage(name)).toBe(language);
  });

  test('a cell in another language than the kernel is left out', () => {
    const file = JSON.stringify({ cells: [{ cell_type: 'code', metadata: { vscode: { languageId: 'julia' } }, source: 'a = 1' }, { cell_type: 'code', metadata: {}, source: 'b = 2' }], metadata: { kernelspec: { name: 'python3' } } });
    expect(readable(file).program.text).toBe('b = 2');
  });

  test.each([
    ['', 'JSON'], ['{"cells": [', 'JSON'], ['<<<<<<< HEAD\n{}', 'JSON'], ['[]', 'no list of cells'], ['{"cells": {}}', 'no list of cells'], ['['.repeat(200000), 'JSON'],
    [notebookFile(['x <- 1'], 'R'), "language, R, is not read"],
  ])('refusals: %#', (file, words) => {
    const read = readNotebook(file);
    expect(!read.ok && read.problem).toContain(words);
  });

  test('a refusal for the language alone says so, and gives way to a language that is given', () => {
    const read = readNotebook(notebookFile(['x = 1'], 'sage'));
    expect(!read.ok && read.otherLanguage).toBe(true);
    expect(readNotebook(notebookFile(['x = 1'], 'sage'), 'python').ok).toBe(true);
  });

  test('no text throws', () => {
    fc.assert(fc.property(fc.json(), (file) => void readNotebook(file)));
    fc.assert(fc.property(fc.string(), (file) => void readNotebook(`{"cells":[{"cell_type":"code","source":[${file}]}]}`)));
  });
});

describe('commands to the kernel', () => {
  const blanked = (cell: string, language: 'python' | 'julia' | 'matlab' = 'python'): string => joinCells([{ text: cell, language }], language).text;

  // IPython documentation, "Built-in magic commands" and "System shell access".
  test.each([
    ['%matplotlib inline\nx = 1', '0                 \nx = 1'],
    ['!pip install "don\'t\nx = 1', `0${' '.repeat('!pip install "don\'t'.length - 1)}\nx = 1`],
    ['!pip install \\\n  numpy\nx = 1', `0${' '.repeat(13)}\n       \nx = 1`],
    ['x = 1\n?abs\nabs?\nnp.abs??', 'x = 1\n0   \n0   \n0       '],
    ['files = !ls', '0          '],
    ['%time y = f(x)  # [m]', '0;    y = f(x)  # [m]'],
    ['%%time\ny = f(x)', '0     \ny = f(x)'],
    ['\n%%capture --no-display\ny = 1', `\n0${' '.repeat(21)}\ny = 1`],
    ['if x:\n    !ls\nelse:\n    y = 1', 'if x:\n    0  \nelse:\n    y = 1'],
    ['%%bash\nls -l', ''], ['%%writefile a.py\nx = 1', ''], ['%%html\n<b>', ''],
  ])('Python: %j', (cell, text) => {
    expect(blanked(cell)).toBe(text);
  });

  test.each([
    'x = (a\n% b)', 's = """\n%matplotlib\n!ls\n"""', 'x = a \\\n  % b', 'y = x % 3', 'print("what?")', '# why?', 'x = y != z', "s = 'a'  # don't\nt = 2",
  ])('Python that only looks like one stays: %j', (cell) => {
    expect(blanked(cell)).toBe(cell);
  });

  test.each(['x = (1,\n', 's = """open\nx = 1', "s = '''"])('a cell that breaks off could not be run and is left out: %j', (cell) => {
    expect(joinCells([{ text: cell, language: 'python' }, { text: 'z = 1', language: 'python' }], 'python').text).toBe('z = 1');
  });

  // IJulia manual, "Magics" and "Additional functionality".
  test.each([[';ls', ''], ['?sin', ''], [']add Example', ''], ['x = [1;\n2]', 'x = [1;\n2]']])('Julia: %j', (cell, text) => {
    expect(blanked(cell, 'julia')).toBe(text);
  });

  // Metakernel, "Magics"; in Octave % begins a comment.
  test.each([['%%bash\nls', ''], ['%% Section\nx = 1;', '%% Section\nx = 1;'], ['!ls\nx = 1;', '   \nx = 1;'], ['y = !x;', 'y = !x;'], ['%plot inline', '%plot inline']])('Octave: %j', (cell, text) => {
    expect(blanked(cell, 'matlab')).toBe(text);
  });

  test('every character that is not blanked keeps its place', () => {
    const line = fc.constantFrom('x = 1', '%matplotlib inline', '!ls "', 'if x:', '    !ls', '    y = 2', '%time z = 3', 'abs?', '"""', ')', '(', '# a', '', '%%bash', "it's");
    fc.assert(fc.property(fc.array(line, { maxLength: 8 }), fc.constantFrom('\n', '\r\n'), (lines, end) => {
      const cell = lines.join(end);
      const { text } = joinCells([{ text: cell, language: 'python' }], 'python');
      if (text === '') return;
      expect(text).toHaveLength(cell.length);
      expect(text.replace(/[^\r\n]/g, '')).toBe(cell.replace(/[^\r\n]/g, ''));
    }));
  });
});

describe('places', () => {
  const cellText = fc.array(fc.constantFrom('a = 1', '"é"', '\\n', '\t', '🌊', '/', '\u0001', '\n', '\r\n', "'"), { maxLength: 12 }).map((parts) => parts.join(''));

  test('go to the program and back', () => {
    fc.assert(fc.property(fc.array(cellText, { minLength: 1, maxLength: 4 }), fc.nat(), fc.nat(), (texts, pick, at) => {
      const cells = texts.map((text) => ({ text, language: 'julia' as const }));
      const joined = joinCells(cells, 'julia');
      const cell = pick % cells.length;
      const offset = at % ((texts[cell] as string).length + 1);
      const inProgram = joined.toProgram({ cell, offset });
      if (inProgram === undefined) return;
      expect(joined.toCell({ start: inProgram, end: inProgram })).toEqual({ cell, start: offset, end: offset });
    }));
  });

  test.each(['list', 'string', 'escaped'])('go to the file: %s', (form) => {
    fc.assert(fc.property(cellText, fc.nat(), fc.nat(), (text, one, other) => {
      const source = form === 'list' ? text.split(/(?<=\n)/) : text;
      const plain = JSON.stringify({ cells: [{ cell_type: 'code', source }], metadata: { language_info: { name: 'julia' } } }, null, 1);
      const file = form === 'escaped' ? plain.replace(/[^\u0000-\u007F]/g, (unit) => `\\u${unit.charCodeAt(0).toString(16).padStart(4, '0')}`).replaceAll('/', '\\/') : plain;
      const [start, end] = [one, other].map((each) => each % (text.length + 1)).sort((a, b) => a - b) as [number, number];
      const raw = readable(file).toFile({ cell: 0, start, end });
      const between = file.slice(raw.start, raw.end).replace(/",\n\s*"/g, '');
      expect(JSON.parse(`"${between}"`)).toBe(text.slice(start, end));
    }));
  });

  test('a span that runs over the end of a cell ends with it', () => {
    const joined = joinCells([{ text: 'a = 1', language: 'python' }, { text: 'b = 2', language: 'python' }], 'python');
    expect(joined.toCell({ start: 4, end: 9 })).toEqual({ cell: 0, start: 4, end: 5 });
    expect(joined.toCell({ start: 6, end: 9 })).toEqual({ cell: 0, start: 5, end: 5 });
    expect(joinCells([], 'python').toCell({ start: 0, end: 0 })).toBeUndefined();
  });
});

test('a line of a text cell that states a relation is a comment of the program', () => {
  const cells = [{ text: 'Losses.\n\n h depends on V, D\nand more depends on V', language: undefined, isProse: true }, { text: 'h = f(V, D)', language: 'python' as const }];
  const joined = joinCells(cells, 'python');
  expect(joined.text).toBe('# h depends on V, D\n\nh = f(V, D)');
  expect(joined.lineName(5)).toBe('cell 1, line 3');
  expect(joined.toCell({ start: 2, end: 19 })).toEqual({ cell: 0, start: 10, end: 27 });
  expect(joined.toProgram({ cell: 0, offset: 10 })).toBe(2);
  expect(joined.toProgram({ cell: 0, offset: 0 })).toBeUndefined();
  expect(joined.toCellEdits([{ start: 2, end: 3, text: 'x' }])).toBeUndefined();
});

describe('changes', () => {
  test('go into the strings, and nothing else of the file changes', () => {
    const file = notebookFile(['s = "a\\n"\nx = y', 'md:text', 'z = x']);
    const { program, toFileEdits } = readable(file);
    const start = program.text.indexOf('y');
    const [edit] = toFileEdits([{ start, end: start + 1, text: 'y*1000  # "k" \\' }]) ?? [];
    expect(edit && file.slice(0, edit.start) + edit.text + file.slice(edit.end)).toBe(file.replace('"x = y"', '"x = y*1000  # \\"k\\" \\\\"'));
  });

  test('a new line is a new member of the list', () => {
    const file = notebookFile(['a = 1\nb = 2']);
    const { toFileEdits } = readable(file);
    const [edit] = toFileEdits([{ start: 0, end: 0, text: 'import math\n\n' }]) ?? [];
    const after = edit ? file.slice(0, edit.start) + edit.text + file.slice(edit.end) : '';
    expect(after).toBe(notebookFile(['import math\n\na = 1\nb = 2']));
  });

  test('any change of a cell gives the file with that cell changed', () => {
    const text = fc.array(fc.constantFrom('a', 'é', '"', '\\', '\n', ' ', '\t', '🌊', ')'), { maxLength: 8 }).map((parts) => parts.join(''));
    fc.assert(fc.property(fc.array(text, { minLength: 1, maxLength: 3 }), text, fc.nat(), fc.nat(), fc.nat(), fc.boolean(), (texts, put, pick, one, other, list) => {
      const cells = texts.map((source) => ({ cell_type: 'code', source: list ? source.split(/(?<=\n)/) : source }));
      const metadata = { language_info: { name: 'julia' } };
      const file = JSON.stringify({ cells, metadata }, null, 1);
      const { program, toFileEdits } = readable(file);
      const cell = pick % texts.length;
      const whole = texts[cell] as string;
      const [start, end] = [one, other].map((each) => each % (whole.length + 1)).sort((a, b) => a - b) as [number, number];
      const base = program.toProgram({ cell, offset: 0 });
      if (base === undefined) return;
      const [edit] = toFileEdits([{ start: base + start, end: base + end, text: put }]) ?? [];
      if (!edit) throw new Error('refused');
      const after = JSON.parse(file.slice(0, edit.start) + edit.text + file.slice(edit.end)) as { cells: { source: string | string[] }[] };
      expect(after.cells.map(({ source }) => (typeof source === 'string' ? source : source.join('')))).toEqual(texts.map((each, at) => (at === cell ? whole.slice(0, start) + put + whole.slice(end) : each)));
    }));
  });

  test('letters beyond ASCII are escaped where the file does so', () => {
    const file = notebookFile(['d = 1  # °']).replace('°', '\\u00b0');
    const [edit] = readable(file).toFileEdits([{ start: 4, end: 5, text: 'µ' }]) ?? [];
    expect(edit?.text).toBe('\\u00b5');
  });

  test.each([
    ['over the end of a cell', 4, 9], ['between cells', 6, 6], ['in a command to the kernel', 20, 22],
  ])('are refused %s', (_what, start, end) => {
    const { program, toFileEdits } = readable(notebookFile(['a = 1', 'b = 2', '%matplotlib inline\nc = 3']));
    expect(program.text.length).toBeGreaterThan(end);
    expect(toFileEdits([{ start, end, text: 'x' }])).toBeUndefined();
  });
});
