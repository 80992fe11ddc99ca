import { spawn } from 'node:child_process';
import { existsSync } from 'node:fs';
import { stackSettings } from './settings';

/** Runs one script with the settings that `npm start` would give it: `run-script.ts db/seed/seed.ts …`. */
if (existsSync('.env')) process.loadEnvFile('.env');
const settings = stackSettings('local', process.env, process.cwd());
const child = spawn(process.execPath, ['--import', 'tsx', ...process.argv.slice(2)], {
  env: { ...process.env, ...settings.env },
  stdio: 'inherit',
});
for (const signal of ['SIGINT', 'SIGTERM'] as const) process.on(signal, () => child.kill(signal));
child.on('exit', (code) => process.exit(code ?? 1));
