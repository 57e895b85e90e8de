// Our own list of common patterns (common practice; not taken from any published list): everyday first words of
// passwords, keyboard rows and number runs, drawn out to the least legal length the ways people do it.

const WORDS = [
  'password', 'passwort', 'passphrase', 'secret', 'letmein', 'welcome', 'admin', 'administrator', 'changeme',
  'default', 'master', 'login', 'signin', 'access', 'system', 'server', 'computer', 'internet', 'security', 'user',
  'guest', 'test', 'testing', 'demo', 'example', 'sample', 'temp', 'temporary', 'company', 'office', 'plant',
  'refinery', 'chemical', 'inspection', 'inspector', 'engineer', 'planner', 'auditor', 'pressure', 'vessel',
  'pipeline', 'ultrasonic', 'integrity', 'maintenance', 'operations', 'shutdown', 'turnaround', 'football',
  'baseball', 'basketball', 'soccer', 'hockey', 'monkey', 'dragon', 'tiger', 'lion', 'eagle', 'shadow', 'sunshine',
  'princess', 'superman', 'batman', 'starwars', 'pokemon', 'whatever', 'freedom', 'forever', 'iloveyou', 'lovely',
  'flower', 'butterfly', 'rainbow', 'purple', 'orange', 'yellow', 'silver', 'golden', 'diamond', 'summer', 'winter',
  'spring', 'autumn', 'january', 'february', 'march', 'april', 'june', 'july', 'august', 'september', 'october',
  'november', 'december', 'monday', 'tuesday', 'wednesday', 'thursday', 'friday', 'saturday', 'sunday', 'michael',
  'jennifer', 'jessica', 'ashley', 'daniel', 'charlie', 'thomas', 'jordan', 'hunter', 'ginger', 'pepper', 'cookie',
  'chocolate', 'cheese', 'coffee', 'banana', 'london', 'manchester', 'liverpool', 'chelsea', 'arsenal', 'america',
  'scotland', 'ireland', 'mustang', 'ferrari', 'porsche', 'mercedes', 'harley', 'yamaha', 'trustno', 'killer',
  'hello', 'helloworld', 'nothing', 'blahblah', 'qwerty', 'qwertz', 'azerty', 'asdfgh', 'zxcvbn', 'qazwsx', 'abcdef',
  'abc', 'aaa', 'zzz', 'xxx',
] as const;

const KEYBOARD_ROWS = [
  'qwertyuiop', 'qwertyuiopasdfghjklzxcvbnm', 'asdfghjkl', 'zxcvbnm', 'qwertzuiop', 'azertyuiop', '1234567890',
  '0987654321', '12345678', '123456789', '0123456789', 'qazwsxedcrfvtgbyhnujmikolp', '1qaz2wsx3edc4rfv', 'q1w2e3r4t5y6u7i8',
  '1q2w3e4r5t6y7u8i', 'abcdefghijklmnopqrstuvwxyz', 'zyxwvutsrqponmlkjihgfedcba', '147258369', '741852963', '112233445566778899',
] as const;

const ENDINGS = [
  '123456789012345', '1234567890', '123456789', '12345678', '1234567', '123456', '12345', '1234', '123', '1', '!', '!!!',
  '2020', '2021', '2022', '2023', '2024', '2025', '2026', '2027', '2026!', '123!', '123456!', '000000', '111111', '654321',
] as const;

export const LEAST_LENGTH = 15;

function* patterns(): Generator<string> {
  for (const word of WORDS) {
    for (const ending of ENDINGS) {
      yield word + ending;
      yield word + word + ending;
      yield repeated(word) + ending;
    }
    yield repeated(word);
    for (const follower of ['password', 'secret', 'login', 'welcome', 'forever', 'qwerty', 'letmein']) {
      for (const ending of ['', '1', '12', '123', '1234', '12345', '!']) yield word + follower + ending;
    }
  }
  for (const row of KEYBOARD_ROWS) {
    for (const other of [...KEYBOARD_ROWS, ...ENDINGS, '']) {
      yield row + other;
      yield repeated(row).slice(0, LEAST_LENGTH) + other;
    }
  }
}

/** A word set end to end until it is long enough. */
const repeated = (word: string): string => word.repeat(Math.ceil(LEAST_LENGTH / word.length));

/** Common passwords of legal length, lower case. */
export const COMMON_PASSWORDS: ReadonlySet<string> = new Set(
  [...patterns()].filter((password) => password.length >= LEAST_LENGTH),
);
