import type { PictureToWrite } from "./book";
import { escapeXml } from "./xmlText";

/** The format counts lengths in 914,400ths of an inch: so many to a CSS pixel. */
const TO_A_PIXEL = 9525;

/** A picture at its cell, in its own size; `id` is its number in the drawing, `relation` leads to its file. */
export function pictureXml(picture: PictureToWrite, id: number, relation: string): string {
  const { name, row, column, width, height } = picture;
  const size = `cx="${Math.round(width * TO_A_PIXEL)}" cy="${Math.round(height * TO_A_PIXEL)}"`;
  return `<xdr:oneCellAnchor><xdr:from><xdr:col>${column}</xdr:col><xdr:colOff>0</xdr:colOff><xdr:row>${row}</xdr:row><xdr:rowOff>0</xdr:rowOff></xdr:from><xdr:ext ${size}/><xdr:pic><xdr:nvPicPr><xdr:cNvPr id="${id}" name="${escapeXml(name)}" descr="${escapeXml(name)}"/><xdr:cNvPicPr/></xdr:nvPicPr><xdr:blipFill><a:blip r:embed="${relation}"/><a:stretch><a:fillRect/></a:stretch></xdr:blipFill><xdr:spPr><a:xfrm><a:off x="0" y="0"/><a:ext ${size}/></a:xfrm><a:prstGeom prst="rect"><a:avLst/></a:prstGeom></xdr:spPr></xdr:pic><xdr:clientData/></xdr:oneCellAnchor>`;
}
