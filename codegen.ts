import type { CodegenConfig } from '@graphql-codegen/cli';

/** Types of the client's operations, from the printed schema. */
const config: CodegenConfig = {
  schema: 'schema/schema.graphql',
  documents: ['client/src/**/*.{ts,tsx,graphql}', '!client/src/gql/**'],
  generates: {
    'client/src/gql/': {
      preset: 'client',
      presetConfig: { fragmentMasking: false },
      config: {
        useTypeImports: true,
        strictScalars: true,
        enumsAsTypes: true,
        scalars: { DateTime: 'string', FloatColumn: 'number[]', JSON: 'unknown' },
      },
    },
  },
  ignoreNoDocuments: true,
};

export default config;
