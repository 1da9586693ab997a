/** The front ends for tests, as the engine loads them. */
import type { FrontEnd } from '../../server/src/frontends/frontend.ts';
import { frontEndEntries } from '../../server/src/frontends/registry.ts';
import { nodeAssets } from '../../server/src/platform/node-assets.ts';
import type { LanguageId } from '../../server/src/program/nodes.ts';

const assets = nodeAssets();

/** Loads a front end. Rejects for a language that is not served. */
export async function loadFrontEnd(language: LanguageId): Promise<FrontEnd> {
  const entry = frontEndEntries.find((each) => each.language === language);
  if (!entry) throw new Error(`${language} is not served`);
  return await entry.create({ runtime: assets.runtime(), grammar: assets.grammar(language) ?? new Uint8Array() });
}
