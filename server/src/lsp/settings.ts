/** Settings as an editor sends them; what is not understood is left at its default. */
import { findingCodes, levels } from '../findings/finding.ts';
import { defaultNoteSettings } from '../notes/types.ts';
import type { Settings } from '../service/contract.ts';

/** The name of the section that holds all settings. */
export const section = 'termwise';

export const defaultSettings: Settings = { severities: {}, notes: defaultNoteSettings };

/** Reads `{ severities: { … }, notes: { … } }`. */
export function readSettings(sent: unknown): Settings {
  const severities = objectIn(sent, 'severities');
  const notes = objectIn(sent, 'notes');
  const flag = (name: keyof typeof defaultNoteSettings): boolean => (typeof notes[name] === 'boolean' ? notes[name] : defaultNoteSettings[name]);
  const chosen = findingCodes.flatMap((code) => {
    const level = levels.find((each) => each === severities[code]);
    return level ? [[code, level] as const] : [];
  });
  return { severities: Object.fromEntries(chosen), notes: { parentheses: flag('parentheses'), bare: flag('bare') } };
}

function objectIn(sent: unknown, name: string): Readonly<Record<string, unknown>> {
  const found = typeof sent === 'object' && sent !== null ? (sent as Record<string, unknown>)[name] : undefined;
  return typeof found === 'object' && found !== null ? (found as Record<string, unknown>) : {};
}
