/** Which nodes of tree-sitter's JavaScript and TypeScript grammars are copied. */
import type { TreeShape } from '../tree-sitter/syntax.ts';

export const scriptShape: TreeShape = {
  comments: new Set(['comment', 'html_comment', 'hash_bang_line']),
  leaves: new Set([
    'identifier', 'property_identifier', 'private_property_identifier', 'shorthand_property_identifier', 'shorthand_property_identifier_pattern', 'statement_identifier', 'type_identifier',
    'number', 'string_fragment', 'escape_sequence', 'regex', 'this', 'super', 'true', 'false', 'null', 'undefined', 'comment', 'html_comment', 'hash_bang_line', 'type_annotation', 'type_arguments', 'type_parameters',
    'empty_statement', 'debugger_statement', 'optional_chain', 'accessibility_modifier', 'override_modifier', 'predefined_type', 'type_predicate_annotation', 'asserts_annotation',
  ]),
  fieldless: new Set(['program', 'statement_block', 'ERROR', 'arguments', 'array', 'array_pattern', 'object', 'object_pattern', 'expression_statement', 'parenthesized_expression', 'sequence_expression', 'string', 'template_string', 'template_substitution', 'return_statement', 'throw_statement']),
  extras: new Set(['comment', 'html_comment']),
  tokens: /^(?:[+\-*/%&|^~!<>]|\*\*|<<|>>>?|(?:\*\*|<<|>>>?|&&|\|\||\?\?|[+\-*/%&|^])=|[<>]=|[!=]==?|&&|\|\||\?\?|\+\+|--|typeof|void|delete|instanceof|in|of|await|async|static|get|set|default|const|let|var|export|import|type|readonly)$/,
};
