import { readFileSync } from "node:fs";
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
      if (!this.stopping) this.fail(`${ending}\nEverything is stopped, since a part of it has ended.`);
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

/**
 * Resolves when npm, which started us through a shell, has gone: when it alone is killed, nobody would see us run on.
 * A shell that waits for us stays then, so its parent is watched too.
 */
export async function npmGone(): Promise<void> {
  const before = ancestors();
  while (ancestors() === before) await sleep(500, undefined, { ref: false });
}

function ancestors(): string {
  try {
    const [, name = "", parent = ""] =
      /\((.*)\) \S (\d+)/.exec(readFileSync(`/proc/${process.ppid}/stat`, "utf8")) ?? [];
    return name.endsWith("sh") ? `${process.ppid} of ${parent}` : String(process.ppid);
  } catch {
    return "none";
  }
}
