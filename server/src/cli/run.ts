/** The program behind the command: reads the arguments and does what they ask. */
import { readArguments } from './arguments.ts';
import type { Surroundings } from './check.ts';
import type { FindingCode } from '../program/codes.ts';
import { checkHelp, generalHelp } from './help.ts';

/** Runs a command line; the answer is the exit status. Only what is asked for is loaded: the version answers at once. */
export async function run(args: readonly string[], around: Surroundings): Promise<number> {
  if (args[0] === 'groups' || (args[0] === 'help' && args[1] === 'groups')) {
    const { runGroups } = await import('./groups.ts');
    return runGroups(args[0] === 'help' ? ['--help'] : args.slice(1), around);
  }
  const request = readArguments(args);
  switch (request.kind) {
    case 'version':
      around.out(`termwise ${around.version}\n`);
      return 0;
    case 'help':
      around.out(request.about === undefined ? generalHelp : request.about === 'check' ? checkHelp : await page(request.about));
      return 0;
    case 'misuse':
      around.complain(`termwise: ${request.problem}\n${args.length === 0 ? `\n${generalHelp}` : 'See termwise --help.\n'}`);
      return 2;
    case 'check': {
      const { check } = await import('./check.ts');
      return check(request.options, around);
    }
  }
}

async function page(code: FindingCode): Promise<string> {
  const { pageOf } = await import('../platform/pages.ts');
  return pageOf(code);
}
