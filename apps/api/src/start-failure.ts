import { BrokenSetting } from './config';
import { DatabaseFailure } from './db/database-failures';

/** Words and exit code for a start that failed: one clear line, no stack, for everything a person can mend. */
export function explain(error: unknown): { readonly exitCode: number; readonly message: string } {
  if (error instanceof BrokenSetting) {
    return { exitCode: 78, message: `Ligament cannot start: setting ${error.message}.` };
  }
  if (error instanceof DatabaseFailure) {
    return { exitCode: 69, message: `Ligament cannot start: ${error.message}` };
  }
  const code = error instanceof Error && 'code' in error ? error.code : undefined;
  if (code === 'EADDRINUSE' && error instanceof Error) {
    const port = 'port' in error ? String(error.port) : '';
    return {
      exitCode: 69,
      message: `Ligament cannot start: port ${port} is already in use. Stop the other program, or choose another port with PORT=4301 npm start.`,
    };
  }
  if (code === 'EACCES' && error instanceof Error) {
    return {
      exitCode: 69,
      message: `Ligament cannot start: permission denied (${error.message}).`,
    };
  }
  const detail = error instanceof Error ? (error.stack ?? error.message) : String(error);
  return { exitCode: 70, message: `Ligament cannot start: ${detail}` };
}
