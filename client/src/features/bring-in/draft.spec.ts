import { describe, expect, it } from 'vitest';
import { type Draft, emptyDraft, readAgain, tableOf, withMapping, withTable } from './draft';

const TABLE = 'T / K\tP / kPa\tD / (cm²/s)\n298\t101\t0.12\n308\t101\t1.3';

const decided: Draft = {
  ...emptyDraft(),
  text: TABLE,
  decisions: { 'DECIMAL_SHIFT:3:2': 'READ_AS', 'UNIT_GUESSED::0': 'KEEP', FORMULA: 'KEEP' },
};

describe('the draft of a series that is brought in', () => {
  it('has no table until something is pasted, sent or typed', () => {
    expect(tableOf(emptyDraft())).toBeNull();
    expect(tableOf(decided)).toEqual({ text: TABLE });
  });

  it('keeps what was decided about rows that read as before', () => {
    const { decisions } = withTable(decided, { text: TABLE.replace('298', '299') });
    expect(decisions).toEqual(decided.decisions);
  });

  it('asks again about a row that was changed', () => {
    const { decisions } = withTable(decided, { text: TABLE.replace('1.3', '0.13') });
    expect(decisions).toEqual({ 'UNIT_GUESSED::0': 'KEEP', FORMULA: 'KEEP' });
  });

  it('asks everything again under another header or in another way', () => {
    expect(withTable(decided, { text: TABLE.replace('T / K', 'T / °C') }).decisions).toEqual({});
    expect(withTable(decided, { way: 'TYPE' }).decisions).toEqual({});
  });

  it('asks again about a column that is meant otherwise, and about nothing else', () => {
    const { decisions } = withMapping(decided, null, 2);
    expect(decisions).toEqual({ 'UNIT_GUESSED::0': 'KEEP', FORMULA: 'KEEP' });
  });

  it('is understood anew when it is read in another way', () => {
    expect(readAgain(decided, { decimal: ',' })).toMatchObject({ decimal: ',', mapping: null, decisions: {} });
  });
});
