import { describe, expect, it } from '@jest/globals';
import { ApiError } from '../api-error.js';
import { LARGEST_PAGE, pageOf, toConnection } from './connection.js';

const codeOf = (work: () => unknown): string | undefined => {
  try {
    work();
  } catch (error) {
    return error instanceof ApiError ? error.code : 'another error';
  }
  return undefined;
};

describe('a page', () => {
  it('begins at the start and has 25 rows where nothing is said', () => {
    expect(pageOf(null, null)).toEqual({ limit: 25, offset: 0 });
    expect(pageOf(undefined, undefined, 100)).toEqual({ limit: 100, offset: 0 });
  });

  it('may be empty or as large as the largest, not larger nor negative', () => {
    expect(pageOf(0, null).limit).toBe(0);
    expect(pageOf(LARGEST_PAGE, null).limit).toBe(LARGEST_PAGE);
    expect(codeOf(() => pageOf(LARGEST_PAGE + 1, null))).toBe('BAD_USER_INPUT');
    expect(codeOf(() => pageOf(-1, null))).toBe('BAD_USER_INPUT');
  });

  it.each(['7', 'after:7', Buffer.from('after:-7').toString('base64url'), Buffer.from('7').toString('base64url')])(
    'refuses the foreign cursor %s',
    (cursor) => {
      expect(codeOf(() => pageOf(10, cursor))).toBe('BAD_USER_INPUT');
    },
  );
});

describe('a connection', () => {
  const ROWS = ['a', 'b', 'c', 'd', 'e'];
  const at = (first: number, after: string | null) => {
    const page = pageOf(first, after);
    return toConnection(ROWS.slice(page.offset, page.offset + page.limit), ROWS.length, page);
  };

  it.each([1, 2, 3, 5, 7])('gives every row once when read %i at a time', (first) => {
    const read: string[] = [];
    let after: string | null = null;
    let connection;
    do {
      connection = at(first, after);
      read.push(...connection.edges.map((edge) => edge.node));
      after = connection.pageInfo.endCursor;
    } while (connection.pageInfo.hasNextPage);
    expect(read).toEqual(ROWS);
  });

  it('leads on from the cursor of any row', () => {
    const { edges } = at(5, null);
    expect(at(5, edges[1]!.cursor).edges.map((edge) => edge.node)).toEqual(['c', 'd', 'e']);
  });

  it('tells what lies before and after', () => {
    expect(at(2, null).pageInfo).toMatchObject({ hasNextPage: true, hasPreviousPage: false });
    const last = at(2, at(3, null).pageInfo.endCursor);
    expect(last.pageInfo).toMatchObject({ hasNextPage: false, hasPreviousPage: true });
  });

  it('without rows has no cursors and still counts all', () => {
    const none = at(0, null);
    expect(none.pageInfo).toEqual({ hasNextPage: true, hasPreviousPage: false, startCursor: null, endCursor: null });
    expect(none.totalCount).toBe(5);
  });
});
