/** What `--help` prints. */
import { languageNames, searchedFor } from './languages.ts';
import { wrap } from './terminal.ts';

export const generalHelp = `termwise reads the units written in the comments and documentation of scripts, carries
them through every expression without running anything, and reports what cannot be right.

Usage
  termwise check <paths…>     check files and folders
  termwise groups <files…>    dimensionless groups of the relations in files
  termwise help check         the options of check
  termwise help groups        the options of groups
  termwise help <code>        what a finding means, with examples: termwise help scale-mismatch
  termwise --version          the version

Exit status: 0 nothing found at severity error, 1 findings at error, 2 bad usage or input that cannot be read.
`;

export const checkHelp = `Checks the units of scripts, notebooks and nomenclature files.

Usage
  termwise check <paths…> [options]

  A path is a file, a folder, or - for standard input. Folders are searched for
${indented(searchedFor.join(', '), 2)}
  without what .gitignore files exclude, folders whose names begin with a dot, node_modules, __pycache__
  and virtual environments. A file that is named is always checked. The code cells of a notebook are checked
  as one program in their order, and findings name cell and line.

Options
  --format text|json|sarif    form of the output (text)
  --severity code=level       severity of one code; level is error, warning, information, hint or off (repeatable)
  --hints                     shows hints in text output; json and sarif always hold them
  --stats                     adds functions, notes read and not read, known units, findings by code, files and time
  --language name             language of standard input and of the files named:
${indented(languageNames.join(', '), 30)}
  --stdin-file name           name under which standard input is checked: decides its folder and language
  --config file               configuration file, instead of the nearest termwise.json at or above each file
  --fix                       writes the fixes that are proven into the files, and shows what is left; a file keeps its
                              encoding and line ends, and is not written if it changes meanwhile
  --fix --dry-run             prints them as a unified diff and writes nothing
  --changed                   checks only files that differ from the last commit, or are not in one (asks git)
  --since revision            checks only files that differ from a revision, as in --since main
  --write-baseline file       writes the findings down as known
  --baseline file             leaves known findings out: only new ones are shown and count
  --no-color                  no colours (also: the environment variable NO_COLOR)
  -h, --help                  this text

Configuration: termwise.json, with comments allowed. All keys are optional.
  {
    "severities": { "hidden-unit": "error", "bare-addend": "off" },
    "notes": { "parentheses": true, "bare": true },
    "exclude": ["old/", "*_generated.py"]
  }

Exit status: 0 nothing found at severity error, 1 findings at error, 2 bad usage or input that cannot be read
(the remaining files are still checked).
`;

function indented(text: string, by: number): string {
  return wrap(text, 110 - by).map((line) => ' '.repeat(by) + line).join('\n');
}
