/** A file that can't be read: `message` is a whole sentence, with what to do about it where something can be done. */
export class UnusableFile extends Error {
  override readonly name = "UnusableFile";
}
