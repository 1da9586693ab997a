/** Kernels of notebooks and the languages they run. Names as the kernels give them: ipykernel, IJulia, octave_kernel, jupyter-matlab-proxy. */
import type { LanguageId } from '../../program/nodes.ts';

const languages = new Map<string, LanguageId>([['python', 'python'], ['ipython', 'python'], ['julia', 'julia'], ['octave', 'matlab'], ['matlab', 'matlab']]);

/** The language that a kernel, a cell or an editor names, in any case and with a version behind it (`julia-1.10`); undefined for any other. */
export function notebookLanguage(name: string): LanguageId | undefined {
  const lower = name.toLowerCase().trim();
  return languages.get(lower) ?? languages.get(lower.replace(/[-\s]*[\d.]+$/, ''));
}
