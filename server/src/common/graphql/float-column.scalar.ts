import { CustomScalar, Scalar } from '@nestjs/graphql';
import { GraphQLError, Kind, type ValueNode } from 'graphql';

/** Longest column that a request may carry. */
export const LONGEST_COLUMN = 10_000;

function badColumn(message: string): GraphQLError {
  return new GraphQLError(message, { extensions: { code: 'BAD_USER_INPUT' } });
}

function checked(value: unknown): Float64Array {
  if (!Array.isArray(value)) throw badColumn('A column is a list of numbers.');
  if (value.length > LONGEST_COLUMN) throw badColumn(`A column holds at most ${LONGEST_COLUMN} numbers.`);
  const column = new Float64Array(value.length);
  for (let i = 0; i < value.length; i += 1) {
    const entry: unknown = value[i];
    if (typeof entry !== 'number' || !Number.isFinite(entry))
      throw badColumn(`Entry ${i} of the column is not a finite number.`);
    column[i] = entry;
  }
  return column;
}

/** Columns travel as one scalar, so that a long one costs what its JSON costs. */
@Scalar('FloatColumn', () => Float64Array)
export class FloatColumnScalar implements CustomScalar<number[], Float64Array> {
  description =
    'A column of finite numbers: in JSON an array such as [1.5, 2e-5]; as a literal a list of numbers. One scalar, so that long columns cost what their JSON costs.';

  serialize(value: unknown): number[] {
    if (value instanceof Float64Array) return Array.from(value);
    return Array.from(checked(value));
  }

  parseValue(value: unknown): Float64Array {
    return checked(value);
  }

  parseLiteral(node: ValueNode): Float64Array {
    if (node.kind !== Kind.LIST) throw badColumn('A column is a list of numbers.');
    return checked(
      node.values.map((entry) =>
        entry.kind === Kind.INT || entry.kind === Kind.FLOAT ? Number(entry.value) : Number.NaN,
      ),
    );
  }
}
