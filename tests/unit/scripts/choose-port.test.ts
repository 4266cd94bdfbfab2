import { createServer } from "node:net";
import { describe, expect, it } from "vitest";
import { freePort, isPortFree } from "@/db/server/free-port";
import { choosePort } from "@/scripts/choose-port";

const taken =
  (...ports: number[]) =>
  async (port: number) =>
    !ports.includes(port);

describe("choosePort", () => {
  it("takes 3000 when nothing was asked for", async () => {
    expect(await choosePort(undefined, taken())).toBe(3000);
  });
  it("takes the next free one when 3000 is taken", async () => {
    expect(await choosePort(undefined, taken(3000, 3001))).toBe(3002);
  });
  it("takes no other than the one that was asked for", async () => {
    expect(await choosePort(8080, taken(3000))).toBe(8080);
    await expect(choosePort(8080, taken(8080))).rejects.toThrow("Port 8080 is taken by another program.");
  });
  it("gives up with a way out when a hundred ports are taken", async () => {
    await expect(choosePort(undefined, async () => false)).rejects.toThrow("Choose another: PORT=8080 npm start");
  });
});

describe("isPortFree", () => {
  // A program on one loopback address alone would still answer some who open http://localhost.
  it.each(["127.0.0.1", "::1", "0.0.0.0"])("sees a program that listens on %s", async (host) => {
    const port = await freePort();
    expect(await isPortFree(port)).toBe(true);
    const server = createServer();
    await new Promise<void>((resolve) => server.listen(port, host, resolve));
    expect(await isPortFree(port)).toBe(false);
    await new Promise((resolve) => server.close(resolve));
    expect(await isPortFree(port)).toBe(true);
  });
});
