/** SARIF logs against the schema that the OASIS technical committee published for SARIF 2.1.0, as the package @microsoft/jest-sarif ships it. */
import { createRequire } from 'node:module';
import { Ajv } from 'ajv';
import addFormats from 'ajv-formats';

const schema = createRequire(import.meta.url)('@microsoft/jest-sarif/lib/schemas/sarif-2.1.0-rtm.5.json') as Record<string, unknown>;
const ajv = new Ajv({ strict: false, allErrors: true, unicodeRegExp: false });
addFormats.default(ajv);
// Draft 4 differs from draft 7 in the name of `id` only, for what this schema uses.
const { $schema: _draft4, id: _id, ...draft7 } = schema;
const validate = ajv.compile(draft7);

/** What the schema finds wrong; empty for a valid log. */
export function sarifProblems(log: unknown): readonly string[] {
  return validate(log) ? [] : (validate.errors ?? []).map((each) => `${each.instancePath} ${each.message}`);
}
