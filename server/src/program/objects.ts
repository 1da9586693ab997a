/** How the languages write a class's constructor and the object that a method is called on. */
import type { ClassStmt, FunctionStmt } from './nodes.ts';

/** Python's `__init__`; JavaScript's and TypeScript's `constructor`. */
export const constructorNames: readonly string[] = ['__init__', 'constructor'];

/** The function that fills a new object of a class. */
export function constructorOf(statement: ClassStmt): FunctionStmt | undefined {
  return statement.body.find((each): each is FunctionStmt => each.kind === 'function' && constructorNames.includes(each.name));
}

/** `x` of `self.x` and `this.x`; undefined for every other path. */
export function ownField(path: string): string | undefined {
  return path.startsWith('self.') || path.startsWith('this.') ? path.slice(5) : undefined;
}
