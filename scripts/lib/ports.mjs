import net from "node:net";

/** True when nothing listens on this loopback port. */
export function isFree(port) {
  return new Promise((resolve) => {
    const server = net.createServer();
    server.once("error", () => resolve(false));
    server.listen({ port, host: "127.0.0.1", exclusive: true }, () => server.close(() => resolve(true)));
  });
}

/** The first free loopback port at or after `first`. */
export async function freePort(first) {
  for (let port = first; port < Math.min(first + 200, 65536); port += 1) {
    if (await isFree(port)) return port;
  }
  throw new Error(`No free port between ${first} and ${first + 199}.`);
}
