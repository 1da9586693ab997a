/** Signature text in, claims out as lines. */
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import type { Signature, UnitClaim } from '../../server/src/program/signature.ts';
import { type LoadedSignatures, loadSignatures } from '../../server/src/signatures/load.ts';

export function load(text: string): LoadedSignatures {
  return loadSignatures([{ file: 'test.nomen', text }]);
}

const folder = join(import.meta.dirname, '../../server/src/signatures');

/** The shipped files of one host language. */
export function shippedFiles(host: string): readonly { readonly file: string; readonly text: string }[] {
  return readdirSync(join(folder, host)).filter((name) => name.endsWith('.nomen')).map((file) => ({ file, text: readFileSync(join(folder, host, file), 'utf8') }));
}

export const shippedHosts: readonly string[] = readdirSync(folder, { withFileTypes: true }).filter((each) => each.isDirectory()).map((each) => each.name);

/** `f(x [?a], y) [?a^2 m], any`. */
export function printed(signature: Signature): string {
  const params = signature.params.map((param) => `${param.name}${claimText(param.claim)}${param.rest ? ' ...' : ''}${param.optional ? ' =' : ''}`);
  return `${signature.name}(${params.join(', ')})${signature.results.map((claim) => claimText(claim) || ' []').join(',')}`;
}

export function claimText(claim: UnitClaim): string {
  switch (claim.kind) {
    case 'any':
      return '';
    case 'function':
      return ` (${claim.params.map((each) => claimText(each).trim() || 'any').join(', ')} ->${claim.results.map(claimText).join(',')})`;
    case 'unit': {
      const powers = claim.powers.map(({ variable, power }) => (power.isOne ? `?${variable}` : `?${variable}^${power}`));
      const unit = claim.unit.dimension.isOne && claim.unit.scale?.isOne && !claim.unit.rotation ? [] : [claim.unit.text];
      return ` [${[...(claim.difference ? ['difference'] : []), ...(claim.sum ? ['sum'] : []), ...powers, ...unit].join(' ') || '1'}]`;
    }
  }
}

/** `kind: the characters it is about`. */
export function problemsOf(text: string): readonly string[] {
  return load(text).problems.map(({ kind, span }) => `${kind}: ${text.slice(span.start, span.end)}`);
}
