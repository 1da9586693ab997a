/** `termwise-language-server --stdio`: the language server for any editor. */
import { createConnection, ProposedFeatures } from 'vscode-languageserver/node.js';
import manifest from '../../../package.json' with { type: 'json' };
import { nodeHost } from './node-host.ts';
import { serve } from './server.ts';

const usage = `termwise-language-server: checks the units in scripts, for an editor that speaks the Language Server Protocol

  --stdio          messages over standard input and output (the default)
  --node-ipc       messages over the channel of a Node parent process
  --socket=PORT    messages over a socket
  --version        prints the version
  --help           prints this
`;

const args = process.argv.slice(2);
if (args.includes('--help') || args.includes('-h')) process.stdout.write(usage);
else if (args.includes('--version')) process.stdout.write(`${manifest.version}\n`);
else {
  if (!args.some((arg) => /^--(?:stdio|node-ipc|socket|pipe)\b/.test(arg))) process.argv.push('--stdio');
  const connection = createConnection(ProposedFeatures.all);
  // One answer that fails is no reason to leave the editor without the others.
  process.on('unhandledRejection', (error) => connection.console.error(error instanceof Error ? (error.stack ?? error.message) : String(error)));
  serve(connection, nodeHost(manifest.version));
  connection.listen();
}
