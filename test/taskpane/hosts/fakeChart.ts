import { type FakeContext, FakeExcelError } from './fakeContext';
import type { FakeExcel } from './fakeExcel';

/** A chart, as far as it is told its series, titles and place. */
export function fakeChart(fake: FakeExcel, context: FakeContext, type: string, source: unknown): unknown {
  if (type !== 'XYScatter') throw new FakeExcelError('InvalidArgument');
  const made = { at: '', series: [] as { x: string; y: string; label: string }[], titles: [] as string[] };
  const refOf = (range: unknown) => (range as { refOf: () => string }).refOf();
  context.push(() => {
    made.series.push({ label: 'from the source range', x: '', y: refOf(source) });
    fake.chartsMade.push(made);
  });
  const title = () =>
    context.object({
      type: 'ChartTitle',
      resolve: () => made,
      properties: { text: { get: () => '', set: (_, text) => made.titles.push(String(text)) } },
    });
  const series = (find: () => { x: string; y: string; label: string }) =>
    context.object({
      type: 'ChartSeries',
      resolve: find,
      properties: { name: { get: (found) => found.label }, chartType: { get: () => '', set: () => undefined } },
      members: {
        delete: () => {
          context.push(() => made.series.splice(made.series.indexOf(find()), 1));
        },
        setXAxisValues: (range: unknown) => {
          context.push(() => {
            find().x = refOf(range);
          });
        },
        setValues: (range: unknown) => {
          context.push(() => {
            find().y = refOf(range);
          });
        },
      },
    });
  return context.object({
    type: 'Chart',
    resolve: () => made,
    properties: {
      width: { get: () => 0, set: () => undefined },
      height: { get: () => 0, set: () => undefined },
    },
    members: {
      title: title(),
      axes: { categoryAxis: { title: title() }, valueAxis: { title: title() } },
      setPosition: (range: unknown) => {
        context.push(() => {
          made.at = refOf(range);
        });
      },
      series: context.object({
        type: 'ChartSeriesCollection',
        resolve: () => made,
        properties: {},
        items: () => made.series.map((found) => series(() => found) as object),
        members: {
          add: (label: string) => {
            const found = { label, x: '', y: '' };
            context.push(() => made.series.push(found));
            return series(() => found);
          },
        },
      }),
    },
  });
}
