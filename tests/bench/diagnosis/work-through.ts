import { fork } from "node:child_process";
import { fileURLToPath } from "node:url";
import type { Done, Task } from "./worker";

/**
 * Works tasks off on both cores, in the order of the list. Once the time is up
 * no more are begun: what was not reached is left out of the counts.
 *
 * @param until on performance.now()'s clock.
 */
export async function workThrough<T extends Task>(tasks: readonly T[], until: number, take: (task: T, done: Done) => void): Promise<void> {
  const waiting = [...tasks];
  const one = (): Promise<void> =>
    new Promise((resolve, reject) => {
      // A process, not a thread: Node 20 does not load TypeScript in threads.
      const worker = fork(fileURLToPath(new URL("./worker.ts", import.meta.url)), {
        execArgv: process.execArgv,
        serialization: "advanced",
      });
      let task = waiting.shift();
      const next = (): void => {
        if (task && performance.now() < until) worker.send(task);
        else worker.disconnect();
      };
      worker.on("message", (done: Done) => {
        take(task!, done);
        task = waiting.shift();
        next();
      });
      worker.on("error", reject);
      worker.on("exit", (code) => (code ? reject(new Error(`a worker ended with ${code}`)) : resolve()));
      next();
    });
  await Promise.all([one(), one()]);
}

/** One list of several, each as far along as the others all the time. */
export function inStep<T>(lists: readonly (readonly T[])[]): readonly T[] {
  return lists
    .flatMap((list) => list.map((task, place) => ({ task, along: (place + 0.5) / list.length })))
    .sort((a, b) => a.along - b.along)
    .map(({ task }) => task);
}
