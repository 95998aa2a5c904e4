import { ApolloDriver, type ApolloDriverConfig } from '@nestjs/apollo';
import { Module } from '@nestjs/common';
import { GraphQLModule as NestGraphQLModule } from '@nestjs/graphql';
import { ApolloArmor } from '@escape.tech/graphql-armor';
import { type FastifyReply, type FastifyRequest } from 'fastify';
import { specifiedDirectives } from 'graphql';
import { FloatColumnScalar } from './float-column.scalar.js';
import { formatError } from './format-error.js';
import { Node } from './node.js';
import { QueryCostPlugin } from './query-cost.plugin.js';

/** What one request may ask for; measured so that the worst admitted query stays cheap. */
const LIMITS = { tokens: 1_000, depth: 12, aliases: 15, directives: 20 };

const armor = new ApolloArmor({
  maxDepth: { n: LIMITS.depth, flattenFragments: true },
  maxAliases: { n: LIMITS.aliases },
  maxDirectives: { n: LIMITS.directives },
  // It counts no page sizes that come in by variables; QueryCostPlugin does.
  costLimit: { enabled: false },
  // Apollo's own limit answers 400 where this one answers 500, and its suggestions are switched off below.
  maxTokens: { enabled: false },
  blockFieldSuggestion: { enabled: false },
}).protect();

@Module({
  imports: [
    NestGraphQLModule.forRoot<ApolloDriverConfig>({
      driver: ApolloDriver,
      path: '/graphql',
      autoSchemaFile: true,
      sortSchema: false,
      playground: false,
      graphiql: false,
      introspection: true,
      csrfPrevention: true,
      allowBatchedHttpRequests: false,
      includeStacktraceInErrorResponses: false,
      hideSchemaDetailsFromClientErrors: false,
      parseOptions: { maxTokens: LIMITS.tokens },
      validationRules: armor.validationRules,
      plugins: [...armor.plugins, new QueryCostPlugin()] as unknown as NonNullable<ApolloDriverConfig['plugins']>,
      buildSchemaOptions: { directives: [...specifiedDirectives], orphanedTypes: [Node] },
      context: (req: FastifyRequest, res: FastifyReply) => ({ req, res }),
      formatError,
    }),
  ],
  providers: [FloatColumnScalar],
})
export class GraphQLModule {}
