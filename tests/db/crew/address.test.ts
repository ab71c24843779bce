import http from "node:http";
import { afterEach, describe, expect, it } from "vitest";
import { addressOf, PEER_HEADER, watchPeers } from "@/lib/server/address";

const from = (headers: Record<string, string>) => (name: string) => headers[name];

describe("the address that tries are counted by", () => {
  it("is the connection's own, whatever the caller writes into x-forwarded-for", () => {
    expect(addressOf(from({ [PEER_HEADER]: "10.0.0.7", "x-forwarded-for": "1.2.3.4" }), false)).toBe("10.0.0.7");
  });

  it("is the one that the trusted proxy wrote, which is the last", () => {
    expect(addressOf(from({ [PEER_HEADER]: "10.0.0.1", "x-forwarded-for": "6.6.6.6, 1.2.3.4" }), true)).toBe("1.2.3.4");
  });

  it("is the same for one machine on both kinds of IP", () => {
    expect(addressOf(from({ [PEER_HEADER]: "::ffff:10.0.0.7" }), false)).toBe("10.0.0.7");
  });

  it("counts a whole IPv6 home as one", () => {
    // RFC 6177: a site gets at least a /64, four of the eight groups.
    const one = addressOf(from({ [PEER_HEADER]: "2001:db8:1:2::1" }), false);
    const two = addressOf(from({ [PEER_HEADER]: "2001:db8:1:2:aaaa:bbbb:cccc:dddd" }), false);
    const elsewhere = addressOf(from({ [PEER_HEADER]: "2001:db8:1:3::1" }), false);
    expect(one).toBe(two);
    expect(one).not.toBe(elsewhere);
  });
});

describe("a real request", () => {
  let server: http.Server | undefined;
  afterEach(() => server?.close());

  it("cannot set its own address", async () => {
    watchPeers();
    const seen = await new Promise<unknown>((resolve) => {
      server = http.createServer((request, response) => {
        resolve(request.headers[PEER_HEADER]);
        response.end();
      });
      server.listen(0, "127.0.0.1", () => {
        const address = server?.address();
        if (address === null || address === undefined || typeof address === "string") throw new Error("No port.");
        http.get({ port: address.port, host: "127.0.0.1", headers: { [PEER_HEADER]: "6.6.6.6" } });
      });
    });
    expect(seen).toBe("127.0.0.1");
  });
});
