// Free loopback ports, found by opening them.
import { createServer } from "node:net";

/** Whether nothing listens on this port of this address. */
export function isPortFree(port, host = "127.0.0.1") {
  return new Promise((resolve) => {
    const probe = createServer();
    probe.once("error", () => resolve(false));
    probe.listen({ port, host, exclusive: true }, () => probe.close(() => resolve(true)));
  });
}

/** The first free port from `wanted` upwards; throws after `tries`. */
export async function findFreePort(wanted, { host = "127.0.0.1", tries = 50 } = {}) {
  for (let port = wanted; port < wanted + tries && port < 65536; port += 1) {
    if (await isPortFree(port, host)) return port;
  }
  throw new Error(`No free port between ${wanted} and ${wanted + tries - 1} on ${host}.`);
}

/** A port number from text such as the PORT variable; the fallback when nothing was given. */
export function readPort(text, fallback) {
  if (text === undefined || text === "") return fallback;
  const port = Number(text);
  if (!Number.isInteger(port) || port < 1 || port > 65535) {
    throw new RangeError(`PORT is "${text}". Give a whole number from 1 to 65535.`);
  }
  return port;
}
