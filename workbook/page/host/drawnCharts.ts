import { ICommandService, LifecycleStages } from '@univerjs/core';
import { SetRangeValuesMutation, SetWorksheetActiveOperation } from '@univerjs/sheets';
import { DrawingApplyType, SetDrawingApplyMutation } from '@univerjs/sheets-drawing';
import { createElement } from 'react';
import type { ChartSpec, Ref } from '../../../taskpane/port';
import type { Grid } from '../grid/openGrid';
import { ChartFrame } from './ChartFrame';
import { chartPoints } from './chartPoints';
import { CHART_HEIGHT_PX, CHART_WIDTH_PX } from './chartSize';
import { placeOf } from './place';

interface Drawn {
  readonly id: string;
  readonly spec: ChartSpec;
  readonly at: Ref;
}

const COMPONENT = 'LatentryChart';
const PROPERTY = 'latentry.charts';

/** The charts over the grid; kept with the workbook as a small text, drawn again when it is opened. */
export function drawnCharts(grid: Grid): { add(spec: ChartSpec, at: Ref): void } {
  const changed = new Set<() => void>();
  const subscribe = (listener: () => void) => {
    changed.add(listener);
    return () => changed.delete(listener);
  };
  const tell = () => {
    for (const listener of changed) listener();
  };
  const kept = () => JSON.parse(grid.text(PROPERTY) ?? '[]') as Drawn[];
  const keep = (charts: readonly Drawn[]) => {
    grid.setText(PROPERTY, charts.length === 0 ? undefined : JSON.stringify(charts));
  };

  const frames = new Map<string, Parameters<typeof ChartFrame>[0]>();
  grid.api.registerComponent(COMPONENT, ({ data }: { data?: { chart?: string } }) => {
    const props = frames.get(data?.chart ?? '');
    return props === undefined ? null : createElement(ChartFrame, props);
  });

  const show = ({ id, spec, at }: Drawn) => {
    const { sheet, area } = placeOf(grid, at);
    frames.set(id, { spec, subscribe, read: () => spec.series.map((series) => chartPoints(grid, series)) });
    const range = sheet.getRange(area.top, area.left, area.rows, area.columns);
    const size = { width: CHART_WIDTH_PX, height: CHART_HEIGHT_PX };
    sheet.addFloatDomToRange(range, { componentKey: COMPONENT, data: { chart: id }, allowTransform: true }, size, id);
  };

  /** The grid can only draw over the sheet that is in view: others wait until theirs is. */
  const showActive = () => {
    if (grid.api.getCurrentLifecycleStage() < LifecycleStages.Rendered) return;
    const active = grid.workbook().getActiveSheet().getSheetName();
    for (const chart of kept()) if (chart.at.sheet === active && !frames.has(chart.id)) show(chart);
  };
  const restore = () => {
    frames.clear();
    showActive();
  };
  grid.api.getFormula().calculationResultApplied(tell);
  grid.injector.get(ICommandService).onCommandExecuted(({ id, params }) => {
    if (id === SetRangeValuesMutation.id) tell();
    if (id === SetWorksheetActiveOperation.id) setTimeout(showActive);
    if (id === SetDrawingApplyMutation.id && (params as { type: DrawingApplyType }).type === DrawingApplyType.REMOVE) {
      const there = ({ id: chart, at }: Drawn) => grid.sheet(at.sheet)?.getFloatDomById(chart) != null;
      keep(kept().filter((chart) => !frames.has(chart.id) || there(chart)));
    }
  });
  grid.api.addEvent(grid.api.Event.LifeCycleChanged, showActive);
  grid.onOpened(restore);
  restore();

  return {
    add: (spec, at) => {
      const chart = { id: crypto.randomUUID(), spec, at };
      keep([...kept(), chart]);
      grid.sheet(at.sheet)?.activate();
      setTimeout(showActive);
    },
  };
}
