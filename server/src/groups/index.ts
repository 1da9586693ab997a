/** Dimensionless groups of a relation between quantities: see ../../../DEVELOPERS.md for where each part lives. */
export { repeatingSets } from './bases.ts';
export { definitions, equation, expression, groupExpression, hostSyntax, type Definition, type HostSyntax } from './express.ts';
export { baseName, relationDocument, unmatchedText, type GroupsDocument, type RelationDocument } from './json.ts';
export { compositeText, groupNames, recognitionText } from './names.ts';
export { numberFamilies } from './numbers/index.ts';
export { recogniseProduct } from './product.ts';
export { latexEquation, latexProduct, latexReport, markdownReport } from './report.ts';
export { solveGroups } from './solve.ts';
export { systemOf, type KnownSymbol, type System } from './system.ts';
export type * from './types.ts';
