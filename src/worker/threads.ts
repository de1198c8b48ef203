import { createEndpoint, proxy, type Remote, transfer, wrap } from "comlink";
import type { ReadAnswer, ReaderTasks, ReadRequest } from "./reader-tasks.ts";
import type { SolverTasks } from "./solver-tasks.ts";

/** The reading was stopped by the user. */
export class Stopped extends Error {
  override readonly name = "Stopped";
}

/** The page's background threads: one solves and keeps the samples, one reads and can be stopped at any moment. */
export interface Threads {
  readonly solver: Remote<SolverTasks>;
  /**
   * Rejects with Stopped when the reading is stopped.
   * @param onShare told now and then which share is done, from 0 to 1
   */
  readonly read: (request: ReadRequest, onShare: (doneFrac: number) => void) => Promise<ReadAnswer>;
  /** Ends the reading thread, whatever it is doing, and starts a new one. */
  readonly stopReading: () => void;
}

export function startThreads(): Threads {
  const solver = wrap<SolverTasks>(new Worker(new URL("./solver-thread.ts", import.meta.url), { type: "module" }));
  let reader = startReader(solver);
  const stopReading = (): void => {
    reader.end();
    reader = startReader(solver);
  };
  return {
    solver,
    read: async (request, onShare) => {
      const { tasks, ended } = reader;
      const answer = await Promise.race([(await tasks).read(request, proxy(onShare)), ended]);
      // A damaged file may leave a library in disorder: the next file gets a fresh one.
      if (answer.outcome.issues.some(({ code }) => code === "broken-file")) stopReading();
      return answer;
    },
    stopReading,
  };
}

interface Reader {
  readonly tasks: Promise<Remote<ReaderTasks>>;
  readonly ended: Promise<never>;
  readonly end: () => void;
}

function startReader(solver: Remote<SolverTasks>): Reader {
  const worker = new Worker(new URL("./reader-thread.ts", import.meta.url), { type: "module" });
  const tasks = wrap<ReaderTasks>(worker);
  let refuse: (reason: Stopped) => void;
  const ended = new Promise<never>((_, reject) => {
    refuse = reject;
  });
  // Nobody may be reading when it ends.
  ended.catch(() => undefined);
  return {
    tasks: solver[createEndpoint]().then(async (port) => {
      await tasks.connect(transfer(port, [port]));
      return tasks;
    }),
    ended,
    end: () => {
      worker.terminate();
      refuse(new Stopped());
    },
  };
}
