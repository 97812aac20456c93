/** One row of the table of functions (src/functions/functions.json), generated from the JSDoc above each cell function. */
export interface ParameterEntry {
  readonly name: string;
  readonly description: string;
  readonly optional: boolean;
  /** "matrix" takes one cell or a range, "scalar" one cell or value. */
  readonly dimensionality: "scalar" | "matrix";
  /** The fixed words it takes, where it takes fixed words. */
  readonly choices?: readonly string[];
}

export interface ExampleEntry {
  readonly formula: string;
  /** The value as text: a JSON number, text, boolean or rows. */
  readonly value: string;
}

export interface FunctionEntry {
  readonly name: string;
  readonly topic: string;
  readonly description: string;
  readonly parameters: readonly ParameterEntry[];
  readonly returns: string;
  readonly result: "scalar" | "matrix";
  /** Path of its help page, relative to where the add-in is served. */
  readonly helpPath: string;
  readonly examples: readonly ExampleEntry[];
  readonly questions: readonly string[];
  readonly cautions: readonly string[];
  /** The host hands the addresses of the arguments as one more argument, behind the last. */
  readonly takesAddresses: boolean;
}
