import { passRates } from "../../plot/passRates";
import { parseAddress } from "../../sheet/address";
import type { Cell } from "../../sheet/cell";
import type { PaneContext } from "../context";
import { afterPaint } from "../afterPaint";
import { element, fill } from "../dom/element";
import { fold } from "../dom/part";
import { rangeField } from "../dom/rangeField";
import { figure, table } from "../dom/table";
import { listed } from "../column/listed";
import { pictureFigure, type DrawnPicture } from "../picture/pictureFigure";
import { hasSheet } from "../target/hasSheet";
import { formulaChooser } from "../target/formulaChooser";
import { askPassRates, groupRates, groupsAddress, passRatesFormula, type GroupRate } from "./passRatesOf";

/** Whether the mark hits one group harder than another. */
export function groupsView(context: PaneContext): HTMLElement {
  const { texts, numbers, call, port, answer } = context;
  let picked = "";
  let turn = 0;
  const words = element("div", { "aria-live": "polite" });
  const picture = pictureFigure(context);
  const chooser = formulaChooser(context, texts.formulaHeading);
  const nothing = (sentence: string) => {
    fill(words, sentence !== "" && element("p", { class: "message" }, sentence));
    picture.show(undefined);
    chooser.offer([]);
  };
  const look = async () => {
    const mine = ++turn;
    const current = answer.get();
    if (picked.trim() === "" || !current?.report) return nothing("");
    const address = groupsAddress(picked, current.column.address);
    if (address === undefined) return nothing(texts.groupsOneColumn);
    const sheet = parseAddress(address)?.sheet;
    if (sheet !== undefined && !(await hasSheet(port, sheet)))
      return mine === turn && nothing(texts.targetNoSheet(sheet));
    const { values } = await port.read(address);
    if (mine !== turn) return;
    const outcome = askPassRates(call, current, values);
    if (!outcome) return nothing(texts.missingFunction("GROUP_PASS_RATES"));
    if ("error" in outcome) return nothing(`${outcome.error} ${outcome.message}`);
    const groups = groupRates(outcome.value as Cell[][]);
    // A column of names or numbers of the entries would give a rate of 0 or 1 to each, and all of them a warning.
    const assessed = groups.reduce((sum, group) => sum + group.assessed, 0);
    if (groups.length > assessed / 2)
      return nothing(texts.groupsTooMany(numbers.count(groups.length), numbers.count(assessed)));
    fill(words, ...groupWords(context, groups));
    picture.show(ratesPicture(context, groups));
    const formula = { text: passRatesFormula(current, address), rows: groups.length + 1, columns: 8 };
    chooser.offer([{ words: texts.groupsHeading, formula, reads: current.column.address }]);
  };
  const tell = () => void look().catch((failure) => nothing(texts.readFailed(String(failure?.message ?? failure))));
  const pick = rangeField(
    context,
    texts.groupsPick,
    "",
    (text) => {
      picked = text;
      tell();
    },
    texts.groupsPickHint,
  );
  const root = fold(
    texts.groupsHeading,
    false,
    element("p", { class: "caution" }, texts.people),
    element("div", { class: "fields one" }, pick.root),
    words,
    picture.root,
    element("p", { class: "quiet" }, texts.groupsNote(numbers.percent(0.8))),
    chooser.root,
  );
  const later = afterPaint(tell);
  answer.watch((current) => {
    root.hidden = !current?.report;
    later();
  });
  return root;
}

function groupWords({ texts, numbers }: PaneContext, groups: readonly GroupRate[]): HTMLElement[] {
  const below = groups.filter((group) => group.below).map(({ name }) => name);
  const sentence =
    below.length === 0 ? texts.groupsNone : texts.groupsBelow(listed(below, texts, numbers), below.length === 1);
  return [element("p", { class: below.length === 0 ? undefined : "notice" }, sentence)];
}

function ratesPicture({ texts, numbers }: PaneContext, groups: readonly GroupRate[]): DrawnPicture {
  const highest = Math.max(...groups.map(({ rate }) => rate));
  const words = {
    title: texts.groupsTitle,
    description: groups.map(({ name, rate }) => texts.groupsRate(name, numbers.percent(rate))).join(", ") + ".",
    line: texts.groupsLine,
  };
  const optional = (value: number | undefined, write: (value: number) => string) =>
    value === undefined ? { text: texts.noAnswer, number: true } : figure(write(value));
  return {
    model: (size) => passRates({ groups, line: 0.8 * highest, words, style: numbers }, size),
    table: () =>
      table(
        words.title,
        [
          texts.groupsGroup,
          texts.groupsAssessed,
          texts.groupsPassed,
          texts.groupsShare,
          texts.groupsRatio,
          texts.groupsP,
        ],
        groups.map(({ name, assessed, passed, rate, ratio, p }) => [
          name,
          figure(numbers.count(assessed)),
          figure(numbers.count(passed)),
          figure(numbers.percent(rate)),
          optional(ratio, (value) => numbers.number(value, 2)),
          optional(p, numbers.telling),
        ]),
      ),
    fileName: words.title,
  };
}
