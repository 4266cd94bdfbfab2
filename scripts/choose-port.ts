import { isPortFree } from "../db/server/free-port";

const USUAL_PORT = 3000;
const PORTS_TRIED_MAX = 100;

export class PortTakenError extends Error {}

/** The port that was asked for, or else 3000 or the next one that is free. Throws when the one asked for is taken. */
export async function choosePort(wanted: number | undefined, isFree = isPortFree): Promise<number> {
  if (wanted !== undefined) {
    if (await isFree(wanted)) return wanted;
    throw new PortTakenError(
      wanted < 1024
        ? `Port ${wanted} is taken, or not open to this user. Choose one from 1024 up, for example: PORT=3100 npm start`
        : `Port ${wanted} is taken by another program. Stop that program, or choose another port: PORT=${anotherThan(wanted)} npm start`,
    );
  }
  for (let port = USUAL_PORT; port < USUAL_PORT + PORTS_TRIED_MAX; port++) {
    if (await isFree(port)) return port;
  }
  throw new PortTakenError(
    `Ports ${USUAL_PORT} to ${USUAL_PORT + PORTS_TRIED_MAX - 1} are all taken. Choose another: PORT=8080 npm start`,
  );
}

function anotherThan(port: number): number {
  return port < 65_535 ? port + 1 : USUAL_PORT;
}
