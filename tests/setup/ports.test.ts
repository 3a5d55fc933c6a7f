import { createServer } from "node:net";
import { describe, expect, it } from "vitest";
import { findFreePort, isPortFree, readPort } from "../../scripts/setup/ports.mjs";

describe("ports", () => {
  it("passes over a port that is taken", async () => {
    const taken = createServer();
    const port = await new Promise<number>((resolve) =>
      taken.listen(0, "127.0.0.1", () => resolve((taken.address() as { port: number }).port)),
    );
    try {
      expect(await isPortFree(port)).toBe(false);
      expect(await findFreePort(port)).toBeGreaterThan(port);
      await expect(findFreePort(port, { tries: 1 })).rejects.toThrow(/No free port/);
    } finally {
      await new Promise((resolve) => taken.close(resolve));
    }
    expect(await isPortFree(port)).toBe(true);
  });

  it("reads PORT, and names what is wrong with it", () => {
    expect(readPort(undefined, 3000)).toBe(3000);
    expect(readPort("", 3000)).toBe(3000);
    expect(readPort("8081", 3000)).toBe(8081);
    for (const wrong of ["web", "0", "65536", "-1", "80.5"]) expect(() => readPort(wrong, 3000)).toThrow(/whole number/);
  });
});
