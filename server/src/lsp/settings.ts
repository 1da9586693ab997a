/** Settings as an editor sends them; what is not understood is left at its default. */
import { findingCodes, levels } from '../findings/finding.ts';
import { checks } from '../findings/registry.ts';
import { defaultNoteSettings } from '../notes/types.ts';
import type { Configuration } from '../service/configuration.ts';
import { defaultHints, type HintSettings, type Settings } from '../service/contract.ts';

/** The name of the section that holds all settings. */
export const section = 'termwise';

/** What the editor's user has set. */
export interface SessionSettings extends Settings {
  /** Whether the scripts of the workspace that are not open are checked and listed too. */
  readonly wholeWorkspace: boolean;
  readonly hints: HintSettings;
  /** Whether counts stand above functions and relations. */
  readonly lenses: boolean;
}

export const defaultSettings: SessionSettings = { severities: {}, notes: defaultNoteSettings, wholeWorkspace: false, hints: defaultHints, lenses: true };

/** Reads `{ severities: { … }, notes: { … }, wholeWorkspace }`. */
export function readSettings(sent: unknown): SessionSettings {
  const severities = objectIn(sent, 'severities');
  const notes = objectIn(sent, 'notes');
  const flag = (name: keyof typeof defaultNoteSettings): boolean => (typeof notes[name] === 'boolean' ? notes[name] : defaultNoteSettings[name]);
  const chosen = findingCodes.flatMap((code) => {
    const level = levels.find((each) => each === severities[code]);
    // Editors send defaults as if they were chosen; what is a default in one language may be another in the next.
    return level && level !== defaultSeverity(code) ? [[code, level] as const] : [];
  });
  const wholeWorkspace = isObject(sent) && sent.wholeWorkspace === true;
  const hints = objectIn(sent, 'hints');
  const chosenArguments = (['numbers', 'all', 'off'] as const).find((each) => each === hints.arguments) ?? defaultHints.arguments;
  const lenses = !isObject(sent) || sent.lenses !== false;
  return {
    severities: Object.fromEntries(chosen), notes: { parentheses: flag('parentheses'), bare: flag('bare') }, wholeWorkspace, lenses,
    hints: { inferred: hints.inferred !== false, arguments: chosenArguments, values: hints.values !== false },
  };
}

/** A project's own file goes before the editor's settings: it says what the team agreed on. */
export function settingsWith({ severities, notes }: Settings, configuration: Configuration): Settings {
  return { severities: { ...severities, ...configuration.severities }, notes: { ...notes, ...configuration.notes } };
}

function defaultSeverity(code: (typeof findingCodes)[number]): string | undefined {
  return checks.find((check) => check.code === code)?.severity;
}

function objectIn(sent: unknown, name: string): Readonly<Record<string, unknown>> {
  const found = isObject(sent) ? sent[name] : undefined;
  return isObject(found) ? found : {};
}

function isObject(value: unknown): value is Readonly<Record<string, unknown>> {
  return typeof value === 'object' && value !== null;
}
