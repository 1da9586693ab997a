/** What the writer has to know of a language to write a calculation in it: one descriptor per language, beside this file. */
import type { Expr, LanguageId } from '../../../server/src/program/nodes.ts';

/** A parameter or a result in words: the unit as its author wrote it, and what stood beside it. */
export interface NotedName {
  readonly name: string;
  readonly unit: string | undefined;
  readonly words: string;
  /** It is indexed or walked through in the body. */
  readonly isArray: boolean;
  readonly default?: string | undefined;
}

/** A variable of a function or of the script. */
export interface Local {
  readonly name: string;
  /** The comment of its only assignment. */
  readonly note: string | undefined;
  /** The original line of that comment. */
  readonly noteLine: number;
  /** Members of the list that it is first given; undefined for a number. */
  readonly size: number | undefined;
  /** Of what it is given first. */
  readonly type: 'number' | 'truth' | 'text';
  /** Assigned once, in the outermost block. */
  readonly isConstant: boolean;
  /** The first assignment stands in the outermost block, so that it can be its declaration. */
  readonly declaredByAssignment: boolean;
  /** Counts the rounds of a loop. */
  readonly isCounter: boolean;
}

export interface FunctionWords {
  readonly name: string;
  /** It calls itself. */
  readonly isRecursive: boolean;
  readonly params: readonly NotedName[];
  /** What is returned: none, one, or several; the names are those of variables that languages which return by name give. */
  readonly results: readonly NotedName[];
  readonly summary: string;
  /** Directives in the documentation. */
  readonly remarks: readonly string[];
  readonly locals: readonly Local[];
}

/** A line of the written text. */
export interface Line {
  readonly text: string;
  /** The lines of the original that it stands for. */
  readonly covers?: readonly number[];
  /** The line of the original whose comment has come here, where its statement has not. */
  readonly noteOf?: number;
}

/** A function around its body. `noted` is asked for the original line of each parameter's note, by its name; that of the result under ''. */
export interface FunctionFrame {
  readonly before: readonly Line[];
  readonly open: string;
  readonly after: readonly Line[];
  readonly close: string;
}

export type Feature = 'choose' | 'lambda' | 'comprehension' | 'tuple' | 'nothing' | 'list' | 'matrix' | 'defaults' | 'named arguments' | 'chained targets' | 'letters beyond ASCII' | 'globals' | 'updates' | 'fields' | 'several results' | 'array arithmetic';

/** A library function or constant in the host: its name, or how a call of it is said otherwise; the name '' leaves the single argument alone. */
export type Said = string | ((args: readonly Expr[]) => Expr | undefined);

export interface Host {
  /** Notes that its reader leaves alone on purpose: `[in]` is a direction where Doxygen is at home, a comment behind the brace of a loop stands in its body. */
  readonly leavesAlone?: ReadonlySet<'[in]' | 'loop heads'>;
  readonly language: LanguageId;
  readonly fileName: string;
  readonly says: ReadonlySet<Feature>;
  readonly firstIndex: 0 | 1;
  /** `a[-1]`; undefined where it cannot be said. */
  readonly last?: (array: Expr) => Expr;
  readonly ignoresCase?: boolean;
  /** The comment of a variable that is assigned once stands on its declaration. */
  readonly declaresNotes?: boolean;
  /** Variables have types: `1/3` is 0, and a variable is not a number first and then a text. */
  readonly isTyped?: boolean;
  /** Order of the file: as written, scripts before functions, functions before scripts. */
  readonly order: 'as written' | 'script first' | 'functions first';
  readonly keywords: ReadonlySet<string>;
  /** By the function's own name, whichever of math, cmath, numpy or the built-ins it comes from. */
  readonly library: Readonly<Record<string, Said>>;
  comment(text: string): string;
  assign(target: string, value: string, local: Local | undefined): string;
  /** A variable that no assignment declares. */
  declare?(local: Local): string;
  evaluate(value: string): string;
  show(values: readonly string[]): string;
  append?(list: string, value: string): string;
  /** Several targets of a call that gives several results, where a tuple cannot say it. */
  targets?(names: readonly string[]): string;
  /** A record under constant keys, an entry a line so that each can have its comment. */
  record?(target: string, local: Local | undefined): { readonly open?: string; readonly entry: (key: string, value: string) => string; readonly close?: string };
  /** How its entries are read: `r.key` or `r["key"]`. */
  readonly keyed?: 'member' | 'key';
  /** A list as the first value of a variable, where expressions have none. */
  initial?(items: readonly string[]): string;
  if(condition: string): string;
  elseIf(condition: string): string;
  readonly else: string;
  while(condition: string): string;
  /** `end` is excluded, `last` included. */
  count(name: string, first: string, end: string, last: string): string;
  each?(name: string, list: string, size: number | undefined): readonly string[];
  readonly end: (block: 'if' | 'loop') => string;
  readonly leave: Readonly<Record<'break' | 'continue' | 'raise', string>>;
  /** As many values as results. */
  give(values: readonly string[], results: readonly string[], isLast: boolean): readonly string[];
  readonly giveNothing: string;
  frame(words: FunctionWords, noted: (name: string) => readonly number[]): FunctionFrame;
  /** The file around its parts. */
  whole?(parts: { readonly head: readonly Line[]; readonly globals: readonly Line[]; readonly functions: readonly Line[]; readonly script: readonly Line[]; readonly locals: readonly Local[] }): readonly Line[];
  /** Lines that a file needs before all others. */
  readonly opening?: readonly string[];
}

/** `[kg/s] mass flow`, the words first where `unitLast`. */
export function noteText({ unit, words }: NotedName, unitLast = false): string {
  const bracket = unit === undefined ? '' : `[${unit}]`;
  return (unitLast ? [words, bracket] : [bracket, words]).filter((each) => each !== '').join(' ');
}

export function features(...list: readonly Feature[]): ReadonlySet<Feature> {
  return new Set(list);
}

export function words(list: string): ReadonlySet<string> {
  return new Set(list.split(' '));
}
