import { leavesNoAdministrator } from './account-rules.js';

describe('the last administrator', () => {
  it.each([
    ['lose the role', { roles: ['EDITOR'] as const, disabled: false }],
    ['be disabled', { roles: ['ADMINISTRATOR'] as const, disabled: true }],
  ])('may not %s', (_, change) => {
    expect(leavesNoAdministrator('a', change, ['a'])).toBe(true);
    expect(leavesNoAdministrator('a', change, ['a', 'b'])).toBe(false);
  });

  it('may take on other roles', () => {
    expect(leavesNoAdministrator('a', { roles: ['ADMINISTRATOR', 'EDITOR'], disabled: false }, ['a'])).toBe(false);
  });

  it('is not anybody else', () => {
    expect(leavesNoAdministrator('b', { roles: ['EDITOR'], disabled: true }, ['a'])).toBe(false);
  });
});
