import { describe, expect, it } from 'vitest';
import { emptyHeader, type HeaderValues } from './draft';
import { headerSchema } from './header-schema';

const whole: HeaderValues = {
  ...emptyHeader,
  first: { id: 'a', name: 'helium' },
  second: { id: 'b', name: 'methane' },
  method: 'closed tube',
  title: 'Invented',
  source: 'notebook 1',
};

const complaints = (values: HeaderValues) =>
  headerSchema.safeParse(values).error?.issues.map(({ path }) => path[0]) ?? [];

describe('the header of a series', () => {
  it('names everything that is missing', () => {
    expect(complaints(emptyHeader)).toEqual(['first', 'second', 'method', 'title', 'source']);
  });

  it('takes a substance only when it was chosen, not when its name was only typed', () => {
    expect(complaints({ ...whole, first: { id: '', name: 'helium' } })).toEqual(['first']);
  });

  it('refuses a pair of one substance', () => {
    expect(complaints({ ...whole, second: whole.first })).toEqual(['second']);
  });

  it('reads a common uncertainty in percent, with point or comma, or none', () => {
    expect(headerSchema.parse({ ...whole, commonPercent: '0,85' }).commonPercent).toBe(0.85);
    expect(headerSchema.parse(whole).commonPercent).toBeNull();
    expect(complaints({ ...whole, commonPercent: '0' })).toEqual(['commonPercent']);
    expect(complaints({ ...whole, commonPercent: 'small' })).toEqual(['commonPercent']);
  });
});
