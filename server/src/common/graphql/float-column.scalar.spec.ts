import { describe, expect, it } from '@jest/globals';
import { GraphQLError, parseValue } from 'graphql';
import { FloatColumnScalar, LONGEST_COLUMN } from './float-column.scalar.js';

const scalar = new FloatColumnScalar();
const literal = (text: string) => scalar.parseLiteral(parseValue(text));
const codeOf = (work: () => unknown): unknown => {
  try {
    work();
  } catch (error) {
    return error instanceof GraphQLError ? error.extensions['code'] : error;
  }
  return undefined;
};

describe('a column of numbers', () => {
  it('comes in from JSON and goes out as it came, to the last bit', () => {
    const column = [0, -0.1, 1.5, 2e-5, 5e-324, Number.MAX_VALUE];
    expect(scalar.serialize(scalar.parseValue(column))).toEqual(column);
  });

  it('comes in as a literal with the same numbers', () => {
    expect(literal('[1, 2.5, 2e-5, -3]')).toEqual(scalar.parseValue([1, 2.5, 2e-5, -3]));
    expect(literal('[]')).toEqual(new Float64Array());
  });

  it('holds 10,000 numbers and no more', () => {
    expect(scalar.parseValue(new Array(LONGEST_COLUMN).fill(1))).toHaveLength(10_000);
    expect(codeOf(() => scalar.parseValue(new Array(LONGEST_COLUMN + 1).fill(1)))).toBe('BAD_USER_INPUT');
  });

  it.each([1, '1', null, undefined, {}, { length: 1, 0: 1 }, [null], ['1'], [true], [[1]], [Infinity], [NaN]])(
    'refuses %j',
    (value) => {
      expect(codeOf(() => scalar.parseValue(value))).toBe('BAD_USER_INPUT');
    },
  );

  it.each(['1', '"1"', '["1"]', '[null]', '[true]', '[[1]]', '{a: 1}', '[1e999]'])('refuses the literal %s', (text) => {
    expect(codeOf(() => literal(text))).toBe('BAD_USER_INPUT');
  });
});
