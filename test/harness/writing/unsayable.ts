/** Thrown where a text uses what a language cannot say; the reason is counted. */
export class Unsayable extends Error {}

export function unsayable(reason: string): never {
  throw new Unsayable(reason);
}
