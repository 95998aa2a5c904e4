import { parse } from 'graphql';
import { describe, expect, it } from 'vitest';
import { codeExample, EXAMPLE_QUERY, LANGUAGES, statesInside, type ExampleRequest } from './code-examples';

const request: ExampleRequest = {
  origin: 'http://127.0.0.1:4280',
  code: 'DS-0001',
  number: '2.1',
  temperatures: [313.15, 400],
  pressure: 101_325,
};

describe('code for the sheet at hand', () => {
  it.each(LANGUAGES)('names sheet, version and states, and takes the key from the environment: %s', (language) => {
    const text = codeExample(language, request);
    for (const part of ['http://127.0.0.1:4280/graphql', 'DS-0001', '2.1', '313.15', '101325', 'DIFFOLIO_KEY'])
      expect(text).toContain(part);
  });

  it('asks one query that can be parsed', () => {
    expect(parse(EXAMPLE_QUERY).definitions).toHaveLength(1);
  });

  it('sends a body that is JSON', () => {
    const body = /<<'END'\n([\s\S]*)\nEND$/.exec(codeExample('curl', request))?.[1] ?? '';
    expect(JSON.parse(body)).toMatchObject({
      variables: { code: 'DS-0001', number: '2.1', T: [313.15, 400], P: [101_325] },
    });
  });

  it('asks at round temperatures inside the range', () => {
    expect(
      statesInside({
        temperatureMinimum: 283.15,
        temperatureMaximum: 448.15,
        pressureMinimum: 1e3,
        pressureMaximum: 4e5,
      }),
    ).toEqual({ temperatures: [325, 405], pressure: 101_325 });
    expect(
      statesInside({ temperatureMinimum: 298, temperatureMaximum: 299, pressureMinimum: 2e5, pressureMaximum: 4e5 }),
    ).toEqual({ temperatures: [298.25, 298.75], pressure: 2e5 });
  });
});
