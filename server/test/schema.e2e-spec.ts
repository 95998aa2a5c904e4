import fs from 'node:fs/promises';
import path from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { GraphQLSchemaHost } from '@nestjs/graphql';
import {
  buildSchema,
  type GraphQLArgument,
  type GraphQLInputField,
  type GraphQLSchema,
  isEnumType,
  isInputObjectType,
  isInterfaceType,
  isObjectType,
  lexicographicSortSchema,
  printSchema,
} from 'graphql';
import { startTestApp, type TestApp } from './app.js';

const SCHEMA_FOLDER = path.resolve(import.meta.dirname, '../../schema');
const PRINTED = path.join(SCHEMA_FOLDER, 'schema.graphql');

const inputOf = (input: GraphQLArgument | GraphQLInputField) =>
  `${input.name}: ${String(input.type)} = ${JSON.stringify(input.defaultValue)}`;

/** Every promise of a schema as one line, so that what breaks a contract can be named. */
function promisesOf(schema: GraphQLSchema): string[] {
  return Object.values(schema.getTypeMap())
    .filter((type) => !type.name.startsWith('__'))
    .flatMap((type) => {
      if (isObjectType(type) || isInterfaceType(type)) {
        const fields = Object.values(type.getFields()).flatMap((field) => [
          `${type.name}.${field.name}: ${String(field.type)}`,
          ...field.args.map((argument) => `${type.name}.${field.name}(${inputOf(argument)})`),
        ]);
        return [...fields, ...type.getInterfaces().map((face) => `${type.name} implements ${face.name}`)];
      }
      if (isInputObjectType(type)) {
        const fields = Object.values(type.getFields()).map((field) => `${type.name}.${inputOf(field)}`);
        return type.isOneOf ? [...fields, `${type.name} @oneOf`] : fields;
      }
      if (isEnumType(type)) return type.getValues().map((value) => `${type.name}.${value.name}`);
      return [`scalar ${type.name}`];
    });
}

/** What a caller must give that the contract does not ask for would break it as well. */
function demandsBeyond(contract: GraphQLSchema, schema: GraphQLSchema): string[] {
  return Object.values(contract.getTypeMap()).flatMap((type) => {
    const ours = schema.getType(type.name);
    if (isInputObjectType(type) && isInputObjectType(ours)) {
      return Object.values(ours.getFields())
        .filter(
          (field) =>
            !(field.name in type.getFields()) && String(field.type).endsWith('!') && field.defaultValue === undefined,
        )
        .map((field) => `${type.name}.${field.name}`);
    }
    return [];
  });
}

describe('the GraphQL schema', () => {
  let testApp: TestApp;
  let schema: GraphQLSchema;

  beforeAll(async () => {
    testApp = await startTestApp();
    ({ schema } = testApp.app.get(GraphQLSchemaHost));
    if (process.env['UPDATE_SCHEMA'] === 'true')
      await fs.writeFile(PRINTED, `${printSchema(lexicographicSortSchema(schema))}\n`);
  });

  afterAll(() => testApp.close());

  it('is the one committed in schema/schema.graphql', async () => {
    // `npm run schema` writes the file anew; its diff is the review of an API change.
    expect(`${printSchema(lexicographicSortSchema(schema))}\n`).toBe(await fs.readFile(PRINTED, 'utf8'));
  });

  it('keeps every promise of the public contract', async () => {
    const contract = buildSchema(await fs.readFile(path.join(SCHEMA_FOLDER, 'contract.graphql'), 'utf8'));
    const kept = new Set(promisesOf(schema));
    expect(promisesOf(contract).filter((promise) => !kept.has(promise))).toEqual([]);
    expect(demandsBeyond(contract, schema)).toEqual([]);
  });
});
