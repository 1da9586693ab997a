/** The colours of unit notes, by the pattern of the injected grammar, and what the manifest promises of its files. */
import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';

const root = join(import.meta.dirname, '../..');
const read = (file: string) => JSON.parse(readFileSync(join(root, file), 'utf8'));
const manifest = read('package.json');

// The pattern is kept to what Oniguruma (TextMate) and JavaScript read alike.
const [note] = read('syntaxes/unit-notes.tmLanguage.json').patterns;
const pattern = new RegExp(note.match, 'u');
const coloured = (comment: string): string | undefined => pattern.exec(comment)?.[2];

describe('unit notes that are coloured', () => {
  test.each([
    '[m]', '[kg/m^3]', '[kg/m**3]', '[W/(m K)]', '[J kg-1 K-1]', '[kg·m⁻³]', '[W m-2]', '[m^0.5]', '[m^(1/3)]', '[deg C]', '[°C]', '[%]', '[-]', '[1/s]', '[1/m]', '[10^3 kg/m^3]', '[µm]', '[Ω]', '[kPa(g)]', '[ft-lbf]',
  ])('# %s depth', (text) => {
    expect(coloured(`# ${text} depth`)).toBe(text.slice(1, -1));
  });
});

describe('brackets that are left alone', () => {
  test.each(['[12]', '[in]', '[out]', '[in, out]', '[optional]', '[u, v, w]', '[0, 1]', '[-90 .. 90]', 'a[k]', 'f(x)[m]', '[text](link)', '[]', "['m']", '[see Table 3: values]'])('# %s', (text) => {
    expect(coloured(`# ${text}`)).toBeUndefined();
  });
});

describe('the manifest', () => {
  test('names files that are there', () => {
    const { languages, grammars, jsonValidation } = manifest.contributes;
    const files = [manifest.icon, ...languages.flatMap((each: { configuration: string; icon: Record<string, string> }) => [each.configuration, ...Object.values(each.icon)]), ...grammars.map((each: { path: string }) => each.path), ...jsonValidation.map((each: { url: string }) => each.url)];
    expect(files.length).toBeGreaterThan(5);
    expect(files.filter((file) => !existsSync(join(root, file)))).toEqual([]);
  });

  test('declares the commands that the extension registers', () => {
    const source = readdirSync(join(root, 'client/src')).map((name) => readFileSync(join(root, 'client/src', name), 'utf8')).join('\n');
    const registered = [...source.matchAll(/registerCommand\('([^']+)'|\bregister\('(\w+)'/g)].map(([, whole, short]) => whole ?? `termwise.${short}`);
    const declared: readonly string[] = manifest.contributes.commands.map(({ command }: { command: string }) => command);
    expect(declared.filter((command) => !registered.includes(command))).toEqual([]);
    // The others are what the server's answers and the view refer to.
    expect(registered.filter((command) => !declared.includes(command)).sort()).toEqual(['termwise.reveal', 'termwise.select', 'termwise.showActions']);
  });

  test('holds for an untrusted workspace', () => {
    expect(manifest.capabilities.untrustedWorkspaces.supported).toBe(true);
  });

  test('gives the scopes of the grammars that it names', () => {
    for (const { path, scopeName } of manifest.contributes.grammars) expect(read(path).scopeName).toBe(scopeName);
  });
});

describe('the grammar of the nomenclature language', () => {
  const rules = read('syntaxes/nomenclature.tmLanguage.json').patterns as readonly { match?: string; begin?: string; name?: string }[];
  const first = (line: string): number => rules.findIndex((rule) => new RegExp(rule.match ?? rule.begin ?? '', 'u').test(line));
  test.each([
    ['# shared symbols', 0], ['unit tin = 12.5 kg', 1], ['P depends on N, D', 2], ['read_level(channel [-]) [mm]', 3], ['rho  [kg/m^3]  = 1240  density', 4], ['Re [-] = rho*N*D^2/mu', 4], ['plain words', -1],
  ])('%s', (line, rule) => {
    expect(first(line)).toBe(rule);
  });
});
