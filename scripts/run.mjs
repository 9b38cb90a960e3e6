import { spawn } from 'node:child_process';
import { installPackages } from './lib/install.mjs';
import { root } from './lib/project.mjs';
import { tsArgs } from './lib/run.mjs';

// Runs one of our TypeScript scripts, installing packages first when they are missing: node scripts/run.mjs FILE ARGS...

await installPackages();
const [file, ...args] = process.argv.slice(2);
const child = spawn(process.execPath, tsArgs(file, ...args), { cwd: root, stdio: 'inherit' });
child.on('exit', (code, signal) => process.exit(signal ? 1 : (code ?? 1)));
