import { canonicalJson, sha256Of } from './canonical-json.js';

describe('canonical JSON', () => {
  // RFC 8785, section 3.2.2 (input) and 3.2.3 (sorted output).
  it('gives the example of RFC 8785', () => {
    const input = `{
      "numbers": [333333333.33333329, 1E30, 4.50, 2e-3, 0.000000000000000000000000001],
      "string": "\\u20ac$\\u000F\\u000aA'\\u0042\\u0022\\u005c\\\\\\"\\/",
      "literals": [null, true, false]
    }`;
    expect(canonicalJson(JSON.parse(input))).toBe(
      '{"literals":[null,true,false],"numbers":[333333333.3333333,1e+30,4.5,0.002,1e-27],' +
        '"string":"€$\\u000f\\nA\'B\\"\\\\\\\\\\"/"}',
    );
  });

  it('refuses what is no number and what has no JSON text', () => {
    expect(() => canonicalJson({ D: Number.NaN })).toThrow();
    expect(() => canonicalJson(undefined)).toThrow(TypeError);
  });

  // FIPS 180-2, appendix B.1: SHA-256 of "abc".
  it('is hashed by SHA-256', () => {
    expect(sha256Of('abc')).toBe('ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad');
  });
});
