import type { PictureToWrite } from "./book";
import type { ChartToWrite } from "./chart";
import { pictureXml } from "./pictureXml";
import { escapeXml, HEAD, OFFICE } from "./xmlText";

const SHEET_DRAWING = "http://schemas.openxmlformats.org/drawingml/2006/spreadsheetDrawing";
const DRAWING = "http://schemas.openxmlformats.org/drawingml/2006/main";
const CHART = "http://schemas.openxmlformats.org/drawingml/2006/chart";

/** Where the charts and pictures of a sheet stand on it; the i-th of them has the relation `rId{i + 1}`, charts first. */
export function drawingXml(charts: readonly ChartToWrite[], pictures: readonly PictureToWrite[]): string {
  const corner = (tag: string, { row, column }: ChartToWrite["from"]) =>
    `<xdr:${tag}><xdr:col>${column}</xdr:col><xdr:colOff>0</xdr:colOff><xdr:row>${row}</xdr:row><xdr:rowOff>0</xdr:rowOff></xdr:${tag}>`;
  const frames = charts.map(
    (chart, index) =>
      `<xdr:twoCellAnchor>${corner("from", chart.from)}${corner("to", chart.to)}<xdr:graphicFrame macro=""><xdr:nvGraphicFramePr><xdr:cNvPr id="${index + 2}" name="${escapeXml(chart.title)}" descr="${escapeXml(chart.description)}"/><xdr:cNvGraphicFramePr/></xdr:nvGraphicFramePr><xdr:xfrm><a:off x="0" y="0"/><a:ext cx="0" cy="0"/></xdr:xfrm><a:graphic><a:graphicData uri="${CHART}"><c:chart xmlns:c="${CHART}" r:id="rId${index + 1}"/></a:graphicData></a:graphic></xdr:graphicFrame><xdr:clientData/></xdr:twoCellAnchor>`,
  );
  const images = pictures.map((picture, index) => {
    const place = charts.length + index;
    return pictureXml(picture, place + 2, `rId${place + 1}`);
  });
  return `${HEAD}<xdr:wsDr xmlns:xdr="${SHEET_DRAWING}" xmlns:a="${DRAWING}" xmlns:r="${OFFICE}">${[...frames, ...images].join("")}</xdr:wsDr>`;
}
