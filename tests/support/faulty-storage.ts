import { createServer, request } from "node:http";
import type { AddressInfo } from "node:net";
import { afterAll, beforeAll, inject } from "vitest";
import { changeEnv } from "@/lib/env";

/** How a write goes wrong: the service answers that it is down, or it keeps the object and its answer is lost. */
type Fault = "refused" | "answer lost";

/**
 * Stands between the application and the S3 stand-in, and fails when told to. Call it below useDatabase, whose settings
 * it changes. The answer: lets a number of new objects through, then fails the next one, retries of it included.
 */
export function useFaultyStorage(): { failPutAfter(passing: number, fault: Fault): void; heal(): void } {
  let fault: Fault | undefined;
  let passing = 0;
  const seen = new Set<string>();
  const isFailing = (method: string | undefined, path: string) => {
    if (method !== "PUT" || !fault) return false;
    seen.add(path);
    return [...seen].indexOf(path) >= passing;
  };
  const server = createServer((incoming, outgoing) => {
    const { method, url: path = "/", headers } = incoming;
    const isFaulty = isFailing(method, path);
    if (isFaulty && fault === "refused") {
      incoming.resume();
      outgoing.writeHead(503).end();
      return;
    }
    const onward = request(new URL(path, inject("services").storage.S3_ENDPOINT), { method, headers }, (answer) => {
      if (isFaulty) {
        answer.resume().on("end", () => outgoing.destroy());
        return;
      }
      outgoing.writeHead(answer.statusCode ?? 502, answer.headers);
      answer.pipe(outgoing);
    });
    onward.on("error", () => outgoing.destroy());
    incoming.pipe(onward);
  });
  beforeAll(async () => {
    await new Promise<void>((resolve) => server.listen(0, "127.0.0.1", resolve));
    const { port } = server.address() as AddressInfo;
    changeEnv({ S3_ENDPOINT: `http://127.0.0.1:${port}` });
  });
  afterAll(() => {
    server.close();
    server.closeAllConnections();
  });
  return {
    failPutAfter(count, kind) {
      seen.clear();
      passing = count;
      fault = kind;
    },
    heal() {
      fault = undefined;
    },
  };
}
