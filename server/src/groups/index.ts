/**
 * Dimensionless groups of a relation between quantities. `solveGroups` is the whole way: system.ts sorts the symbols, instances.ts,
 * candidates.ts and circuits.ts propose groups, choose.ts picks them, recognise.ts names them; express.ts, report.ts and json.ts write them.
 */
export { repeatingSets } from './bases.ts';
export { definitions, equation, expression, groupExpression, hostSyntax, type Definition, type HostSyntax } from './express.ts';
export { baseName, relationDocument, unmatchedText, type GroupsDocument, type RelationDocument } from './json.ts';
export { compositeText, groupNames, recognitionText } from './names.ts';
export { numberFamilies } from './numbers/index.ts';
export { type ProductName, recogniseProduct } from './product.ts';
export { latexEquation, latexProduct, latexReport, markdownReport } from './report.ts';
export { solveGroups } from './solve.ts';
export { systemOf, type KnownSymbol, type System } from './system.ts';
export type * from './types.ts';
export { groupValue, type GroupValue } from './value.ts';
