/** Silencing a finding, which needs a reason that only the author can give. */
import type { Detected } from '../../findings/collect.ts';
import { absolute } from '../../text/span.ts';
import type { Fix, Fixer } from '../fix.ts';
import type { Scene } from '../scene.ts';

export const allow: Fixer = { kind: 'allow', forFinding: allowances };

/** Stands where the reason goes; the author types over it. */
const reason = 'state the reason';

function allowances(detected: Detected, scene: Scene): readonly Fix[] {
  const { lines, style } = scene.inputs;
  const line = lines.lineAt(absolute(detected.place).start);
  const source = lines.lineText(line);
  const words = `${style.comment} termwise: allow ${detected.code} — ${reason}`;
  const bare = !scene.hasCommentOn(line) && lines.lineAt(absolute(detected.place).end) === line && !/\\\s*$/.test(source) && !scene.isInText(lines.lineEnd(line));
  if (bare) {
    const at = lines.lineStart(line) + source.trimEnd().length;
    return [allowance(detected, at, lines.lineEnd(line), `  ${words}`, '')];
  }
  if (scene.isInText(lines.lineStart(line)) || continues(lines.lineText(line - 1))) return [];
  const indent = /^\s*/.exec(source)?.[0] ?? '';
  return [allowance(detected, lines.lineStart(line), lines.lineStart(line), `${indent}${words}`, lineBreak(scene))];
}

function allowance(detected: Detected, start: number, end: number, text: string, tail: string): Fix {
  const at = start + text.length - reason.length;
  return {
    kind: 'allow', confidence: 'choice', edits: [{ start, end, text: text + tail }], says: { what: 'allow', code: detected.code, wide: false },
    cost: 9, fill: { start: at, end: at + reason.length }, unchecked: true,
  };
}

/** A backslash at the end of the line above joins it with this one: no comment can stand between. */
function continues(above: string): boolean {
  return /\\\s*$/.test(above);
}

function lineBreak(scene: Scene): string {
  return scene.text.includes('\r\n') ? '\r\n' : scene.text.includes('\n') || !scene.text.includes('\r') ? '\n' : '\r';
}
