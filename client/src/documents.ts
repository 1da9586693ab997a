/** The documents that the server is told of. */
/** As VS Code and the usual language extensions name them. */
export const languageIds: readonly string[] = [
  'python', 'nomenclature', 'matlab', 'octave', 'julia', 'javascript', 'javascriptreact', 'typescript', 'typescriptreact',
  'fortran', 'FortranFreeForm', 'fortran-modern', 'fortran_free-form', 'fortran_fixed-form',
];
/** Endings of scripts that an editor without an extension for their language takes for plain text, or for another language. */
const patterns = ['**/*.{f90,f95,f03,f08,f,for,ftn}', '**/*.m', '**/*.jl'];

/** Documents on disk, and those that were never saved. */
export const documents: readonly ({ readonly scheme: string; readonly language: string } | { readonly scheme: string; readonly pattern: string })[] = [
  ...['file', 'untitled'].flatMap((scheme) => languageIds.map((language) => ({ scheme, language }))),
  // Cells of notebooks that the server is sent.
  ...['python', 'julia', 'octave', 'matlab'].map((language) => ({ scheme: 'vscode-notebook-cell', language })),
  ...patterns.map((pattern) => ({ scheme: 'file', pattern })),
];
