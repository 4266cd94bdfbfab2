import { setTimeout as sleep } from "node:timers/promises";

export type Service = { ended: Promise<string>; stop(): Promise<void> };

/** What one start has running. Ended as a whole: by a signal, without npm, or when one part ends by itself. */
export class Services {
  private readonly running: Service[] = [];
  private stopping: Promise<void> | undefined;

  constructor(private readonly onStopping: () => void) {}

  /** Takes charge of a service. When it ends unasked, so does everything. */
  add = (service: Service): void => {
    this.running.push(service);
    void service.ended.then((ending) => {
      if (!this.stopping) this.fail(`${ending}. Everything is stopped; the logs are in .local/logs.`);
    });
  };

  /** Stops in the opposite order of starting, then leaves. Asked again, it waits for the first time to finish. */
  stop(exitCode: number): Promise<void> {
    this.stopping ??= this.stopAll().then(() => process.exit(exitCode));
    return this.stopping;
  }

  fail = (problem: unknown): void => {
    // While stopping, one part failing for want of another is no news.
    if (!this.stopping) console.error(problem);
    void this.stop(1);
  };

  stopOnSignals(): void {
    for (const signal of ["SIGINT", "SIGTERM", "SIGHUP"] as const) {
      process.on(signal, () => {
        if (!this.stopping) console.log("\nStopping");
        void this.stop(0);
      });
    }
    process.on("uncaughtException", this.fail);
    process.on("unhandledRejection", this.fail);
  }

  private async stopAll(): Promise<void> {
    this.onStopping();
    for (let service = this.running.pop(); service; service = this.running.pop()) {
      await service.stop().catch(console.error);
    }
  }
}

/** Resolves when the process that started ours has gone, as when only npm is killed and we would run on unseen. */
export async function parentGone(): Promise<void> {
  const parent = process.ppid;
  while (process.ppid === parent) await sleep(500, undefined, { ref: false });
}
