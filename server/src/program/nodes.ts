/**
 * The common program form: what every front end lowers its language to and everything after reads.
 * Offsets are relative to the chunk's anchor. The form keeps what dimensions depend on and drops the rest; what a front end
 * cannot express becomes `opaque`, which is unknown to every later stage.
 */
import type { Rational } from '../quantities/rational.ts';
import type { Anchor, Span } from '../text/span.ts';

export type Expr =
  | NumberExpr | TextExpr | TruthExpr | NothingExpr | NameExpr | MemberExpr | IndexExpr | CallExpr | UnaryExpr | BinaryExpr
  | CompareExpr | LogicExpr | ChooseExpr | SequenceExpr | RecordExpr | LambdaExpr | ComprehensionExpr | SliceExpr | BindExpr | OpaqueExpr;

/** A literal. `value` is exact; undefined for what is not a finite real (complex literals). */
export interface NumberExpr extends Span { readonly kind: 'number'; readonly value: Rational | undefined; readonly text: string }
export interface TextExpr extends Span { readonly kind: 'text'; readonly value: string }
export interface TruthExpr extends Span { readonly kind: 'truth'; readonly value: boolean }
/** None, null, nothing. */
export interface NothingExpr extends Span { readonly kind: 'nothing' }
export interface NameExpr extends Span { readonly kind: 'name'; readonly name: string }
export interface MemberExpr extends Span { readonly kind: 'member'; readonly object: Expr; readonly name: string; readonly nameSpan: Span }
/** `a[i]`, `d["key"]`; one key per axis. A constant key is a `text` expression. */
export interface IndexExpr extends Span { readonly kind: 'index'; readonly object: Expr; readonly keys: readonly Expr[] }
/**
 * `results`: how many results the caller takes, in languages where a function gives as many as are asked for and `f(x)` may be an element too;
 * undefined: the value as it is.
 */
export interface CallExpr extends Span {
  readonly kind: 'call'; readonly callee: Expr; readonly args: readonly Argument[]; readonly results?: number;
  /** A variable among the arguments may come back with a new value: Fortran's `call`. */
  readonly byReference?: true;
}
/** `spread`: `*args`, `**kwargs`, `...rest`: what it fills is unknown. */
export interface Argument extends Span { readonly name?: string; readonly value: Expr; readonly spread?: boolean }
export interface UnaryExpr extends Span { readonly kind: 'unary'; readonly op: '-' | '+' | 'not' | 'transpose' | 'bits'; readonly operand: Expr }
/** `*` covers element-wise and scalar products, `@` matrix products, `//` floor division, `bits` shifts and bitwise operators. */
export interface BinaryExpr extends Span {
  readonly kind: 'binary'; readonly op: '+' | '-' | '*' | '/' | '//' | '%' | '**' | '@' | '\\' | 'bits';
  readonly opSpan: Span; readonly left: Expr; readonly right: Expr;
}
/** `a < b <= c`: n operands and n-1 operators. */
export interface CompareExpr extends Span { readonly kind: 'compare'; readonly operands: readonly Expr[]; readonly ops: readonly CompareOp[] }
export type CompareOp = '<' | '<=' | '>' | '>=' | '==' | '!=' | 'in' | 'not in' | 'is' | 'is not';
export interface LogicExpr extends Span { readonly kind: 'logic'; readonly op: 'and' | 'or'; readonly operands: readonly Expr[] }
export interface ChooseExpr extends Span { readonly kind: 'choose'; readonly condition: Expr; readonly then: Expr; readonly otherwise: Expr }
/** `tuple` positions carry units of their own; `list` and `set` members are alike; `matrix` is rows of entries. */
export interface SequenceExpr extends Span { readonly kind: 'sequence'; readonly form: 'tuple' | 'list' | 'set' | 'matrix'; readonly items: readonly Expr[]; readonly comments?: readonly (Comment | undefined)[] }
/** Entries with constant keys carry units of their own; the others are only walked. */
export interface RecordExpr extends Span { readonly kind: 'record'; readonly entries: readonly RecordEntry[]; readonly others: readonly Expr[] }
export interface RecordEntry extends Span { readonly key: string; readonly keySpan: Span; readonly value: Expr; readonly comment?: Comment }
export interface LambdaExpr extends Span { readonly kind: 'lambda'; readonly params: readonly Param[]; readonly body: Expr }
export interface ComprehensionExpr extends Span { readonly kind: 'comprehension'; readonly element: Expr; readonly key?: Expr; readonly clauses: readonly { readonly target: Expr; readonly iterable: Expr }[]; readonly conditions: readonly Expr[] }
/** Start, end and step by position; what is left out is nothing, without extent. */
export interface SliceExpr extends Span { readonly kind: 'slice'; readonly parts: readonly Expr[] }
/** An assignment inside an expression (`:=`). */
export interface BindExpr extends Span { readonly kind: 'bind'; readonly target: Expr; readonly value: Expr }
/** Unknown, but its parts are walked. */
export interface OpaqueExpr extends Span { readonly kind: 'opaque'; readonly parts: readonly Expr[] }

export type Stmt =
  | AssignStmt | DeclareStmt | EvaluateStmt | IfStmt | LoopStmt | ReturnStmt | AttemptStmt | ScopeStmt | MatchStmt
  | FunctionStmt | ClassStmt | ImportStmt | LeaveStmt | OuterStmt;

interface StmtBase extends Span {
  /** The comment behind the statement, on its last or first line. */
  readonly trailing?: Comment;
  /** Comment lines directly above, top to bottom, no blank line between. */
  readonly above?: readonly Comment[];
}
/** `a = b = value` has two targets; `a, b = value` has one tuple target. `op` set for augmented assignment. */
export interface AssignStmt extends StmtBase { readonly kind: 'assign'; readonly targets: readonly Expr[]; readonly value: Expr; readonly op?: BinaryExpr['op']; readonly annotation?: string }
/** A name without a value: dataclass fields, Fortran and C declarations. */
export interface DeclareStmt extends StmtBase { readonly kind: 'declare'; readonly target: Expr; readonly annotation?: string }
export interface EvaluateStmt extends StmtBase { readonly kind: 'evaluate'; readonly value: Expr }
export interface IfStmt extends StmtBase { readonly kind: 'if'; readonly arms: readonly { readonly condition: Expr; readonly body: readonly Stmt[] }[]; readonly otherwise: readonly Stmt[] }
/** With `target`: for each of the iterable; without: while the condition holds. */
export interface LoopStmt extends StmtBase { readonly kind: 'loop'; readonly target?: Expr; readonly iterable?: Expr; readonly condition?: Expr; readonly body: readonly Stmt[]; readonly otherwise: readonly Stmt[] }
export interface ReturnStmt extends StmtBase { readonly kind: 'return'; readonly value?: Expr; readonly yields?: boolean }
export interface AttemptStmt extends StmtBase { readonly kind: 'attempt'; readonly body: readonly Stmt[]; readonly handlers: readonly (readonly Stmt[])[]; readonly otherwise: readonly Stmt[]; readonly finally: readonly Stmt[] }
/** `with`: the bindings hold unknown values. */
export interface ScopeStmt extends StmtBase { readonly kind: 'scope'; readonly items: readonly { readonly value: Expr; readonly target?: Expr }[]; readonly body: readonly Stmt[] }
export interface MatchStmt extends StmtBase { readonly kind: 'match'; readonly subject: Expr; readonly cases: readonly { readonly bindings: readonly NameExpr[]; readonly guard?: Expr; readonly body: readonly Stmt[] }[] }
export interface FunctionStmt extends StmtBase {
  readonly kind: 'function'; readonly name: string; readonly nameSpan: Span; readonly params: readonly Param[]; readonly body: readonly Stmt[];
  readonly doc?: DocText; readonly decorators: readonly Expr[]; readonly annotation?: string;
  /** Comments inside the body that stand above no statement (at the end of a block). */
  readonly loose?: readonly Comment[];
  /** The variables that hold the results when the body ends, in languages that name them in the head. */
  readonly outputs?: readonly OutputName[];
  /** A function of a class that takes no object: a static one, or a constructor that makes it. */
  readonly unbound?: true;
}
export interface OutputName { readonly name: string; readonly nameSpan: Span }
export interface ClassStmt extends StmtBase {
  readonly kind: 'class'; readonly name: string; readonly nameSpan: Span; readonly bases: readonly Expr[]; readonly body: readonly Stmt[];
  readonly doc?: DocText; readonly decorators: readonly Expr[];
}
/** `from ..a import b as c`: module `a`, level 2, names [{b, c}]. `import a.b as c`: no names, alias c. `from a import *`: names ['*']. */
export interface ImportStmt extends StmtBase { readonly kind: 'import'; readonly module: string; readonly level: number; readonly names?: readonly { readonly name: string; readonly alias: string }[]; readonly alias?: string }
/** break, continue, raise, assert, del: `flow` says whether what follows in the block is reached. */
export interface LeaveStmt extends StmtBase { readonly kind: 'leave'; readonly flow: 'break' | 'continue' | 'raise' | 'none'; readonly values: readonly Expr[] }
/** global, nonlocal: assignments to these names reach outside the function. */
export interface OuterStmt extends StmtBase { readonly kind: 'outer'; readonly names: readonly string[] }

export interface Param extends Span {
  readonly name: string; readonly nameSpan: Span; readonly default?: Expr; readonly annotation?: string;
  readonly mode: 'plain' | 'keyword' | 'rest' | 'rest-named';
  readonly comment?: Comment;
  /** A parameter that the function gives back: only that, or after taking it; undefined: it is only taken. */
  readonly intent?: 'out' | 'inout';
}

/** A comment without its marker: `text` is the source between start and end, marker and outer blanks removed. */
export interface Comment extends Span { readonly text: string }

/** Documentation of a function, class or module: the raw text between the quotes or after the markers; offsets map one to one. */
export interface DocText extends Span { readonly text: string }

/** Where the syntax could not be parsed. */
export interface SyntaxProblem extends Span { readonly message: string }

/** One top-level statement of a file with the comments directly above it: the unit of reuse between versions of a text. */
export interface Chunk {
  readonly anchor: Anchor;
  readonly text: string;
  readonly statements: readonly Stmt[];
  readonly problems: readonly SyntaxProblem[];
  /** Every comment of the chunk, in order: for directives that no statement owns. */
  readonly comments: readonly Comment[];
  /** The module's documentation, on the first chunk with a statement only. */
  readonly doc?: DocText;
}

export interface Program {
  readonly language: LanguageId;
  readonly file: string;
  readonly chunks: readonly Chunk[];
}

export type LanguageId = 'python' | 'nomenclature' | 'matlab' | 'fortran' | 'julia' | 'c' | 'cpp' | 'javascript' | 'typescript';
