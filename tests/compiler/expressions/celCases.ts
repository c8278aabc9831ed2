import { readFileSync } from 'node:fs';

/** One case of the conformance suite: an expression with its value, or with `error` where it must fail. */
export interface CelCase {
  readonly file: string;
  readonly section: string;
  readonly name: string;
  readonly expr: string;
  readonly type?: string;
  readonly value?: unknown;
  readonly error?: boolean;
  readonly bindings?: unknown;
}

export const nameOf = ({ file, section, name }: CelCase): string => `${file}/${section}/${name}`;

/** Source: google/cel-spec, tests/simple/testdata (Apache-2.0); commit and conversion are in the file's head. */
export const { cases: CEL_CASES } = JSON.parse(
  readFileSync(new URL('../../data/cel/cel_conformance_subset.json', import.meta.url), 'utf8'),
) as { readonly cases: readonly CelCase[] };

/** What recipes do not intend to have, each with its reason. */
export const EXCLUDED: readonly { readonly reason: string; covers(item: CelCase): boolean }[] = [
  {
    reason:
      'the extension library of mathematics is not registered; recipes have min, max, abs, sqrt and clamp',
    covers: ({ file }) => file === 'math_ext',
  },
  {
    reason: 'the extension library of strings is not registered; expressions give numbers and points',
    covers: ({ file }) => file === 'string_ext',
  },
  {
    reason: 'protobuf messages: there are none in a recipe',
    covers: ({ expr }) => /google\.protobuf|TestAllTypes/.test(expr),
  },
  {
    reason: 'bytes: a recipe holds none',
    covers: ({ expr }) => /(^|[^\w'"])b['"]|bytes\(/.test(expr),
  },
  {
    reason: 'timestamps: a recipe knows no clock',
    covers: ({ expr }) => expr.includes('timestamp('),
  },
  {
    reason:
      'other variables than params and landmarks are refused before anything is evaluated, even where || would hide them',
    covers: ({ section, name, bindings }) =>
      bindings !== undefined || section === 'receiver_function_names' || name === 'unbound_is_runtime_error',
  },
  {
    reason: 'operands of && and || that are not true or false are refused before anything is evaluated',
    covers: ({ name }) => name.startsWith('short_circuit_type'),
  },
  {
    reason: 'a list literal may have 16 items here, so that no expression grows without bound',
    covers: ({ section, name }) => section === 'repeat' && name === 'list_literal',
  },
  {
    reason: 'recipes define the remainder of doubles, because every number of theirs is one',
    covers: ({ name }) => name === 'mod_not_support',
  },
];

/** Where the CEL library itself differs from the specification. None is reachable with numbers that are doubles, but for the literals that begin with a point. */
export const KNOWN_DIFFERENCES: Readonly<Record<string, string>> = {
  'integer_math/int64_math/int64_min_negate': 'negation of the least int64 does not overflow',
  'integer_math/int64_math/int64_min_negate_div': 'division of the least int64 by -1 does not overflow',
  'comparisons/eq_literal/eq_map_mixed_type_numbers': 'numbers of different types inside maps are not equal',
  'comparisons/eq_literal/eq_mixed_types': 'double == int needs dyn',
  'comparisons/ne_literal/ne_mixed_types': 'uint != int needs dyn',
  'comparisons/lt_literal/not_lt_dyn_int_big_lossy_double': 'int64 beyond 2^53 against double',
  'comparisons/lte_literal/lte_dyn_big_double_int': 'int64 beyond 2^53 against double',
  'comparisons/gt_literal/not_gt_double': 'a literal cannot begin with a point: .99',
  'lists/in/int_in_uints': 'int is not found among uints',
  'macros/all/list_empty': 'a macro over the empty list has no type for its variable',
  'macros/exists_one/map_one': 'a macro over a map is typed by its values, not by its keys',
  'conversions/int/uint_zero': 'int(uint) is missing',
  'parse/nest/funcall': 'int(uint) is missing',
  'conversions/int/double_int_max_range': 'int(double) does not check its range',
  'conversions/int/double_range': 'int(double) does not check its range',
  'fields/map_has/has': 'has() of a literal map',
  'fields/map_has/has_empty': 'has() of a literal map',
  'fields/quoted_map_fields/field_access_dash': 'quoted field names are missing',
  'fields/quoted_map_fields/has_field_slash': 'quoted field names are missing',
  'fields/quoted_map_fields/has_field_dot': 'quoted field names are missing',
  'fields/qualified_identifier_resolution/map_key_null': 'null is taken as a key',
  'fields/qualified_identifier_resolution/map_value_repeat_key_heterogeneous':
    'equal keys of different types are not seen as repeated',
};
