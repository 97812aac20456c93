// `npm run start:excel`: serves dist over https and loads the add-in into desktop Excel, where there is one.
// The vendor's tool says "platform not supported" on Linux and still exits 0, so the word comes from here.
import { spawnSync } from "node:child_process";
import { existsSync } from "node:fs";
import { dirname, join } from "node:path";
import { fileURLToPath, pathToFileURL } from "node:url";
import { startServer } from "./serve.mjs";

const project = join(dirname(fileURLToPath(import.meta.url)), "..");
const manifest = join(project, "dist/manifest.xml");
const PORT = 3000;

/** What to do on a system without desktop Excel; undefined where there is one to start. */
export function adviceFor(platform) {
  if (platform === "win32" || platform === "darwin") return undefined;
  return [
    "There is no desktop Excel on this system, so there is nothing to load the add-in into.",
    "- To try Weirmark here: npm start, then open the trial page in a browser.",
    "- To use it in Excel on the web: build with WEIRMARK_ORIGIN=https://your.address npm run build, serve dist/ there,",
    "  then in Excel choose Add-ins, More Add-ins, My Add-ins, Upload My Add-in and give it dist/manifest.xml.",
  ].join("\n");
}

async function main() {
  const advice = adviceFor(process.platform);
  if (advice) throw new Error(advice);
  if (!existsSync(manifest)) throw new Error("dist/manifest.xml is not there. Run: npm run build");
  // Makes a certificate for localhost that this account trusts, on the first run; it may ask for leave.
  const { default: certificates } = await import("office-addin-dev-certs");
  const tls = await certificates.getHttpsServerOptions();
  const { address, close } = await startServer({ port: PORT, tls });
  console.log(`The add-in is served at ${address}. Ctrl+C ends it and takes the add-in out of Excel again.`);
  devSettings("sideload", manifest, "desktop", "--app", "Excel");
  process.on("SIGINT", () => {
    devSettings("clear", manifest);
    void close().then(() => process.exit(0));
  });
}

function devSettings(...args) {
  const tool = join(project, "node_modules/office-addin-dev-settings/cli.js");
  const { status } = spawnSync(process.execPath, [tool, ...args], { stdio: "inherit" });
  if (status !== 0)
    console.error(`office-addin-dev-settings ${args[0]} ended with ${status}; its message stands above.`);
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? "").href)
  main().catch((failure) => {
    console.error(
      failure.code === "EADDRINUSE" ? `Port ${PORT} is taken by another program: end it first.` : failure.message,
    );
    process.exitCode = 1;
  });
