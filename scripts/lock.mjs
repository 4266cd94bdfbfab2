import { createHash } from "node:crypto";
import { realpathSync } from "node:fs";
import net from "node:net";
import { setTimeout as sleep } from "node:timers/promises";

/**
 * Locks that one checkout's processes take from each other. A lock is a listening abstract socket of Linux: the kernel
 * gives it to one process only and takes it back when that process ends, however it ends, so it is never stale.
 * Whoever connects is told what its holder says about itself.
 */
const address = (name, folder) =>
  `\0evenglint-${name}-${createHash("sha256").update(realpathSync(folder)).digest("hex").slice(0, 24)}`;

export async function takeLock(name, folder, status = () => ({})) {
  const server = net.createServer((socket) => {
    socket.on("error", () => {}); // someone who asks and does not wait for the answer
    socket.end(JSON.stringify({ pid: process.pid, ...status() }));
  });
  const taken = await new Promise((resolve, reject) => {
    server.once("error", (error) => (error.code === "EADDRINUSE" ? resolve(false) : reject(error)));
    server.listen(address(name, folder), () => resolve(true));
  });
  if (!taken) return null;
  server.unref();
  return { release: () => new Promise((resolve) => server.close(() => resolve())) };
}

export async function waitForLock(name, folder, onWait = () => {}) {
  for (let turn = 0; ; turn++) {
    const lock = await takeLock(name, folder);
    if (lock) return lock;
    if (turn === 0) onWait();
    await sleep(300);
  }
}

export function askHolder(name, folder) {
  return new Promise((resolve) => {
    let answer = "";
    const socket = net.connect(address(name, folder));
    socket.setEncoding("utf8").setTimeout(2_000, () => socket.destroy());
    socket.on("data", (text) => {
      answer += text;
    });
    socket.on("error", () => {}); // nobody holds it: "close" follows
    socket.on("close", () => {
      try {
        resolve(JSON.parse(answer));
      } catch {
        resolve(null);
      }
    });
  });
}
