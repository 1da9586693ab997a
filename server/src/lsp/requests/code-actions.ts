/** What can be done at a place: fixes of findings, notes, and what concerns dimensionless groups. */
import { type CancellationToken, type CodeAction, CodeActionKind, type CodeActionParams, CodeActionTriggerKind, type Command, type Diagnostic } from 'vscode-languageserver/node.js';
import type { TextEdit } from '../../frontends/frontend.ts';
import { applyProven } from '../../service/fix-all.ts';
import type { OfferedFix, Workspace } from '../../service/contract.ts';
import { differenceOf } from '../../frontends/edits.ts';
import { LineIndex } from '../../text/line-index.ts';
import type { OpenDocument } from '../documents.ts';
import { offsetOf, rangeOf } from '../positions.ts';
import type { Session } from '../session.ts';

/** Every fix that a finding proves, at once. */
export const fixAllKind = `${CodeActionKind.SourceFixAll}.termwise`;
/** Changes that concern groups and notes rather than a finding. */
const rewriteKind = `${CodeActionKind.RefactorRewrite}.termwise`;

export const codeActionKinds: readonly string[] = [CodeActionKind.QuickFix, rewriteKind, fixAllKind];

export async function codeActions(session: Session, { textDocument, range, context }: CodeActionParams, token: CancellationToken): Promise<CodeAction[]> {
  const wanted = (kind: string): boolean => context.only === undefined || context.only.some((only) => kind === only || kind.startsWith(`${only}.`));
  const found = await session.ask(textDocument.uri, token, (document, workspace) => {
    const lines = LineIndex.of(document.text);
    const span = { start: offsetOf(lines, range.start, session.target.encoding), end: offsetOf(lines, range.end, session.target.encoding) };
    // An equation has groups to offer at every line: they are for those who ask, and not for every light bulb.
    const wantsSelection = span.end > span.start || context.triggerKind === CodeActionTriggerKind.Invoked;
    const writer = new Writer(session, document);
    const actions: CodeAction[] = [];
    if (wanted(CodeActionKind.QuickFix) || wanted(rewriteKind)) {
      for (const fix of workspace.fixes(document.file, span)) actions.push(writer.fix(fix, context.diagnostics));
    }
    if (wanted(rewriteKind)) for (const action of workspace.groups.actions(document.file, span.start, wantsSelection ? span : undefined)) actions.push(writer.action(action.title, rewriteKind, action.edits));
    // Asked for by name only: it checks the file several times, which a light bulb should not wait for.
    if (context.only?.some((only) => fixAllKind === only || fixAllKind.startsWith(`${only}.`))) actions.push(...fixAll(session, document, workspace, writer));
    return actions.filter(({ kind }) => kind === undefined || wanted(kind));
  });
  return found ?? [];
}

function fixAll(session: Session, document: OpenDocument, workspace: Workspace, writer: Writer): readonly CodeAction[] {
  const { text, fixed } = applyProven(workspace, document.file, document.text, document.language);
  session.void(document);
  const count = Object.values(fixed).reduce((sum, each) => sum + each, 0);
  return count === 0 ? [] : [writer.action(`Apply ${count === 1 ? 'the proven fix' : `all ${count} proven fixes`}`, fixAllKind, differenceOf(document.text, text))];
}

class Writer {
  private readonly lines: LineIndex;

  constructor(private readonly session: Session, private readonly document: OpenDocument) {
    this.lines = LineIndex.of(document.text);
  }

  fix(fix: OfferedFix, diagnostics: readonly Diagnostic[]): CodeAction {
    const { finding, title, edits, confidence, fill } = fix;
    const range = finding && rangeOf(this.lines, finding.span, this.session.target.encoding);
    const settled = diagnostics.filter((each) => range && each.code === finding?.code && each.range.start.line === range.start.line && each.range.start.character === range.start.character);
    const action = this.action(title, finding ? CodeActionKind.QuickFix : rewriteKind, edits);
    const command = fill && edits.length > 0 ? this.selection(edits, fill) : undefined;
    return { ...action, ...(settled.length > 0 ? { diagnostics: settled } : {}), ...(confidence === 'proven' ? { isPreferred: true } : {}), ...(command ? { command } : {}) };
  }

  /** Without edits there is only something to say: the editor shows it greyed where it can, and leaves it out where it cannot. */
  action(title: string, kind: string, edits: readonly TextEdit[]): CodeAction {
    if (edits.length === 0) return { title, kind, disabled: { reason: title } };
    const { uri, version } = this.document;
    const changes = edits.map(({ start, end, text }) => ({ range: rangeOf(this.lines, { start, end }, this.session.target.encoding), newText: text }));
    const versioned = this.session.capabilities.workspace?.workspaceEdit?.documentChanges === true;
    return { title, kind, edit: versioned ? { documentChanges: [{ textDocument: { uri, version }, edits: changes }] } : { changes: { [uri]: changes } } };
  }

  /** Puts the cursor on what the author has to fill in, where the editor knows how. */
  private selection(edits: readonly TextEdit[], fill: { readonly start: number; readonly end: number }): Command | undefined {
    if (!this.session.client.select) return undefined;
    const after = LineIndex.of([...edits].sort((a, b) => b.start - a.start).reduce((text, edit) => text.slice(0, edit.start) + edit.text + text.slice(edit.end), this.document.text));
    return { title: 'Fill in', command: 'termwise.select', arguments: [this.document.uri, rangeOf(after, fill, 'utf-16')] };
  }
}
