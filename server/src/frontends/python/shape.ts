/** Which nodes of tree-sitter's Python grammar are copied. */
import type { TreeShape } from '../tree-sitter/syntax.ts';

export const pythonShape: TreeShape = {
  comments: new Set(['comment']),
  leaves: new Set(['identifier', 'integer', 'float', 'true', 'false', 'none', 'comment', 'string_start', 'string_content', 'string_end', 'ellipsis', 'pass_statement', 'break_statement', 'continue_statement']),
  fieldless: new Set([
    'argument_list', 'block', 'comment', 'concatenated_string', 'conditional_expression', 'decorator', 'dictionary', 'dotted_name', 'ERROR', 'expression_list', 'expression_statement',
    'list', 'module', 'parameters', 'lambda_parameters', 'parenthesized_expression', 'pattern_list', 'return_statement', 'set', 'slice', 'string', 'tuple', 'tuple_pattern', 'type', 'with_clause',
  ]),
  extras: new Set(['comment', 'line_continuation']),
  tokens: /^(?::|[+\-*/%@&|^~]|\*\*|\/\/|<<|>>|[+\-*/%@&|^]=|(?:\*\*|\/\/|<<|>>)=|[<>]=?|==|!=|<>|and|or|not|in|is|not in|is not)$/,
};
