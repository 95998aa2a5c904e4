import { type Type } from '@nestjs/common';
import { Field, Int, ObjectType } from '@nestjs/graphql';
import { ApiError } from '../api-error.js';

/** Most nodes of one page. */
export const LARGEST_PAGE = 100;

@ObjectType()
export class PageInfo {
  @Field()
  readonly hasNextPage: boolean;
  @Field()
  readonly hasPreviousPage: boolean;
  @Field(() => String, { nullable: true })
  readonly startCursor: string | null;
  @Field(() => String, { nullable: true })
  readonly endCursor: string | null;
}

export interface Edge<T> {
  readonly cursor: string;
  readonly node: T;
}

export interface Connection<T> {
  readonly edges: Edge<T>[];
  readonly pageInfo: PageInfo;
  readonly totalCount: number;
}

/** The Relay connection types `<Name>Edge` and `<Name>Connection` of an object type. */
export function connectionOf<T>(name: string, node: () => Type<T>): Type<Connection<T>> {
  @ObjectType(`${name}Edge`)
  class EdgeType implements Edge<T> {
    @Field()
    readonly cursor: string;
    @Field(node)
    readonly node: T;
  }
  @ObjectType(`${name}Connection`)
  class ConnectionType implements Connection<T> {
    @Field(() => [EdgeType])
    readonly edges: EdgeType[];
    @Field(() => PageInfo)
    readonly pageInfo: PageInfo;
    @Field(() => Int)
    readonly totalCount: number;
  }
  return ConnectionType;
}

export interface Page {
  readonly limit: number;
  readonly offset: number;
}

function offsetAfter(after: string | null | undefined): number {
  if (!after) return 0;
  const offset = /^after:(\d{1,9})$/.exec(Buffer.from(after, 'base64url').toString('utf8'))?.[1];
  if (offset === undefined) throw new ApiError('BAD_USER_INPUT', 'This cursor is not one of ours.');
  return Number(offset);
}

/**
 * The rows that `first` and `after` ask for.
 *
 * @throws {ApiError} BAD_USER_INPUT for a page larger than 100, a negative one, or a foreign cursor
 */
export function pageOf(first: number | null | undefined, after: string | null | undefined, usual = 25): Page {
  const limit = first ?? usual;
  if (limit < 0 || limit > LARGEST_PAGE)
    throw new ApiError('BAD_USER_INPUT', `\`first\` lies between 0 and ${LARGEST_PAGE}.`);
  return { limit, offset: offsetAfter(after) };
}

/** A connection from one page of rows and the count of all. */
export function toConnection<T>(nodes: readonly T[], totalCount: number, page: Page): Connection<T> {
  const cursorAt = (i: number) => Buffer.from(`after:${page.offset + i + 1}`).toString('base64url');
  const edges = nodes.map((node, i) => ({ cursor: cursorAt(i), node }));
  return {
    edges,
    totalCount,
    pageInfo: {
      hasNextPage: page.offset + nodes.length < totalCount,
      hasPreviousPage: page.offset > 0,
      startCursor: edges[0]?.cursor ?? null,
      endCursor: edges.at(-1)?.cursor ?? null,
    },
  };
}
