import { addressOf, networkOf, pauseAfter, POLICIES } from './throttle-rules.js';

describe('the pause after failed attempts', () => {
  it('on one account from one network begins with the fifth failure, doubles, and ends at a quarter of an hour', () => {
    const pauses = Array.from({ length: 17 }, (_, i) => pauseAfter(i + 1, POLICIES.pair));
    expect(pauses).toEqual([0, 0, 0, 0, 1, 2, 4, 8, 16, 32, 64, 128, 256, 512, 900, 900, 900]);
  });

  it('on one account from everywhere allows a hundred failures an hour', () => {
    expect(pauseAfter(99, POLICIES.account)).toBe(0);
    expect(pauseAfter(100, POLICIES.account)).toBe(3600);
  });

  it('of one address begins with the twentieth failure and never exceeds a minute', () => {
    expect([19, 20, 21, 26, 10_000].map((failures) => pauseAfter(failures, POLICIES.address))).toEqual([
      0, 1, 2, 60, 60,
    ]);
  });
});

describe('the network of an address', () => {
  // Addresses of RFC 5737 and RFC 3849, kept for documentation.
  it.each([
    ['203.0.113.77', '203.0.113'],
    ['::ffff:203.0.113.77', '203.0.113'],
    ['2001:db8:12:34:56:78:9a:bc', '2001:db8:12:34'],
    ['2001:db8::1', '2001:db8:0:0'],
    ['2001:0db8:0000:0000:0000:0000:0000:0001', '2001:db8:0:0'],
    ['::1', '0:0:0:0'],
    ['fe80::1%eth0', 'fe80:0:0:0'],
  ])('%s is %s', (address, network) => {
    expect(networkOf(address)).toBe(network);
  });

  it('is the address itself for IPv4, where the address counts alone', () => {
    expect(addressOf('::ffff:203.0.113.77')).toBe('203.0.113.77');
    expect(addressOf('2001:db8::1')).toBe(addressOf('2001:db8::2'));
  });
});
