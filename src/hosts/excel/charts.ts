import type { HostChart } from "../port";
import type { RangeAt } from "./names";

const DASH = { solid: "Continuous", dash: "Dash", sysDot: "RoundDot" } as const;

/** A chart of lines through points, drawn by the host over the range. */
export async function insertChart(
  context: Excel.RequestContext,
  rangeAt: RangeAt,
  address: string,
  { title, xTitle, yTitle, from, to, series }: HostChart,
): Promise<void> {
  const place = rangeAt(context, address);
  const first = series[0]!;
  const chart = place.worksheet.charts.add(
    Excel.ChartType.xyscatterLinesNoMarkers,
    rangeAt(context, first.y),
    Excel.ChartSeriesBy.columns,
  );
  chart.name = title;
  chart.title.text = title;
  chart.legend.position = "Bottom";
  chart.setPosition(place.getCell(0, 0), place.getLastCell());
  series.forEach(({ name, x, y, colour, width, dash }, index) => {
    const line = index === 0 ? chart.series.getItemAt(0) : chart.series.add(name);
    line.name = name;
    line.setXAxisValues(rangeAt(context, x));
    line.setValues(rangeAt(context, y));
    line.smooth = false;
    line.markerStyle = "None";
    line.format.line.color = `#${colour}`;
    line.format.line.weight = width;
    line.format.line.lineStyle = DASH[dash];
  });
  const { categoryAxis, valueAxis } = chart.axes;
  categoryAxis.title.text = xTitle;
  categoryAxis.minimum = from;
  categoryAxis.maximum = to;
  valueAxis.title.text = yTitle;
  valueAxis.minimum = 0;
  await context.sync();
}
