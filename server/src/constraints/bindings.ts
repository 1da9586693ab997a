import type { Value } from './value.ts';

/**
 * The current versions of symbols, by path, in layers: a branch writes into a layer of its own over what was known before it,
 * so that entering one costs nothing and joining several looks at what they changed only.
 */
export class Bindings {
  private readonly own = new Map<string, Value>();
  private readonly gone = new Set<string>();
  private parted: boolean;

  constructor(private readonly outer?: Bindings) {
    this.parted = outer?.parted ?? false;
  }

  get(path: string): Value | undefined {
    return this.own.get(path) ?? (this.gone.has(path) ? undefined : this.outer?.get(path));
  }

  set(path: string, value: Value): void {
    this.own.set(path, value);
    this.parted ||= isPart(path);
  }

  /** Forgets a symbol's parts, `a.x` and `a["x"]` of `a`. */
  dropParts(path: string): void {
    if (!this.parted) return;
    for (const [key] of this.all()) {
      if (!key.startsWith(path) || !(key[path.length] === '.' || key[path.length] === '[')) continue;
      this.own.delete(key);
      this.gone.add(key);
    }
  }

  branch(): Bindings {
    return new Bindings(this);
  }

  /** The symbols that this layer changed. */
  changed(): Iterable<string> {
    return this.own.keys();
  }

  /** Every symbol with its version. */
  all(): ReadonlyMap<string, Value> {
    const found = new Map(this.outer?.all() ?? []);
    for (const path of this.gone) found.delete(path);
    for (const [path, value] of this.own) found.set(path, value);
    return found;
  }
}

function isPart(path: string): boolean {
  return path.includes('.') || path.includes('[');
}
