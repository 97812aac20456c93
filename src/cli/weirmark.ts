import { readFile, stat, writeFile } from "node:fs/promises";
import { Stop, type Io } from "./io";
import { run } from "./run";

const MOST_BYTES = 512 * 2 ** 20;

const io: Io = {
  out: (text) => void process.stdout.write(text),
  err: (text) => void process.stderr.write(text),
  read: (path) => (path === "-" ? readStandardInput() : readPath(path)),
  write: writePath,
};

async function readPath(path: string): Promise<Uint8Array> {
  try {
    const { size } = await stat(path);
    if (size > MOST_BYTES) throw new Stop(`${path} has ${(size / 2 ** 20).toFixed(0)} MB; up to 512 MB are read.`);
    return await readFile(path);
  } catch (failure) {
    if (failure instanceof Stop) throw failure;
    const { code, message } = failure as NodeJS.ErrnoException;
    if (code === "ENOENT") throw new Stop(`There is no file ${path}.`);
    if (code === "EISDIR") throw new Stop(`${path} is a folder, not a file.`);
    if (code === "EACCES" || code === "EPERM") throw new Stop(`${path} may not be read.`);
    throw new Stop(`${path} can't be read (${message}).`);
  }
}

async function writePath(path: string, bytes: Uint8Array, only?: "new"): Promise<void> {
  try {
    await writeFile(path, bytes, { flag: only === "new" ? "wx" : "w" });
  } catch (failure) {
    const { code, message } = failure as NodeJS.ErrnoException;
    if (code === "EEXIST")
      throw new Stop(`${path} is there already: give another name, or --replace to write over it.`);
    if (code === "ENOENT") throw new Stop(`${path} can't be written: there is no such folder.`);
    if (code === "EISDIR") throw new Stop(`${path} is a folder, not a file.`);
    if (code === "EACCES" || code === "EPERM" || code === "EROFS") throw new Stop(`${path} may not be written.`);
    throw new Stop(`${path} can't be written (${message}).`);
  }
}

async function readStandardInput(): Promise<Uint8Array> {
  const pieces: Buffer[] = [];
  let size = 0;
  for await (const piece of process.stdin) {
    pieces.push(piece as Buffer);
    if ((size += (piece as Buffer).length) > MOST_BYTES) throw new Stop("Standard input is longer than 512 MB.");
  }
  return Buffer.concat(pieces);
}

// Whoever reads the output may stop early (`weirmark … | head`): no fault of this program.
process.stdout.on("error", (failure: NodeJS.ErrnoException) => {
  if (failure.code !== "EPIPE") throw failure;
  process.exit();
});

void run(process.argv.slice(2), io).then((code) => {
  process.exitCode = code;
});
