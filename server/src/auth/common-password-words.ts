/**
 * Words that passwords are most often built from, and the words of this service and its trade. From general knowledge,
 * not from a list; variants (capitals, digits for letters, digits or signs added, repetition, runs of keys) are covered
 * by the rules that use it.
 */
export const COMMON_PASSWORD_WORDS: readonly string[] = [
  ...['password', 'passwort', 'passphrase', 'passcode', 'pass', 'secret', 'geheim', 'letmein', 'welcome', 'willkommen'],
  ...['administrator', 'admin', 'root', 'user', 'guest', 'login', 'master', 'access', 'default', 'changeme', 'change'],
  ...[
    'trustno1',
    'hello',
    'hallo',
    'iloveyou',
    'love',
    'monkey',
    'dragon',
    'sunshine',
    'princess',
    'shadow',
    'freedom',
  ],
  ...['whatever', 'football', 'baseball', 'soccer', 'hockey', 'killer', 'superman', 'batman', 'flower', 'butterfly'],
  ...[
    'cookie',
    'chocolate',
    'banana',
    'orange',
    'summer',
    'winter',
    'spring',
    'autumn',
    'january',
    'february',
    'march',
  ],
  ...['april', 'june', 'july', 'august', 'september', 'october', 'november', 'december', 'monday', 'tuesday'],
  ...['wednesday', 'thursday', 'friday', 'saturday', 'sunday', 'computer', 'internet', 'server', 'network', 'system'],
  ...['database', 'test', 'testing', 'demo', 'example', 'sample', 'temp', 'temporary', 'money', 'lucky', 'happy'],
  ...['family', 'friends', 'forever', 'angel', 'baby', 'purple', 'yellow', 'silver', 'golden', 'diamond', 'tiger'],
  ...['eagle', 'horse', 'correcthorsebatterystaple', 'correct', 'battery', 'staple', 'company', 'office', 'work'],
  ...['diffolio', 'diffusivity', 'diffusion', 'datasheet', 'sheet', 'correlation', 'researcher', 'modeller', 'editor'],
  ...['laboratory', 'science', 'physics', 'chemistry', 'gas', 'qwerty', 'qwertz', 'azerty', 'asdf', 'zxcv', '1234'],
];
