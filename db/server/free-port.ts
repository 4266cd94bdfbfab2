import net from "node:net";

/** Whether a server may listen on the port, on the loopback addresses that the name localhost can mean. */
export async function isPortFree(port: number): Promise<boolean> {
  for (const host of ["127.0.0.1", "::1"]) {
    const problem = await tryListening(port, host);
    if (problem === "EADDRINUSE" || problem === "EACCES") return false; // other problems: no such address here
  }
  return true;
}

/** A port that the system says is free. Another program may take it at any moment, so be ready to ask again. */
export async function freePort(): Promise<number> {
  const server = net.createServer();
  await new Promise<void>((resolve, reject) => {
    server.once("error", reject);
    server.listen(0, "127.0.0.1", resolve);
  });
  const address = server.address();
  await new Promise((resolve) => server.close(resolve));
  if (address === null || typeof address === "string") throw new Error("The system gave no port.");
  return address.port;
}

function tryListening(port: number, host: string): Promise<string | null> {
  return new Promise((resolve) => {
    const server = net.createServer();
    server.once("error", (error: NodeJS.ErrnoException) => resolve(error.code ?? "unknown"));
    server.listen({ port, host, exclusive: true }, () => server.close(() => resolve(null)));
  });
}
