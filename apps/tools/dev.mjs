// npm run dev: the API restarting on change (port 4310) behind the client's development server (port 4300).
import { spawn } from 'node:child_process';
import { fileURLToPath } from 'node:url';

const root = fileURLToPath(new URL('../../', import.meta.url));
const parts = [
  spawn(
    process.execPath,
    ['node_modules/tsx/dist/cli.mjs', 'watch', '--clear-screen=false', 'apps/api/src/main.ts'],
    {
      cwd: root,
      stdio: 'inherit',
      env: { ...process.env, PORT: '4310', LIGAMENT_PUBLIC_URL: 'http://localhost:4300' },
    },
  ),
  spawn(process.execPath, ['node_modules/@angular/cli/bin/ng.js', 'serve', '--port', '4300'], {
    cwd: root,
    stdio: 'inherit',
    env: { ...process.env, NG_CLI_ANALYTICS: 'false' },
  }),
];

let closing = false;
function closeAll(code) {
  if (closing) return;
  closing = true;
  for (const part of parts) part.kill('SIGTERM');
  process.exitCode = code;
}
for (const part of parts) part.on('exit', (code) => closeAll(code ?? 0));
process.on('SIGINT', () => closeAll(0));
process.on('SIGTERM', () => closeAll(0));
