import { unacceptable } from '../../http/failure';
import { COMMON_PASSWORDS } from './common-passwords';

/** What a guesser would try first for this very person. */
export interface PasswordContext {
  readonly name: string;
  readonly email: string;
  readonly siteName: string;
}

const PRODUCT = 'ligament';
const SHORTEST_NAME = 4;

/** Refuses a password that is easily guessed; its length has been checked by the contract. */
export function refuseWeakPassword(
  password: string,
  context: PasswordContext,
  field = 'password',
): void {
  const problem = weakness(password, context);
  if (problem) throw unacceptable('password.weak', problem, field);
}

/** Why a password is easily guessed, in words for the person choosing it; null when it is not. */
export function weakness(password: string, context: PasswordContext): string | null {
  const lower = password.normalize('NFC').toLowerCase();
  if (COMMON_PASSWORDS.has(lower) || isOneThingRepeated(lower)) {
    return 'This password is among the first that are guessed. Choose a sentence of your own.';
  }
  const letters = lettersAndDigits(lower);
  const found = guessable(context).find((word) => letters.includes(word));
  return found === undefined
    ? null
    : `Leave out “${found}”: names of people, the site and the product are guessed first.`;
}

/** Name, mail name, site and product, as they would stand inside a password. */
function guessable({ name, email, siteName }: PasswordContext): string[] {
  const mailName = email.split('@')[0] ?? '';
  const words = [name, mailName, siteName].flatMap((text) => [
    lettersAndDigits(text.toLowerCase()),
    ...text.toLowerCase().split(/[^\p{L}\p{N}]+/u),
  ]);
  return [PRODUCT, ...words.filter((word) => word.length >= SHORTEST_NAME && !EVERYDAY.has(word))];
}

/** Words that stand in a site's name and in any sentence. */
const EVERYDAY = new Set([
  'works',
  'plant',
  'site',
  'unit',
  'test',
  'north',
  'south',
  'east',
  'west',
]);

const lettersAndDigits = (text: string): string =>
  text.normalize('NFC').replaceAll(/[^\p{L}\p{N}]/gu, '');

/** `aaaaaaaaaaaaaaa`, `abcabcabcabcabc`: at most four characters over and over. */
const isOneThingRepeated = (text: string): boolean => /^(.{1,4}?)\1+$/u.test(text);
