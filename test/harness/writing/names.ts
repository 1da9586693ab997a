/** Names of a script in another language, and what its library names stand for. */
import type { Expr, FunctionStmt, ImportStmt, Stmt } from '../../../server/src/program/nodes.ts';
import type { Host } from '../hosts/host.ts';
import { unsayable } from './unsayable.ts';
import { expressionsOf, namesIn, nestedIn } from './visit.ts';

/** Modules whose functions are known by their own names. */
const modules = new Set(['math', 'cmath', 'numpy']);
/** One function, several names. */
const sameAs: Readonly<Record<string, string>> = { arcsin: 'asin', arccos: 'acos', arctan: 'atan', arctan2: 'atan2', absolute: 'abs', fabs: 'abs', trapz: 'trapezoid', asarray: 'array', fmax: 'maximum', fmin: 'minimum' };
const builtIns = new Set(['abs', 'min', 'max', 'sum', 'len', 'float', 'round', 'range', 'zip', 'enumerate']);

export class Names {
  readonly functions = new Map<string, FunctionStmt>();
  private readonly imported = new Map<string, string>();
  private readonly renamed = new Map<string, string>();

  constructor(statements: readonly Stmt[], private readonly host: Host) {
    for (const each of statements) {
      if (each.kind === 'function') this.functions.set(each.name, each);
      if (each.kind === 'import') this.import(each);
    }
    this.rename(statements);
  }

  /** A name of the script as the host can have it. */
  of(name: string): string {
    return this.renamed.get(name) ?? name;
  }

  /** The library function or constant that an expression names, by its own name; undefined for what the script itself defines. */
  library(expr: Expr): string | undefined {
    const path = this.path(expr);
    if (path === undefined) return undefined;
    const at = path.lastIndexOf('.');
    const own = path.slice(at + 1);
    if (at >= 0 && !modules.has(path.slice(0, at))) return unsayable(`library ${path}`);
    return sameAs[own] ?? own;
  }

  private path(expr: Expr): string | undefined {
    if (expr.kind === 'member') {
      const object = expr.object.kind === 'name' ? this.imported.get(expr.object.name) : expr.object.kind === 'member' ? this.path(expr.object) : undefined;
      return object === undefined ? undefined : `${object}.${expr.name}`;
    }
    if (expr.kind !== 'name') return undefined;
    return this.imported.get(expr.name) ?? (builtIns.has(expr.name) && !this.functions.has(expr.name) ? expr.name : undefined);
  }

  private import(statement: ImportStmt): void {
    if (!statement.names) this.imported.set(statement.alias ?? statement.module, statement.module);
    for (const { name, alias } of statement.names ?? []) this.imported.set(alias, `${statement.module}.${name}`);
  }

  /** Keywords, letters the host does not have, and names that only differ by case give way. */
  private rename(statements: readonly Stmt[]): void {
    const taken = new Map<string, string>();
    const all = new Set(statements.flatMap((each) => [...nestedIn(each)].flatMap((stmt) => [...ownNames(stmt)])));
    for (const name of [...all].sort()) {
      if (this.imported.has(name)) continue;
      let now = name.replace(/^_+/, (marks) => (this.host.says.has('letters beyond ASCII') ? marks : `k${marks}`));
      if (!this.host.says.has('letters beyond ASCII') && /[^\u0000-\u007F]/.test(now)) unsayable('names beyond ASCII');
      if (this.host.keywords.has(this.host.ignoresCase ? now.toLowerCase() : now)) now = `${now}_`;
      if (this.host.ignoresCase) {
        while (taken.has(now.toLowerCase())) now = `small_${now}`;
        taken.set(now.toLowerCase(), name);
      }
      if (now !== name) this.renamed.set(name, now);
    }
  }
}

function* ownNames(stmt: Stmt): Generator<string> {
  if (stmt.kind === 'function') {
    yield stmt.name;
    for (const param of stmt.params) yield param.name;
  }
  for (const expr of expressionsOf(stmt)) yield* namesIn(expr);
}
