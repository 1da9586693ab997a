/** What a program unit declares, as far as reading its statements asks for it. */

export class Scope {
  /** Names with dimensions or of characters: brackets behind them hold subscripts. */
  readonly arrays = new Set<string>();
  /** Every declared name. */
  readonly declared = new Set<string>();
  /** Names that an assignment, a read statement, a loop or a call may change. */
  readonly assigned = new Set<string>();
  readonly intents = new Map<string, 'in' | 'out' | 'inout'>();
  /** The types of names, where one is declared. */
  readonly types = new Map<string, string>();
  readonly optional = new Set<string>();
  /** Statement functions may stand here: no module brings in arrays. */
  usesModules = false;
  implicitNone = false;
  /** Of a procedure, where statement functions may stand and variables begin with a value. */
  isProcedure = false;
}
