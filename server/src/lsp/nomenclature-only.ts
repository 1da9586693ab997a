/**
 * What is offered for nomenclature files and for nothing else: other languages have their own servers for these, and an editor would ask
 * its user which formatter to take. A client that cannot be told so is told at the start, and gets nothing for other documents.
 */
import {
  DocumentFormattingRequest, FoldingRangeRequest, type InitializeResult, ReferencesRequest, RegistrationRequest, RenameRequest, SemanticTokensRegistrationType,
} from 'vscode-languageserver/node.js';
import { tokenLegend } from './requests/nomenclature.ts';
import type { Session } from './session.ts';

const documentSelector = [{ language: 'nomenclature' }];

const offers = [
  { client: 'formatting', method: DocumentFormattingRequest.method, options: {}, static: { documentFormattingProvider: true } },
  { client: 'foldingRange', method: FoldingRangeRequest.method, options: {}, static: { foldingRangeProvider: true } },
  { client: 'references', method: ReferencesRequest.method, options: {}, static: { referencesProvider: true } },
  { client: 'rename', method: RenameRequest.method, options: { prepareProvider: true }, static: { renameProvider: { prepareProvider: true } } },
  { client: 'semanticTokens', method: SemanticTokensRegistrationType.method, options: { legend: tokenLegend, full: true }, static: { semanticTokensProvider: { legend: tokenLegend, full: true } } },
] as const;

/** Said at the start, for a client that knows an offer and cannot be told of it later. */
export function nomenclatureCapabilities(session: Session): InitializeResult['capabilities'] {
  return Object.assign({}, ...offers.filter(({ client }) => session.capabilities.textDocument?.[client] && !isDynamic(session, client)).map((each) => each.static));
}

/** Said once the client is ready, for nomenclature files only. */
export async function serveNomenclatureOnly(session: Session): Promise<void> {
  const registrations = offers.filter(({ client }) => isDynamic(session, client)).map(({ method, options }) => ({ id: `termwise/${method}`, method, registerOptions: { documentSelector, ...options } }));
  if (registrations.length > 0) await session.connection.sendRequest(RegistrationRequest.type, { registrations });
}

function isDynamic({ capabilities }: Session, client: (typeof offers)[number]['client']): boolean {
  return capabilities.textDocument?.[client]?.dynamicRegistration === true;
}
