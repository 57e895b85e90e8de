import { start } from './start';

// Exit codes follow sysexits(3): 78 a broken setting, 69 something needed is not available, 70 a fault of ours.
try {
  await start(process.env);
} catch (error) {
  const { exitCode, message } = (await import('./start-failure')).explain(error);
  console.error(message);
  process.exit(exitCode);
}
