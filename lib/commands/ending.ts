import { type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { setTimeout as sleep } from 'node:timers/promises';

const SIGNALS = ['SIGINT', 'SIGTERM', 'SIGHUP'] as const;

/** Asked to stop, by Ctrl-C, a signal, or the terminal's end. */
export class Interrupted extends Error {
  constructor(readonly signal: NodeJS.Signals) {
    super(`Stopped by ${signal}.`);
  }
}

let stopping: Interrupted | null = null;

/** Called before anything new is begun: once the command was asked to stop, nothing is. */
export function throwIfStopping(): void {
  if (stopping) throw stopping;
}

/** What has been started, to be ended in the reverse order, however the command ends. */
export class Ending {
  private readonly closers: (() => Promise<void>)[] = [];

  add(close: () => Promise<void>): void {
    this.closers.push(close);
  }

  async close(): Promise<void> {
    for (let close = this.closers.pop(); close; close = this.closers.pop()) {
      await close().catch((error: unknown) => process.stderr.write(`While stopping: ${String(error)}\n`));
    }
  }
}

/** How long a step that was under way may take to come to its end after what it used was closed. */
const LAST_STEP = 15_000;

/**
 * Runs the work, ends what it started, and answers the exit code: after an orderly stop by signal 0 where
 * `stopIsSuccess` (a server is meant to be stopped), else 130. Everything is ended within the children's own
 * time limits, so a second signal changes nothing.
 */
export async function untilEnded(
  work: (ending: Ending, interrupted: Promise<never>) => Promise<number>,
  stopIsSuccess: boolean,
): Promise<number> {
  const ending = new Ending();
  let interrupt: (error: Interrupted) => void = () => undefined;
  const interrupted = new Promise<never>((_, reject) => {
    interrupt = reject;
  });
  interrupted.catch(() => undefined); // Awaited below; without this a signal before that would count as unhandled.
  const heed = (signal: NodeJS.Signals): void => {
    stopping ??= new Interrupted(signal);
    interrupt(stopping);
  };
  for (const signal of SIGNALS) process.on(signal, heed);
  const parentWatch = watchParent(() => heed('SIGHUP'));
  // The terminal is gone with SIGHUP: writing to it must not end us before the children are.
  for (const stream of [process.stdout, process.stderr]) stream.on('error', () => undefined);
  const working = work(ending, interrupted);
  try {
    return await Promise.race([working, interrupted]);
  } catch (error) {
    if (!(error instanceof Interrupted)) throw error;
    process.stdout.write('\nStopping …\n');
    await ending.close();
    const settled = working.then(
      () => undefined,
      () => undefined, // It failed because what it used was closed.
    );
    await Promise.race([settled, sleep(LAST_STEP, undefined, { ref: false })]);
    return stopIsSuccess ? 0 : 130;
  } finally {
    clearInterval(parentWatch);
    await ending.close();
    for (const signal of SIGNALS) process.off(signal, heed);
  }
}

/** npm hands signals on to us, but not its own being killed: that is seen by our having another parent. */
function watchParent(gone: () => void): NodeJS.Timeout | undefined {
  if (process.env.npm_lifecycle_event === undefined) return undefined;
  const parent = process.ppid;
  return setInterval(() => {
    if (process.ppid !== parent) gone();
  }, 500).unref();
}

/** Ends a child that leads a process group, and whatever is in the group: asked first, then made to. */
export async function endGroup(child: ChildProcess, patience = 8000): Promise<void> {
  if (child.pid === undefined) return;
  const gone = child.exitCode !== null || child.signalCode !== null;
  if (!gone) {
    const exit = once(child, 'exit');
    signalGroup(child.pid, 'SIGTERM');
    await Promise.race([exit, sleep(patience, undefined, { ref: false })]);
  }
  signalGroup(child.pid, 'SIGKILL');
}

function signalGroup(pid: number, signal: NodeJS.Signals): void {
  try {
    process.kill(-pid, signal);
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code !== 'ESRCH') throw error; // Nobody is left in it.
  }
}
