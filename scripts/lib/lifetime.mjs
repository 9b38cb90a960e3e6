import { Plain } from './project.mjs';

const ppidCheckMs = 1_000;

/**
 * Runs a program that owns other processes: whatever ends it (Ctrl-C, SIGTERM, a failure, npm's death, a child's death),
 * everything registered with `onEnd` is undone in reverse order, once.
 */
export async function lifetime(main) {
  const undo = [];
  let ending = null;
  const end = (code) => {
    ending ??= (async () => {
      for (const step of undo.reverse()) {
        try {
          await step();
        } catch (error) {
          process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`);
        }
      }
      process.exit(code);
    })();
    return ending;
  };
  process.on('SIGINT', () => void end(0));
  process.on('SIGTERM', () => void end(0));
  process.on('SIGHUP', () => void end(0));
  process.on('disconnect', () => void end(0));
  const parent = process.ppid;
  setInterval(() => {
    if (process.ppid !== parent) void end(0);
  }, ppidCheckMs).unref();
  try {
    await main({ onEnd: (step) => void undo.push(step), end });
  } catch (error) {
    if (ending) return;
    process.stderr.write(`${error instanceof Plain ? error.message : (error?.stack ?? error)}\n`);
    await end(1);
  }
}
