/** Spreads pieces of work over the machine's cores. */
import { availableParallelism } from "node:os";
import { Worker } from "node:worker_threads";
import { progress } from "./progress.js";

/**
 * Hands each of `tasks` to a worker of `file` as it becomes free and gathers the answers in order. A worker gets a task as a
 * message and answers with one.
 */
export async function overCores<Task, Answer>(
  file: URL,
  tasks: readonly Task[],
  what: string,
): Promise<Answer[]> {
  const answers: Answer[] = new Array(tasks.length);
  let next = 0;
  let done = 0;
  const serve = (worker: Worker): Promise<void> =>
    new Promise((resolve, reject) => {
      let current = -1;
      const hand = (): void => {
        current = next++;
        if (current < tasks.length) worker.postMessage(tasks[current]);
        else resolve();
      };
      worker.on("error", reject);
      worker.on("message", (answer: Answer) => {
        answers[current] = answer;
        progress(++done, tasks.length, what);
        hand();
      });
      hand();
    });
  const count = Math.min(availableParallelism(), tasks.length);
  const start = new URL("startWorker.mjs", import.meta.url);
  const workers = Array.from(
    { length: count },
    () => new Worker(start, { workerData: { file: file.href } }),
  );
  try {
    await Promise.all(workers.map(serve));
  } finally {
    await Promise.all(workers.map((worker) => worker.terminate()));
  }
  return answers;
}
