import { existsSync, openSync, readFileSync, rmSync, writeSync, closeSync } from 'node:fs';
import { join } from 'node:path';
import { dataPath, Plain } from './project.mjs';

/** The moment a process began, in clock ticks since boot: tells a process from a later one with the same number. */
function startedAt(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    return stat.slice(stat.lastIndexOf(')') + 2).split(' ')[19] ?? null;
  } catch {
    return null;
  }
}

/**
 * Says that this process runs `name` in this folder, so that a second run does not stop the first one's database.
 * A file left by a killed run is taken over. Returns the function that ends it.
 */
export function claim(name) {
  const file = join(dataPath(), `${name}.pid`);
  if (existsSync(file)) {
    const [pid, began] = readFileSync(file, 'utf8').trim().split(' ');
    if (pid && startedAt(pid) !== null && startedAt(pid) === began && Number(pid) !== process.pid) {
      throw new Plain(`Tankmark already runs here ("${name}", process ${pid}). Stop that one first.`);
    }
    rmSync(file, { force: true });
  }
  let handle;
  try {
    handle = openSync(file, 'wx', 0o600);
  } catch {
    throw new Plain(`Another run of "${name}" has just begun here.`);
  }
  writeSync(handle, `${process.pid} ${startedAt(process.pid) ?? ''}\n`);
  closeSync(handle);
  return () => rmSync(file, { force: true });
}
