import type { ChartToWrite, SeriesToWrite } from "./chart";
import { escapeXml, HEAD } from "./xmlText";

const CHART = "http://schemas.openxmlformats.org/drawingml/2006/chart";
const DRAWING = "http://schemas.openxmlformats.org/drawingml/2006/main";
/** English Metric Units in a point. */
const POINT = 12_700;
const X_AXIS = 50_010;
const Y_AXIS = 50_020;
const INK = "1C2126";
const PALE = "565E66";
const LINE = "C9D0D6";

/** The part of one chart: lines through points, drawn from cells, with what stood in them when it was written (ECMA-376, DrawingML charts). */
export function chartXml(chart: ChartToWrite): string {
  return `${HEAD}<c:chartSpace xmlns:c="${CHART}" xmlns:a="${DRAWING}"><c:roundedCorners val="0"/><c:chart>${titleXml(chart.title, 1200, true)}<c:autoTitleDeleted val="0"/><c:plotArea><c:layout/><c:scatterChart><c:scatterStyle val="lineMarker"/><c:varyColors val="0"/>${chart.series.map(seriesXml).join("")}<c:axId val="${X_AXIS}"/><c:axId val="${Y_AXIS}"/></c:scatterChart>${axesXml(chart)}<c:spPr><a:noFill/></c:spPr></c:plotArea><c:legend><c:legendPos val="b"/><c:overlay val="0"/>${textLook(900, PALE)}</c:legend><c:plotVisOnly val="0"/><c:dispBlanksAs val="gap"/></c:chart><c:spPr><a:solidFill><a:srgbClr val="FFFFFF"/></a:solidFill><a:ln><a:noFill/></a:ln></c:spPr></c:chartSpace>`;
}

function titleXml(text: string, size: number, bold: boolean): string {
  return `<c:title><c:tx><c:rich><a:bodyPr/><a:p><a:pPr><a:defRPr sz="${size}" b="${bold ? 1 : 0}"/></a:pPr><a:r><a:rPr lang="en-US" sz="${size}" b="${bold ? 1 : 0}"><a:solidFill><a:srgbClr val="${INK}"/></a:solidFill></a:rPr><a:t>${escapeXml(text)}</a:t></a:r></a:p></c:rich></c:tx><c:overlay val="0"/></c:title>`;
}

function textLook(size: number, colour: string): string {
  return `<c:txPr><a:bodyPr/><a:p><a:pPr><a:defRPr sz="${size}"><a:solidFill><a:srgbClr val="${colour}"/></a:solidFill></a:defRPr></a:pPr><a:endParaRPr lang="en-US"/></a:p></c:txPr>`;
}

function seriesXml(
  { nameAt, name, xAt, yAt, x, y, colour, width, dash = "solid", smooth = false }: SeriesToWrite,
  index: number,
): string {
  return `<c:ser><c:idx val="${index}"/><c:order val="${index}"/><c:tx><c:strRef><c:f>${escapeXml(nameAt)}</c:f><c:strCache><c:ptCount val="1"/><c:pt idx="0"><c:v>${escapeXml(name)}</c:v></c:pt></c:strCache></c:strRef></c:tx><c:spPr><a:ln w="${Math.round(width * POINT)}" cap="flat"><a:solidFill><a:srgbClr val="${colour}"/></a:solidFill><a:prstDash val="${dash}"/><a:round/></a:ln></c:spPr><c:marker><c:symbol val="none"/></c:marker><c:xVal>${numbersXml(xAt, x)}</c:xVal><c:yVal>${numbersXml(yAt, y)}</c:yVal><c:smooth val="${smooth ? 1 : 0}"/></c:ser>`;
}

function numbersXml(at: string, numbers: readonly (number | undefined)[]): string {
  const points = numbers.map((value, index) =>
    value === undefined || !Number.isFinite(value) ? "" : `<c:pt idx="${index}"><c:v>${value}</c:v></c:pt>`,
  );
  return `<c:numRef><c:f>${escapeXml(at)}</c:f><c:numCache><c:formatCode>General</c:formatCode><c:ptCount val="${numbers.length}"/>${points.join("")}</c:numCache></c:numRef>`;
}

function axesXml({ xTitle, yTitle, xFrom, xTo, xFormat = "General" }: ChartToWrite): string {
  const ends = `${xTo === undefined ? "" : `<c:max val="${xTo}"/>`}${xFrom === undefined ? "" : `<c:min val="${xFrom}"/>`}`;
  const axis = (
    id: number,
    across: number,
    place: string,
    limits: string,
    rest: string,
    title: string,
    format: string,
  ) =>
    `<c:valAx><c:axId val="${id}"/><c:scaling><c:orientation val="minMax"/>${limits}</c:scaling><c:delete val="0"/><c:axPos val="${place}"/>${rest}${titleXml(title, 900, false)}<c:numFmt formatCode="${escapeXml(format)}" sourceLinked="0"/><c:majorTickMark val="out"/><c:minorTickMark val="none"/><c:tickLblPos val="low"/><c:spPr><a:ln w="9525"><a:solidFill><a:srgbClr val="${PALE}"/></a:solidFill></a:ln></c:spPr>${textLook(900, PALE)}<c:crossAx val="${across}"/><c:crosses val="min"/><c:crossBetween val="midCat"/></c:valAx>`;
  const lines = `<c:majorGridlines><c:spPr><a:ln w="6350"><a:solidFill><a:srgbClr val="${LINE}"/></a:solidFill></a:ln></c:spPr></c:majorGridlines>`;
  return (
    axis(X_AXIS, Y_AXIS, "b", ends, "", xTitle, xFormat) +
    axis(Y_AXIS, X_AXIS, "l", '<c:min val="0"/>', lines, yTitle, "General")
  );
}
