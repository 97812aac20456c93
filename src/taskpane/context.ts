import type { Port } from "../hosts/port";
import type { Argument, Invocation, Outcome } from "../sheet/invoke";
import type { Column } from "./column/readColumn";
import type { CutoffAnswer } from "./cutoff/answerCutoff";
import type { CutoffQuestion } from "./cutoff/question";
import type { Numbers } from "./numbers";
import type { Observable } from "./observable";
import type { Texts } from "./texts/en";

/** Calls a cell function by name, as a cell would; undefined where this build has no such function. */
export type Call = (name: string, given: readonly Argument[], invocation?: Invocation) => Outcome | undefined;

/** What the parts of the pane share. */
export interface PaneContext {
  readonly port: Port;
  readonly call: Call;
  readonly texts: Texts;
  readonly numbers: Numbers;
  /** The column of scores that the pane works on; undefined before one was selected. */
  readonly column: Observable<Column | undefined>;
  /** The address of the selection as it stands now, whatever is in it. */
  readonly selected: Observable<string | undefined>;
  readonly question: Observable<CutoffQuestion>;
  readonly answer: Observable<CutoffAnswer | undefined>;
}
