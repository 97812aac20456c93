import type { FUniver } from "@univerjs/core/facade";
import type { Picture } from "../port";

/** A picture and the cell that its upper left corner stands on. */
export interface PlacedPicture {
  readonly sheetId: string;
  readonly row: number;
  readonly column: number;
  readonly picture: Picture;
}

export interface PictureLayer {
  add(placed: PlacedPicture): void;
}

/**
 * Pictures over the grid: the free part of the engine has none, so they lie in a layer of our own that follows the scrolling.
 * They are kept in the workbook's own metadata; `changed` is called after each change of them.
 */
export function pictureLayer(api: FUniver, grid: HTMLElement, changed: () => void): PictureLayer {
  const book = api.getActiveWorkbook()!;
  const layer = document.createElement("div");
  layer.className = "pictures";
  grid.append(layer);

  const kept = (): PlacedPicture[] => (book.getCustomMetadata()?.["pictures"] as PlacedPicture[] | undefined) ?? [];
  const keep = (pictures: PlacedPicture[]): void => {
    book.setCustomMetadata({ ...book.getCustomMetadata(), pictures });
    draw();
    changed();
  };

  /** Puts each picture where its cell is now. */
  const move = (): void => {
    const sheet = book.getActiveSheet();
    const canvas = grid.querySelector("canvas[id^=univer-sheet]")?.getBoundingClientRect();
    if (!canvas) return;
    const box = grid.getBoundingClientRect();
    const zoom = sheet.getZoom();
    const first = sheet.getRange(0, 0).getCellRect();
    layer.style.inset = `${canvas.top - box.top + first.top * zoom}px ${box.right - canvas.right}px ${box.bottom - canvas.bottom}px ${canvas.left - box.left + first.left * zoom}px`;
    const scroll = sheet.getScrollState();
    // The engine counts scrolled rows and columns from behind the frozen ones.
    const rows = sheet.getFrozenRows();
    const columns = sheet.getFrozenColumns();
    const start = sheet.getRange(rows + scroll.sheetViewStartRow, columns + scroll.sheetViewStartColumn).getCellRect();
    const unfrozen = sheet.getRange(rows, columns).getCellRect();
    const down = start.top + scroll.offsetY - unfrozen.top;
    const across = start.left + scroll.offsetX - unfrozen.left;
    for (const figure of layer.querySelectorAll<HTMLElement>("figure")) {
      const cell = sheet.getRange(Number(figure.dataset["row"]), Number(figure.dataset["column"])).getCellRect();
      figure.style.transform = `translate(${(cell.left - first.left - across) * zoom}px, ${(cell.top - first.top - down) * zoom}px) scale(${zoom})`;
    }
  };

  const draw = (): void => {
    const sheetId = book.getActiveSheet().getSheetId();
    const shown = kept().filter((placed) => placed.sheetId === sheetId);
    layer.replaceChildren(
      ...shown.map((placed) => figureOf(placed, () => keep(kept().filter((one) => one !== placed)))),
    );
    move();
  };

  api.addEvent(api.Event.Scroll, move);
  api.addEvent(api.Event.SheetSkeletonChanged, move);
  api.addEvent(api.Event.SheetZoomChanged, move);
  api.addEvent(api.Event.ActiveSheetChanged, draw);
  new ResizeObserver(move).observe(grid);
  draw();
  return {
    add(placed) {
      const same = (one: PlacedPicture) =>
        one.sheetId === placed.sheetId &&
        one.row === placed.row &&
        one.column === placed.column &&
        one.picture.name === placed.picture.name;
      keep([...kept().filter((one) => !same(one)), placed]);
    },
  };
}

function figureOf({ row, column, picture }: PlacedPicture, remove: () => void): HTMLElement {
  const figure = document.createElement("figure");
  figure.dataset["row"] = String(row);
  figure.dataset["column"] = String(column);
  const image = document.createElement("img");
  // As an image a picture can run no script, whatever its text holds.
  image.src = `data:image/svg+xml;charset=utf-8,${encodeURIComponent(picture.svg)}`;
  image.alt = picture.name;
  image.width = picture.width;
  image.height = picture.height;
  const button = document.createElement("button");
  button.type = "button";
  button.textContent = "Remove picture";
  button.addEventListener("click", remove);
  figure.append(image, button);
  return figure;
}
