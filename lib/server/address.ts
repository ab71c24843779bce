import { subscribe } from "node:diagnostics_channel";
import type { IncomingMessage } from "node:http";
import type { Socket } from "node:net";

/** Written over at each request by this server itself, so a stranger cannot set it. */
export const PEER_HEADER = "x-coppertell-peer";

const holder = globalThis as typeof globalThis & { coppertellPeers?: boolean };

/**
 * Notes at each request which address its connection comes from. Next hands no socket to a handler, and fills
 * `x-forwarded-for` only where the caller did not write one, so that header alone proves nothing.
 */
export function watchPeers(): void {
  if (holder.coppertellPeers) return;
  holder.coppertellPeers = true;
  subscribe("http.server.request.start", (message) => {
    // Node's own message for this channel: https://nodejs.org/api/diagnostics_channel.html#http
    const { request, socket } = message as { request: IncomingMessage; socket: Socket };
    request.headers[PEER_HEADER] = socket.remoteAddress ?? "";
  });
}

/**
 * The address whose tries are counted together. Behind a trusted proxy it is the last one in `x-forwarded-for`, which
 * that proxy wrote; earlier ones are the caller's own words. An IPv6 home gets a /64, so that much counts as one.
 */
export function addressOf(header: (name: string) => string | null | undefined, trustProxy: boolean): string {
  const forwarded = trustProxy ? header("x-forwarded-for")?.split(",").at(-1)?.trim() : undefined;
  const address = (forwarded || header(PEER_HEADER) || "").toLowerCase().replace(/^::ffff:(?=\d+\.)/, "");
  if (!address.includes(":")) return address || "unknown";
  return `${wholeGroups(address).slice(0, 4).join(":")}::/64`;
}

/** An IPv6 address with its "::" filled in, eight groups. */
function wholeGroups(address: string): string[] {
  const [head = "", tail] = address.split("::");
  const before = head ? head.split(":") : [];
  const after = tail ? tail.split(":") : [];
  const gap = tail === undefined ? 0 : Math.max(0, 8 - before.length - after.length);
  return [...before, ...Array<string>(gap).fill("0"), ...after];
}
