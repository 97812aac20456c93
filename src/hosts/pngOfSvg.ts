import type { Picture } from "./port";

/** An SVG text drawn as PNG, as a data address, at `scale` dots a CSS pixel. Needs a page. */
export async function pngOfSvg({ svg, width, height }: Picture, scale = 2): Promise<string> {
  const image = new Image();
  image.src = `data:image/svg+xml;charset=utf-8,${encodeURIComponent(svg)}`;
  await image.decode();
  const canvas = document.createElement("canvas");
  canvas.width = Math.round(width * scale);
  canvas.height = Math.round(height * scale);
  const pen = canvas.getContext("2d");
  if (!pen) throw new Error("This browser gives no canvas to draw the picture on.");
  pen.drawImage(image, 0, 0, canvas.width, canvas.height);
  return canvas.toDataURL("image/png");
}
