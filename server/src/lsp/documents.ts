/** The open documents, kept in step with the editor by the changes it sends. */
import type { TextDocumentContentChangeEvent, TextDocumentItem } from 'vscode-languageserver/node.js';
import { languageOf, languages } from '../frontends/registry.ts';
import type { LanguageId } from '../program/nodes.ts';
import { LineIndex } from '../text/line-index.ts';
import { fileOf } from './paths.ts';
import { type Encoding, offsetOf } from './positions.ts';

export interface OpenDocument {
  readonly uri: string;
  readonly file: string;
  /** By the editor's name for it, else by the file's ending; undefined where it is none of ours. */
  readonly language: LanguageId | undefined;
  readonly version: number;
  readonly text: string;
  /** The program of a notebook, whose findings go to its cells. */
  readonly isProgram?: true;
}

export class Documents {
  private readonly byUri = new Map<string, OpenDocument>();
  private readonly byFile = new Map<string, OpenDocument>();

  open({ uri, languageId, version, text }: TextDocumentItem): OpenDocument {
    return this.keep({ uri, file: fileOf(uri), language: languageNamed(languageId, fileOf(uri), text), version, text });
  }

  /** Undefined for a document that is not open: the editor is at fault, and nothing is to be done. */
  change(uri: string, version: number, changes: readonly TextDocumentContentChangeEvent[], encoding: Encoding): OpenDocument | undefined {
    const document = this.byUri.get(uri);
    return document && this.keep({ ...document, version, text: changes.reduce((text, change) => applied(text, change, encoding), document.text) });
  }

  /** The program of a notebook, which no notification of a text document opens. */
  put(document: OpenDocument): void {
    this.keep(document);
  }

  close(uri: string): OpenDocument | undefined {
    const document = this.byUri.get(uri);
    this.byUri.delete(uri);
    if (document) this.byFile.delete(document.file);
    return document;
  }

  get(uri: string): OpenDocument | undefined {
    return this.byUri.get(uri);
  }

  at(file: string): OpenDocument | undefined {
    return this.byFile.get(file);
  }

  all(): readonly OpenDocument[] {
    return [...this.byUri.values()];
  }

  private keep(document: OpenDocument): OpenDocument {
    this.byUri.set(document.uri, document);
    this.byFile.set(document.file, document);
    return document;
  }
}

/** Names that editors and their extensions have for languages besides our own. */
const otherNames: Readonly<Record<string, LanguageId>> = {
  octave: 'matlab', javascriptreact: 'javascript', typescriptreact: 'typescript', fortranfreeform: 'fortran', 'fortran-modern': 'fortran', 'fortran_free-form': 'fortran', 'fortran_fixed-form': 'fortran',
};

/** Undefined where the language is none of ours. */
export function languageNamed(languageId: string, file: string, text: string): LanguageId | undefined {
  const named = languages.find((each) => each === languageId) ?? otherNames[languageId.toLowerCase()];
  if (named) return named;
  // `.m` is taken for Objective-C where no extension says otherwise; what is Objective-C shows it.
  if (languageId === 'objective-c' && /^\s*(?:#import|#include|@interface|@implementation|@class|@protocol)\b/m.test(text)) return undefined;
  return languageOf(file);
}

/** A text after one change. */
export function applied(text: string, change: TextDocumentContentChangeEvent, encoding: Encoding): string {
  if (!('range' in change)) return change.text;
  const lines = LineIndex.of(text);
  const [one, other] = [offsetOf(lines, change.range.start, encoding), offsetOf(lines, change.range.end, encoding)];
  return text.slice(0, Math.min(one, other)) + change.text + text.slice(Math.max(one, other));
}
