import { type ApolloServerPlugin, type GraphQLRequestContextDidResolveOperation } from '@apollo/server';
import { type DocumentNode, GraphQLError, type GraphQLSchema, Kind, type OperationDefinitionNode } from 'graphql';
import { type ComplexityEstimatorArgs, getComplexity, simpleEstimator } from 'graphql-query-complexity';
import { LARGEST_PAGE } from './connection.js';

/** Highest cost of one operation: a page of 100 with some fifty fields each. A nest of two full pages is beyond it. */
export const MOST_COST = 5_000;

/** A connection costs its page: each node is counted as often as `first` allows. */
function pageEstimator({ args, childComplexity, field }: ComplexityEstimatorArgs): number | undefined {
  if (!field.args.some((argument) => argument.name === 'first')) return undefined;
  const first: unknown = args['first'];
  const nodes = typeof first === 'number' ? Math.min(Math.max(first, 1), LARGEST_PAGE) : LARGEST_PAGE;
  return 1 + nodes * childComplexity;
}

const ESTIMATORS = [pageEstimator, simpleEstimator({ defaultComplexity: 1 })];

/** Only a page size can come in by a variable; without one the cost is the document's own and is remembered. */
const hasPageVariable = (operation: OperationDefinitionNode | undefined) =>
  operation?.variableDefinitions?.some(({ type }) => /^Int!?$/.test(printType(type))) ?? false;

function printType(type: NonNullable<OperationDefinitionNode['variableDefinitions']>[number]['type']): string {
  if (type.kind === Kind.NAMED_TYPE) return type.name.value;
  return type.kind === Kind.NON_NULL_TYPE ? `${printType(type.type)}!` : `[${printType(type.type)}]`;
}

/** Refuses operations that ask for too much, before they run. */
export class QueryCostPlugin implements ApolloServerPlugin {
  private readonly known = new WeakMap<DocumentNode, Map<string | null, number>>();

  requestDidStart() {
    return Promise.resolve({
      didResolveOperation: (context: GraphQLRequestContextDidResolveOperation<object>) => {
        const cost = this.costOf(context);
        if (cost <= MOST_COST) return Promise.resolve();
        throw new GraphQLError(
          `The query costs ${cost} where ${MOST_COST} is allowed; ask for smaller pages or fewer fields.`,
          {
            extensions: { code: 'QUERY_TOO_COSTLY', http: { status: 400 } },
          },
        );
      },
    });
  }

  private costOf({
    schema,
    document,
    operation,
    operationName,
    request,
  }: GraphQLRequestContextDidResolveOperation<object>): number {
    const costs = this.known.get(document) ?? new Map<string | null, number>();
    const known = costs.get(operationName);
    if (known !== undefined) return known;
    const cost = complexity(schema, document, operationName, request.variables ?? {});
    if (!hasPageVariable(operation)) this.known.set(document, costs.set(operationName, cost));
    return cost;
  }
}

function complexity(
  schema: GraphQLSchema,
  query: DocumentNode,
  operationName: string | null,
  variables: Record<string, unknown>,
): number {
  try {
    return getComplexity({
      schema,
      query,
      variables,
      estimators: ESTIMATORS,
      ...(operationName !== null && { operationName }),
    });
  } catch (error) {
    if (!(error instanceof GraphQLError)) throw error;
    // Missing or malformed variables, which the count meets before the execution would.
    const extensions = { code: 'BAD_USER_INPUT', http: { status: 400 } };
    throw new GraphQLError(error.message, { nodes: error.nodes ?? null, extensions });
  }
}
