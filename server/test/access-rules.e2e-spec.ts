import { type Type } from '@nestjs/common';
import { DiscoveryService, MetadataScanner, ModulesContainer } from '@nestjs/core';
import { GraphQLSchemaHost } from '@nestjs/graphql';
import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import {
  getNamedType,
  type GraphQLInputType,
  isCompositeType,
  isEnumType,
  isInputObjectType,
  isListType,
  isNonNullType,
} from 'graphql';
import { ACCESS, type Access } from '../src/common/access.decorators.js';
import { ROLES } from '../src/common/viewer.js';
import { codeOf, RunningServer } from './running-server.js';

/** Names under which the framework keeps what its decorators say. */
const PATH_METADATA = 'path';
const METHOD_METADATA = 'method';
const RESOLVER_TYPE = 'graphql:resolver_type';
const RESOLVER_NAME = 'graphql:resolver_name';

interface Operation {
  readonly name: string;
  readonly kind: 'Query' | 'Mutation' | 'Subscription' | 'route';
  readonly access: Access | undefined;
}

/** What a visitor may call. Whoever adds to it decides that the whole world may. */
const OPEN_MUTATIONS: string[] = [];
const OPEN_POSTS = [
  'accept-invitation',
  'evaluate',
  'first-administrator',
  'invitation',
  'refresh',
  'request-password-reset',
  'reset-password',
  'sign-in',
  'sign-out',
];

describe('the access rules', () => {
  let server: RunningServer;
  let operations: Operation[];

  beforeAll(async () => {
    server = await RunningServer.start();
    operations = listOperations(server);
  });
  afterAll(() => server.stop());

  it('are stated by every root field of the schema and by every route', () => {
    const { schema } = server.app.get(GraphQLSchemaHost);
    const fields = [schema.getQueryType(), schema.getMutationType(), schema.getSubscriptionType()].flatMap((type) =>
      Object.keys(type?.getFields() ?? {}),
    );

    expect(fields.length).toBeGreaterThan(20);
    const listed = operations.filter(({ kind }) => kind !== 'route').map(({ name }) => name);
    expect(listed.sort()).toEqual(fields.sort());
    expect(operations.filter(({ kind }) => kind === 'route').length).toBeGreaterThan(10);
    expect(operations.filter(({ access }) => access === undefined)).toEqual([]);
  });

  it('let a visitor send nothing but what opens the way in, and states to evaluate', () => {
    const open = operations.filter(({ access }) => access === 'anyone');
    expect(open.filter(({ kind }) => kind === 'Mutation').map(({ name }) => name)).toEqual(OPEN_MUTATIONS);
    const posts = open.filter(({ kind, name }) => kind === 'route' && !/^(GET|HEAD) /.test(name));
    expect(posts.map(({ name }) => name.split('/').at(-1)).sort()).toEqual(OPEN_POSTS);
  });

  it('name roles that exist', () => {
    for (const { access } of operations) {
      if (!Array.isArray(access)) continue;
      expect(access.length).toBeGreaterThan(0);
      for (const role of access as string[]) expect(ROLES).toContain(role);
    }
  });

  it('keep every closed field from a visitor', async () => {
    const { schema } = server.app.get(GraphQLSchemaHost);
    const open = new Set(operations.filter(({ access }) => access === 'anyone').map(({ name }) => name));
    const answers: Record<string, string | undefined> = {};
    for (const [keyword, type] of [
      ['query', schema.getQueryType()],
      ['mutation', schema.getMutationType()],
    ] as const) {
      for (const field of Object.values(type!.getFields()).filter(({ name }) => !open.has(name))) {
        const variables = field.args.map(({ name, type }) => `$${name}: ${String(type)}`).join(', ');
        const args = field.args.map(({ name }) => `${name}: $${name}`).join(', ');
        const selection = isCompositeType(getNamedType(field.type)) ? '{ __typename }' : '';
        const query = `${keyword}${variables && `(${variables})`} { ${field.name}${args && `(${args})`} ${selection} }`;
        const values = Object.fromEntries(field.args.map(({ name, type }) => [name, sampleOf(type)]));
        answers[field.name] = codeOf(await server.ask(query, values));
      }
    }

    expect(Object.keys(answers).length).toBeGreaterThan(15);
    for (const [field, code] of Object.entries(answers))
      expect({ field, code }).toEqual({ field, code: 'UNAUTHENTICATED' });
  });
});

/** The least input that the schema admits; the guard must refuse before anything reads it. */
function sampleOf(type: GraphQLInputType): unknown {
  if (!isNonNullType(type)) return undefined;
  const inner = type.ofType;
  if (isListType(inner)) return [];
  if (isEnumType(inner)) return inner.getValues()[0]!.name;
  if (isInputObjectType(inner)) {
    const fields = Object.values(inner.getFields());
    if (inner.isOneOf) return { [fields[0]!.name]: 'sample' };
    return Object.fromEntries(fields.map((field) => [field.name, sampleOf(field.type)]));
  }
  return { Int: 1, Float: 1, Boolean: false, FloatColumn: [1] }[String(inner)] ?? 'sample';
}

function listOperations(server: RunningServer): Operation[] {
  const container = server.app.get(ModulesContainer);
  const discovery = new DiscoveryService(container);
  const scanner = new MetadataScanner();
  return [...discovery.getProviders(), ...discovery.getControllers()].flatMap(({ metatype }) => {
    if (typeof metatype !== 'function' || !metatype.prototype) return [];
    const prototype = metatype.prototype as Record<string, () => unknown>;
    return scanner.getAllMethodNames(prototype).flatMap((method) => {
      const operation = operationOf(metatype as Type, prototype[method]!, method);
      return operation ? [operation] : [];
    });
  });
}

function operationOf(owner: Type, handler: () => unknown, method: string): Operation | null {
  const access = (Reflect.getMetadata(ACCESS, handler) ?? Reflect.getMetadata(ACCESS, owner)) as Access | undefined;
  const kind = Reflect.getMetadata(RESOLVER_TYPE, handler) as string | undefined;
  if (kind === 'Query' || kind === 'Mutation' || kind === 'Subscription') {
    return { name: (Reflect.getMetadata(RESOLVER_NAME, handler) as string | undefined) ?? method, kind, access };
  }
  const verb = Reflect.getMetadata(METHOD_METADATA, handler) as number | undefined;
  if (verb === undefined) return null;
  const path = [Reflect.getMetadata(PATH_METADATA, owner), Reflect.getMetadata(PATH_METADATA, handler)].join('/');
  return {
    name: `${['GET', 'POST', 'PUT', 'DELETE', 'PATCH', 'ALL', 'OPTIONS', 'HEAD'][verb]} ${path}`,
    kind: 'route',
    access,
  };
}
