/** A chart of lines through points (x, y), drawn by the host from the cells that hold them. */
export interface ChartToWrite {
  readonly title: string;
  readonly xTitle: string;
  readonly yTitle: string;
  readonly series: readonly SeriesToWrite[];
  /** Where the x axis begins and ends; found by the host where left out. */
  readonly xFrom?: number;
  readonly xTo?: number;
  /** Number format along the x axis. */
  readonly xFormat?: string;
  /** The cells that it covers, by its upper left and lower right corner, counted from 0. */
  readonly from: { readonly row: number; readonly column: number };
  readonly to: { readonly row: number; readonly column: number };
  /** What is said of the picture to those who can't see it. */
  readonly description: string;
}

export interface SeriesToWrite {
  /** The cell that holds its name, `Plan!$A$1`, and what stands there. */
  readonly nameAt: string;
  readonly name: string;
  /** Where the numbers stand, `Chart!$A$2:$A$40`, and what stands there; a blank or a text is a gap. */
  readonly xAt: string;
  readonly yAt: string;
  readonly x: readonly (number | undefined)[];
  readonly y: readonly (number | undefined)[];
  /** Six hexadecimal digits. */
  readonly colour: string;
  /** Points. */
  readonly width: number;
  readonly dash?: "solid" | "dash" | "sysDot";
  readonly smooth?: boolean;
}
