/** Which nodes of tree-sitter's Julia grammar are copied. */
import type { TreeShape } from '../tree-sitter/syntax.ts';

export const juliaShape: TreeShape = {
  comments: new Set(['line_comment', 'block_comment']),
  leaves: new Set(['identifier', 'operator', 'integer_literal', 'float_literal', 'boolean_literal', 'character_literal', 'command_literal', 'prefixed_command_literal', 'content', 'line_comment', 'block_comment', 'break_statement', 'continue_statement', 'macro_identifier', 'scoped_identifier', 'import_path']),
  fieldless: new Set(['argument_list', 'vector_expression', 'matrix_row', 'binary_expression', 'assignment', 'call_expression', 'tuple_expression', 'parenthesized_expression', 'index_expression', 'source_file', 'ERROR']),
  extras: new Set(['line_comment', 'block_comment']),
  tokens: /^(?:;|catch)$/,
};
