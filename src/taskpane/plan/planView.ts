import type { PlanQuestion, PlanSearch } from "../../plan/planModel";
import { formatAddress, parseAddress } from "../../sheet/address";
import { svgText } from "../../plot/svgText";
import type { PaneContext } from "../context";
import type { CutoffAnswer } from "../cutoff/answerCutoff";
import { scoresPicture } from "../cutoff/scoresPicture";
import { button } from "../dom/choice";
import { element } from "../dom/element";
import { fold } from "../dom/part";
import { keptSearch, type SearchQuestion } from "../search/searchQuestion";
import { today } from "../today";
import type { PlanOutcome } from "./planOutcome";
import { NamesTaken, writePlan } from "./writePlan";

/** Size of the picture on the plan, where the host draws no chart of its own; its margin on each side. */
const PICTURE = { width: 900, height: 430 } as const;
const MARGIN = 12;

/** The whole plan on a sheet of its own. */
export function planView(context: PaneContext): HTMLElement {
  const { texts, port, answer } = context;
  const message = element("p", { "aria-live": "polite" });
  const goRoom = element("p", { class: "actions" });
  const work = async () => {
    const current = answer.get();
    if (!current?.report) return;
    press.disabled = true;
    message.textContent = texts.planWorking;
    goRoom.replaceChildren();
    try {
      const outcome = await write(context, current);
      message.textContent = doneWords(context, outcome);
      const there = formatAddress({ sheet: outcome.sheet, top: 0, left: 0, bottom: 0, right: 0 });
      goRoom.replaceChildren(button(texts.planGo, () => void port.select(there), "plain"));
    } catch (failure) {
      message.textContent =
        failure instanceof NamesTaken
          ? texts.planTaken(failure.names.slice(0, 3).join(", "))
          : texts.writeFailed(String((failure as Error)?.message ?? failure));
    } finally {
      press.disabled = false;
    }
  };
  const press = button(texts.planWrite, () => void work());
  const root = fold(
    texts.planHeading,
    false,
    element("p", { class: "quiet" }, texts.planWhy),
    element("p", { class: "actions" }, press),
    message,
    goRoom,
  );
  answer.watch((current) => (root.hidden = !current?.report));
  return root;
}

async function write(context: PaneContext, current: CutoffAnswer): Promise<PlanOutcome> {
  const { port } = context;
  const { column, question, report } = current;
  const kept = await port.readSetting("search");
  const asked: PlanQuestion = {
    ...question,
    scores: column.address,
    heading: column.heading === "" ? "scores" : column.heading,
    day: today(),
    ...(kept !== undefined && { search: searchOf(keptSearch(kept)) }),
  };
  const outcome = await writePlan(port, asked, {
    sorted: column.sorted,
    count: column.count,
    mark: report!.spoken.mark,
  });
  if (outcome.picture !== undefined) {
    const model = scoresPicture(current, context).model({
      width: PICTURE.width - 2 * MARGIN,
      height: PICTURE.height - 2 * MARGIN,
    });
    const area = parseAddress(outcome.picture)!;
    await port.insertPicture(formatAddress({ ...area, bottom: area.top, right: area.left }), {
      // Always the same name: a plan that is written again gets its picture in the place of the old one.
      name: "Weirmark plan",
      svg: svgText(model, MARGIN),
      ...PICTURE,
    });
  }
  return outcome;
}

/** What the user told the pane of the search; one stage that costs 1 is what the pane begins with, and says nothing. */
function searchOf({ hits, chance, arrivals, lookCost, looksLeft, stages }: SearchQuestion): PlanSearch {
  const told = stages.length > 1 || stages[0]!.cost !== 1;
  return { hits, chance, arrivals, lookCost, looks: looksLeft, ...(told && { stages }) };
}

function doneWords({ texts }: PaneContext, { sheet, updated, left }: PlanOutcome): string {
  const done = updated ? texts.planUpdated(sheet) : texts.planDone(sheet);
  return left.length > 0 ? `${done} ${texts.planLeft(left.join(", "))}` : done;
}
