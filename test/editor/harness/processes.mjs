// Every process that a run starts, each the leader of a group of its own, so that nothing outlives the run: not
// after a failure, not after Ctrl+C, not after a timeout.
import { spawn, spawnSync } from 'node:child_process';
import { setTimeout as wait } from 'node:timers/promises';

const groups = new Set();
const graceMs = 3000;

function signal(pid, name) {
  try {
    process.kill(-pid, name);
    return true;
  } catch {
    return false;
  }
}

/** To be ended with the run; `pid` must lead a process group. */
export function own(pid) {
  groups.add(pid);
}

export function start(command, args, options = {}) {
  const child = spawn(command, args, { ...options, detached: true });
  if (child.pid !== undefined) own(child.pid);
  return child;
}

/** Asks the group to end, then makes it. */
export async function end(pid) {
  signal(pid, 'SIGTERM');
  const deadline = Date.now() + graceMs;
  while (Date.now() < deadline && signal(pid, 0)) await wait(50);
  signal(pid, 'SIGKILL');
  groups.delete(pid);
}

export async function endAll() {
  await Promise.all([...groups].map(end));
}

process.on('exit', () => {
  for (const pid of groups) signal(pid, 'SIGKILL');
});
for (const [name, code] of [
  ['SIGINT', 130],
  ['SIGTERM', 143],
  ['SIGHUP', 129],
]) {
  process.on(name, () => process.exit(code));
}

/** Runs a short command to its end and returns what it printed. Its words are shown only when it fails. */
export function output(command, args, options = {}) {
  const done = spawnSync(command, args, { encoding: 'utf8', maxBuffer: 64_000_000, ...options });
  if (done.status === 0) return done.stdout;
  const why = done.error?.message ?? `${done.stdout ?? ''}${done.stderr ?? ''}`.trim();
  throw new Error(`${command} ${args.join(' ')} failed:\n${why}`);
}

/** Fails when `promise` has not settled in time; `what` completes the sentence. */
export async function within(ms, what, promise) {
  let timer;
  const late = new Promise((_, reject) => {
    timer = setTimeout(() => reject(new Error(`${what} took longer than ${ms / 1000} s`)), ms);
  });
  try {
    return await Promise.race([promise, late]);
  } finally {
    clearTimeout(timer);
  }
}
