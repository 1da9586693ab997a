/** Between two stages of work: messages that came meanwhile, a cancellation among them, are read first. */
import { type CancellationToken, LSPErrorCodes, ResponseError } from 'vscode-languageserver/node.js';

/** A browser has no `setImmediate`. */
const soon: (then: (value?: unknown) => void) => void = typeof setImmediate === 'function' ? setImmediate : (then) => setTimeout(then, 0);

/** Rejects with the protocol's "request cancelled" where the client no longer wants the answer. */
export async function turn(token?: CancellationToken): Promise<void> {
  await new Promise((resolve) => soon(resolve));
  if (token?.isCancellationRequested) throw new ResponseError(LSPErrorCodes.RequestCancelled, 'cancelled');
}
