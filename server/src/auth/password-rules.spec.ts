import { LONGEST_PASSWORD, passwordRefusal, SHORTEST_PASSWORD } from './password-rules.js';

const CONTEXT = ['Rosalind Ostrander', 'r.ostrander@laboratory-h.example'];

describe('a new password', () => {
  it.each([
    ['a sentence', 'the tube was left in the bath too long'],
    ['random letters', 'xkjwpqzrtmvb'],
    ['random signs', '%)=(/&§"!?_:;°'],
    ['letters of other alphabets', 'длинная фраза на кириллице'],
    ['emoji and blanks', ' 🧪 otter gravel 🫧 mosaic '],
    ['64 characters', 'Vx9'.concat('mosaic-gravel-otter-lantern-quiet-harbour-seven-violet-plumbing')],
    ['128 characters', 'mosaic gravel otter lantern quiet harbour seven violet plumbing '.repeat(2)],
    ['a common word among others', 'password of the green pelican'],
  ])('may be %s', (_, password) => {
    expect(passwordRefusal(password, CONTEXT)).toBeNull();
  });

  it(`has ${SHORTEST_PASSWORD} characters at least and ${LONGEST_PASSWORD} at most, counted as people count them`, () => {
    expect(passwordRefusal('gravelotter', CONTEXT)).toMatch(/at least 12/);
    expect(passwordRefusal('🧪🫧🦦🪨🧭⛵🏮🪵', CONTEXT)).toMatch(/at least 12/);
    expect(passwordRefusal('gravelotter '.repeat(22), CONTEXT)).toMatch(/at most 256/);
  });

  it.each([
    'password1234',
    'Password123!',
    'P@ssw0rd2026!',
    'PASSWORDPASSWORD',
    'aaaaaaaaaaaaaaaa',
    'abcabcabcabcabc',
    '123456789012',
    '098765432109',
    'qwertyuiop123',
    'qwertzuiopasdf',
    'zyxwvutsrqponm',
    'letmein12345',
    'iloveyou2026',
    'welcome2026!!',
    'Administrator1',
    'Diffolio2026!',
    'd1ff0l10d1ff0l10',
    'diffusivity#1',
    'summer-winter1',
    'changeme-please'.slice(0, 12),
    'ostrander2026',
    'RosalindOstrander',
    'laboratory-h1',
  ])('is not %s, which is guessed first', (password) => {
    expect(passwordRefusal(password, CONTEXT)).toMatch(/guessed first/);
  });
});
