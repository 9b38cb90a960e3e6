import { spawn } from 'node:child_process';
import { Plain, root } from './project.mjs';

/** The environment for tools: npm's own settings would make them behave differently under `npm start`. */
export function cleanEnv(extra = {}) {
  const env = {};
  for (const [key, value] of Object.entries(process.env)) {
    if (/^npm_/i.test(key) || key === 'NODE_ENV' || key === 'INIT_CWD') continue;
    env[key] = value;
  }
  return { ...env, ...extra };
}

/** Runs a command to its end; resolves with its exit code and, when captured, its output. */
export function run(command, args, options = {}) {
  const { capture = false, quiet = false, env = cleanEnv(), cwd = root, timeoutMs, ...rest } = options;
  return new Promise((resolve, reject) => {
    const stdio = capture || quiet ? ['ignore', 'pipe', 'pipe'] : ['ignore', 'inherit', 'inherit'];
    const child = spawn(command, args, { cwd, env, stdio, ...rest });
    let output = '';
    child.stdout?.on('data', (chunk) => (output += chunk));
    child.stderr?.on('data', (chunk) => (output += chunk));
    const timer = timeoutMs ? setTimeout(() => child.kill('SIGKILL'), timeoutMs) : null;
    child.on('error', reject);
    child.on('close', (code, signal) => {
      if (timer) clearTimeout(timer);
      resolve({ code: code ?? 1, signal, output });
    });
  });
}

/** Runs a command that must succeed; its output is shown only when it fails. */
export async function must(what, command, args, options = {}) {
  const { code, output } = await run(command, args, { quiet: true, ...options });
  if (code !== 0) throw new Plain(`${what} failed (exit ${code}).\n${output.trimEnd()}`);
  return output;
}

/** A script of ours in TypeScript, run by this same Node.js. */
export function tsArgs(file, ...args) {
  return ['--import', 'tsx', file, ...args];
}
