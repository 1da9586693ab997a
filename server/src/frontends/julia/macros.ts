/** What is known of macros by name. Sources: Julia manual (Base, Base.Threads), and the documentation of the packages that define the others. */

/** Macros whose value, or statement, is that of their last argument. */
const passed = new Set([
  'inbounds', 'view', 'views', 'fastmath', 'simd', '.', '__dot__', 'inline', 'noinline', 'show', 'time', 'turbo', 'tturbo', 'threads', 'spawn', 'async', 'sync', 'propagate_inbounds', 'constprop', 'pure',
  'static', 'muladd', 'avx', 'kwdef', 'with_kw', 'with_kw_noshow', 'batch', 'allowscalar', 'nospecialize', 'assume_effects', 'everywhere', 'distributed', 'SVector', 'MVector', 'SMatrix', 'MMatrix', 'SArray', 'MArray',
  'memoize', 'testset', 'polly', 'floop',
]);

/** Whether a macro hands on what stands in it. */
export function passesValue(name: string): boolean {
  return passed.has(name);
}
