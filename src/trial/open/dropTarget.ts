/** Takes files that are dropped anywhere on the page; `hover` hears when one is held over it. */
export function takeDrops(dropped: (files: readonly File[]) => void, hover: (over: boolean) => void): void {
  const holdsFiles = (event: DragEvent) => event.dataTransfer?.types.includes("Files") ?? false;
  const listen = (kind: "dragenter" | "dragover" | "dragleave" | "drop", heard: (event: DragEvent) => void) =>
    // Before the grid hears of it: the browser itself would leave the page and show the file instead.
    window.addEventListener(
      kind,
      (event) => {
        if (!holdsFiles(event)) return;
        event.preventDefault();
        event.stopPropagation();
        heard(event);
      },
      { capture: true },
    );
  listen("dragenter", () => hover(true));
  listen("dragover", () => hover(true));
  listen("dragleave", (event) => {
    if (event.relatedTarget === null) hover(false);
  });
  listen("drop", (event) => {
    hover(false);
    dropped([...(event.dataTransfer?.files ?? [])]);
  });
}
