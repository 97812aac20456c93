import { Stop } from "../../src/cli/io";
import { run } from "../../src/cli/run";

/** Runs the command line on files in memory: what it said, its exit code, and what it wrote. */
export async function commandLine(args: readonly string[], files: Readonly<Record<string, Uint8Array | string>>) {
  let out = "";
  let err = "";
  const written = new Map<string, Uint8Array>();
  const code = await run(args, {
    out: (text) => (out += text),
    err: (text) => (err += text),
    read: async (path) => {
      const file = files[path];
      if (file === undefined) throw new Stop(`There is no file ${path}.`);
      return typeof file === "string" ? new TextEncoder().encode(file) : file;
    },
    write: async (path, bytes, only) => {
      if (only === "new" && path in files) throw new Stop(`${path} is there already.`);
      written.set(path, bytes);
    },
  });
  return { code, out, err, written };
}
