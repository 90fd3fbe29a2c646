import type { ChartSpec, Ref } from '../../port';
import { runExcel } from './runExcel';

/** Draws a native scatter chart whose top left corner lies on `at`. */
export async function drawChart(spec: ChartSpec, at: Ref): Promise<void> {
  await runExcel(async (context) => {
    const { worksheets } = context.workbook;
    const rangeOf = (ref: Ref) => worksheets.getItem(ref.sheet).getRange(ref.address);
    const chart = worksheets.getItem(at.sheet).charts.add(Excel.ChartType.xyscatter, rangeOf(at));
    const made = chart.series.load('items/name');
    await context.sync();
    for (const series of made.items) series.delete();
    for (const { label, x, y, draw } of spec.series) {
      const series = chart.series.add(label);
      series.setXAxisValues(rangeOf(x));
      series.setValues(rangeOf(y));
      series.chartType = draw === 'points' ? Excel.ChartType.xyscatter : Excel.ChartType.xyscatterLinesNoMarkers;
    }
    chart.title.text = spec.title;
    chart.axes.categoryAxis.title.text = spec.xLabel;
    chart.axes.valueAxis.title.text = spec.yLabel;
    chart.setPosition(rangeOf(at));
    chart.width = 480;
    chart.height = 320;
    await context.sync();
  }, at);
}
