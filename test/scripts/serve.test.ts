import { mkdirSync, mkdtempSync, rmSync, symlinkSync, writeFileSync } from "node:fs";
import { connect } from "node:net";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { startServer } from "../../scripts/serve.mjs";

describe("the server", () => {
  const folder = mkdtempSync(join(tmpdir(), "weirmark-serve-"));
  const root = join(folder, "dist");
  let server: Awaited<ReturnType<typeof startServer>>;
  beforeAll(async () => {
    mkdirSync(join(root, "help"), { recursive: true });
    writeFileSync(join(folder, "secret.txt"), "secret");
    writeFileSync(join(root, "index.html"), "<p>start");
    writeFileSync(join(root, "taskpane.html"), "<p>pane");
    writeFileSync(join(root, "functions.json"), "{}");
    writeFileSync(join(root, "help/index.html"), "<p>help");
    symlinkSync(join(folder, "secret.txt"), join(root, "link.txt"));
    server = await startServer({ root });
  });
  afterAll(async () => {
    await server.close();
    rmSync(folder, { recursive: true });
  });

  /** A request as typed: fetch would tidy up the path before it leaves. */
  function rawRequest(line: string): Promise<string> {
    return new Promise((resolve, reject) => {
      const socket = connect(Number(new URL(server.address).port), "127.0.0.1");
      let answer = "";
      socket.on("data", (data) => (answer += String(data)));
      socket.on("end", () => resolve(answer));
      socket.on("error", reject);
      socket.write(`${line} HTTP/1.1\r\nHost: localhost\r\nConnection: close\r\n\r\n`);
    });
  }

  test.each([
    ["/", "text/html; charset=utf-8", "<p>start"],
    ["/help/", "text/html; charset=utf-8", "<p>help"],
    ["/functions.json", "application/json; charset=utf-8", "{}"],
    ["/index.html?v=1", "text/html; charset=utf-8", "<p>start"],
  ])("serves %s as %s", async (path, type, text) => {
    const answer = await fetch(server.address + path);
    expect(answer.status).toBe(200);
    expect(answer.headers.get("content-type")).toBe(type);
    expect(await answer.text()).toBe(text);
  });

  test.each([
    "/../secret.txt",
    "/%2e%2e/secret.txt",
    "/..%2fsecret.txt",
    "/help/../../secret.txt",
    "//etc/passwd",
    "/link.txt",
    "/index.html%00.txt",
    "/%",
    "/help",
    "/nothing.js",
  ])("leads nowhere but into its folder: %s", async (path) => {
    const answer = await rawRequest(`GET ${path}`);
    expect(answer).not.toContain("secret");
    expect(answer).toMatch(/^HTTP\/1\.1 404 /);
  });

  test("only reads", async () => {
    expect((await fetch(server.address, { method: "POST", body: "x" })).status).toBe(405);
    const head = await fetch(server.address, { method: "HEAD" });
    expect(head.status).toBe(200);
    expect(await head.text()).toBe("");
  });

  test("lets pages load nothing from elsewhere, but for the host's script on the host's page", async () => {
    const own = (await fetch(`${server.address}/`)).headers.get("content-security-policy")!;
    expect(own).toContain("default-src 'self'");
    expect(own).toContain("script-src 'self';");
    expect(own).not.toMatch(/unsafe-eval|https?:/);
    const host = (await fetch(`${server.address}/taskpane.html`)).headers.get("content-security-policy")!;
    expect(host).toContain("script-src 'self' https://appsforoffice.microsoft.com");
    expect(host).not.toContain("frame-ancestors");
  });

  test("fails where the port is taken", async () => {
    const port = Number(new URL(server.address).port);
    await expect(startServer({ root, port })).rejects.toMatchObject({ code: "EADDRINUSE" });
  });
});
