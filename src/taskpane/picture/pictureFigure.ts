import { svgText } from "../../plot/svgText";
import type { PictureModel, Size } from "../../plot/picture";
import { formatAddress, parseAddress } from "../../sheet/address";
import type { PaneContext } from "../context";
import { download } from "../dom/download";
import { button } from "../dom/choice";
import { element, fill } from "../dom/element";
import { fold } from "../dom/part";
import { overlap } from "../target/overlap";
import { freeColumn } from "../target/freeColumn";

export interface DrawnPicture {
  readonly model: (size: Size) => PictureModel;
  /** The picture as a table: made only when somebody opens it. */
  readonly table: () => HTMLElement;
  /** A name for the file, without its ending. */
  readonly fileName: string;
}

export interface PictureFigure {
  readonly root: HTMLElement;
  show(picture: DrawnPicture | undefined): void;
}

const HEIGHT = 214;
const LEAST_WIDTH = 240;
const MOST_WIDTH = 640;
/** What a saved picture measures: the same on every screen. */
const SAVED: Size = { width: 640, height: 320 };
const SAVED_MARGIN = 16;

/** A picture with its sentence below, as a table on request, and the ways to take it along. */
export function pictureFigure(context: PaneContext): PictureFigure {
  const { texts, port } = context;
  let shown: DrawnPicture | undefined;
  const drawing = element("div", { class: "drawing" });
  const sentence = element("figcaption");
  const tableRoom = element("div");
  const message = element("p", { class: "quiet", "aria-live": "polite" });
  const tableFold = fold(texts.pictureTable, false, tableRoom);
  tableFold.addEventListener("toggle", fillTable);

  function fillTable() {
    fill(tableRoom, tableFold.open && shown ? shown.table() : undefined);
  }

  const saved = () => {
    const model = shown!.model(SAVED);
    const [width, height] = [model.width + 2 * SAVED_MARGIN, model.height + 2 * SAVED_MARGIN];
    return { name: model.title, svg: svgText(model, SAVED_MARGIN), width, height };
  };
  const failing = (work: () => Promise<unknown>) => () => {
    message.textContent = "";
    work().catch((failure) => (message.textContent = texts.writeFailed(String(failure?.message ?? failure))));
  };
  const actions = element(
    "p",
    { class: "actions" },
    button(
      texts.saveSvg,
      failing(async () => download(svgBlob(saved().svg), `${shown!.fileName}.svg`)),
      "plain",
    ),
    button(
      texts.savePng,
      failing(async () => download(await pngBlob(saved()), `${shown!.fileName}.png`)),
      "plain",
    ),
    button(
      texts.putPicture,
      failing(async () => {
        const at = await pictureCell(context);
        if (at === undefined) return;
        await port.insertPicture(at, saved());
        message.textContent = texts.pictureDone(at);
      }),
      "plain",
    ),
  );
  const root = element("figure", {}, drawing, sentence, tableFold, actions, message);
  let width = 0;

  function draw() {
    root.hidden = !shown;
    if (!shown) return;
    const room = drawing.clientWidth || root.clientWidth || 288;
    width = Math.round(Math.min(Math.max(room, LEAST_WIDTH), MOST_WIDTH));
    const model = shown.model({ width, height: HEIGHT });
    // The model's texts are escaped by svgText: what stands in a heading can't become markup.
    drawing.innerHTML = svgText(model);
    sentence.textContent = model.description;
    fillTable();
  }

  new ResizeObserver(() => {
    const room = Math.round(Math.min(Math.max(drawing.clientWidth, LEAST_WIDTH), MOST_WIDTH));
    if (shown && room !== width) draw();
  }).observe(drawing);

  return {
    root,
    show(picture) {
      shown = picture;
      message.textContent = "";
      draw();
    },
  };
}

/** Where a picture goes: at the selection, except where it would cover the scores; then beside them. */
async function pictureCell({ selected, column, port }: PaneContext): Promise<string | undefined> {
  const scores = column.get()?.address;
  const area = parseAddress(selected.get() ?? "");
  if (area && (scores === undefined || !overlap(area, parseAddress(scores)!)))
    return formatAddress({ ...area, bottom: area.top, right: area.left });
  return scores === undefined ? undefined : ((await freeColumn(port, scores))?.first ?? scores);
}

function svgBlob(svg: string): Blob {
  return new Blob([svg], { type: "image/svg+xml" });
}

async function pngBlob({ svg, width, height }: { svg: string; width: number; height: number }): Promise<Blob> {
  const image = new Image();
  image.src = URL.createObjectURL(svgBlob(svg));
  await image.decode();
  const canvas = element("canvas", { width: width * 2, height: height * 2 });
  canvas.getContext("2d")!.drawImage(image, 0, 0, width * 2, height * 2);
  URL.revokeObjectURL(image.src);
  return new Promise((resolve, reject) =>
    canvas.toBlob((blob) => (blob ? resolve(blob) : reject(new Error("PNG"))), "image/png"),
  );
}
