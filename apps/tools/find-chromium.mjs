// The browser journeys drive Debian's Chromium; this finds it, and installs it where that can be done without asking.
import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';

const PLACES = ['/usr/bin/chromium', '/usr/bin/chromium-browser', '/usr/bin/google-chrome'];

/** Path of an installed Chromium, or undefined. */
export function findChromium() {
  return [process.env.LIGAMENT_CHROMIUM, ...PLACES].find((place) => place && existsSync(place));
}

/** Path of Chromium, installed by apt when missing and this is root on a Debian system; otherwise says what to do. */
export function ensureChromium() {
  const found = findChromium();
  if (found) return found;
  if (process.getuid?.() === 0 && existsSync('/usr/bin/apt-get')) {
    console.log('Installing Chromium for the browser journeys …');
    spawnSync('apt-get', ['update'], { stdio: 'ignore' });
    spawnSync('apt-get', ['install', '-y', '--no-install-recommends', 'chromium'], {
      stdio: 'ignore',
    });
  }
  const installed = findChromium();
  if (!installed) {
    throw new Error(
      'The browser journeys need Chromium: apt-get install chromium, or name one in LIGAMENT_CHROMIUM.',
    );
  }
  return installed;
}
