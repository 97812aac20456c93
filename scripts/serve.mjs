// Serves dist/ at http://localhost:3000 and nothing else: `npm start`, or PORT=3001 node scripts/serve.mjs.
import { createReadStream, existsSync, realpathSync, statSync } from "node:fs";
import { createServer as createPlainServer } from "node:http";
import { createServer as createSecureServer } from "node:https";
import { dirname, extname, join, sep } from "node:path";
import { fileURLToPath, pathToFileURL } from "node:url";

const dist = join(dirname(fileURLToPath(import.meta.url)), "../dist");

const TYPES = {
  ".html": "text/html; charset=utf-8",
  ".js": "text/javascript; charset=utf-8",
  ".css": "text/css; charset=utf-8",
  ".json": "application/json; charset=utf-8",
  ".xml": "text/xml; charset=utf-8",
  ".svg": "image/svg+xml",
  ".png": "image/png",
  ".ico": "image/x-icon",
  ".txt": "text/plain; charset=utf-8",
  ".xlsx": "application/vnd.openxmlformats-officedocument.spreadsheetml.sheet",
};

// The pages load nothing from elsewhere. The one exception is the host's own script on the page that the host shows; that page
// must stay frameable, since the host on the web shows it in a frame.
const OWN_FILES =
  "default-src 'self'; style-src 'self' 'unsafe-inline'; img-src 'self' data: blob:; font-src 'self' data:; object-src 'none'; base-uri 'none'; form-action 'none'";
const HOST_SCRIPT = "https://appsforoffice.microsoft.com";

function contentPolicy(path) {
  return path.endsWith("/taskpane.html")
    ? `${OWN_FILES}; script-src 'self' ${HOST_SCRIPT}`
    : `${OWN_FILES}; script-src 'self'; frame-ancestors 'self'`;
}

/** The file that a request path names, or undefined where it names none inside `root`. */
function fileFor(root, url) {
  try {
    const path = decodeURIComponent(new URL(url, "http://localhost").pathname);
    if (path.includes("\0")) return undefined;
    let file = realpathSync(join(root, path));
    // Without the slash the links of a folder's page would start one folder too high.
    if (statSync(file).isDirectory() && path.endsWith("/")) file = realpathSync(join(file, "index.html"));
    // A link or an encoded ".." that leads out of the folder is no file of ours.
    return file.startsWith(realpathSync(root) + sep) && statSync(file).isFile() ? file : undefined;
  } catch {
    return undefined;
  }
}

function answer(root, request, response) {
  const send = (status, text) => {
    response.writeHead(status, { "Content-Type": TYPES[".txt"], "X-Content-Type-Options": "nosniff" });
    response.end(text);
  };
  if (request.method !== "GET" && request.method !== "HEAD") return send(405, "Only reading is possible here.\n");
  const file = fileFor(root, request.url ?? "/");
  if (file === undefined) return send(404, "There is no such file here.\n");
  response.writeHead(200, {
    "Content-Type": TYPES[extname(file)] ?? "application/octet-stream",
    "Content-Length": statSync(file).size,
    "Content-Security-Policy": contentPolicy(file.split(sep).join("/")),
    "X-Content-Type-Options": "nosniff",
    "Referrer-Policy": "no-referrer",
    "Cache-Control": "no-cache",
  });
  if (request.method === "HEAD") return response.end();
  createReadStream(file)
    .on("error", () => response.destroy())
    .pipe(response);
}

/**
 * Starts serving `root`; port 0 takes any free one. With `tls` ({key, cert}) over https.
 * @returns {Promise<{address: string, close: () => Promise<void>}>}
 */
export function startServer({ root = dist, port = 0, host = "127.0.0.1", tls } = {}) {
  const handler = (request, response) => answer(root, request, response);
  const server = tls ? createSecureServer(tls, handler) : createPlainServer(handler);
  return new Promise((resolve, reject) => {
    server.once("error", reject);
    server.listen(port, host, () => {
      const address = `${tls ? "https" : "http"}://localhost:${server.address().port}`;
      const close = () => new Promise((done) => (server.close(() => done()), server.closeAllConnections()));
      resolve({ address, close });
    });
  });
}

async function main() {
  const port = Number(process.env.PORT || 3000);
  if (!Number.isInteger(port) || port < 1 || port > 65535) throw new Error(`PORT must be a number from 1 to 65535.`);
  if (!existsSync(join(dist, "index.html"))) throw new Error("Nothing is built yet. Run: npm run build");
  try {
    const { address } = await startServer({ port, host: process.env.HOST || "127.0.0.1" });
    console.log(`Weirmark is at ${address}  (Ctrl+C ends it)`);
  } catch (failure) {
    if (failure.code === "EADDRINUSE")
      throw new Error(`Port ${port} is taken by another program. Choose another one: PORT=${port + 1} npm start`);
    if (failure.code === "EACCES") throw new Error(`Port ${port} may not be used by this account.`);
    throw failure;
  }
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? "").href)
  main().catch((failure) => {
    console.error(failure.message);
    process.exitCode = 1;
  });
