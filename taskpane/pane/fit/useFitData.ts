import { useEffect, useRef, useState } from 'react';
import { formatReference, parseArea } from '../../hosts/address';
import { findColumns, type FoundColumns } from '../../plan/findColumns';
import { parseRanges } from '../../plan/parseRanges';
import type { Ref, WorkbookHost } from '../../port';
import { wordsOf } from '../look/wordsOf';
import { readCells } from '../readCells';

/** Data as they were read from the workbook. */
export interface FitData {
  readonly refs: readonly Ref[];
  readonly found: FoundColumns;
}

export interface FitDataState {
  /** The ranges as text. */
  readonly text: string;
  readonly setText: (text: string) => void;
  readonly data: FitData | undefined;
  /** Share read so far, in [0, 1], while a large range is being read. */
  readonly progress: number | undefined;
  readonly failure: string | undefined;
  /** True once cells of the data have changed after they were read. */
  readonly changed: boolean;
  readonly takeSelection: () => Promise<void>;
  readonly read: () => Promise<void>;
  readonly cancel: () => void;
}

/** Reads the data of a fit from the selection or from typed ranges; `onData` hears of new data. */
export function useFitData(host: WorkbookHost, onData: (data: FitData) => void): FitDataState {
  const [text, setText] = useState('');
  const [data, setData] = useState<FitData>();
  const [progress, setProgress] = useState<number>();
  const [failure, setFailure] = useState<string>();
  const [changed, setChanged] = useState(false);
  const running = useRef<AbortController | undefined>(undefined);

  useEffect(
    () =>
      host.on('change', ({ ref }) => {
        if (ref === undefined || data?.refs.some((one) => overlap(one, ref)) === true) setChanged(true);
      }),
    [host, data],
  );
  useEffect(() => () => running.current?.abort(), []);

  async function readText(ranges: string, sheet: string | undefined): Promise<void> {
    running.current?.abort();
    const control = new AbortController();
    running.current = control;
    setFailure(undefined);
    try {
      const refs = parseRanges(ranges, sheet);
      setProgress(0);
      const blocks = await readCells(host, refs, { signal: control.signal, progress: setProgress });
      const read = { refs: blocks.map(({ ref }) => ref), found: findColumns(blocks) };
      setText(read.refs.map(formatReference).join('; '));
      setChanged(false);
      setData(read);
      onData(read);
    } catch (error) {
      if (control.signal.aborted && error instanceof DOMException) setFailure('Reading was stopped.');
      else setFailure(wordsOf(error));
    } finally {
      if (running.current === control) setProgress(undefined);
    }
  }

  return {
    text,
    setText,
    data,
    progress,
    failure,
    changed,
    takeSelection: async () => {
      const selected = await host.selection();
      if (selected === null) setFailure('Nothing is selected: select the columns, header row included.');
      else await readText(formatReference(selected), selected.sheet);
    },
    read: async () => readText(text, (await host.selection())?.sheet),
    cancel: () => running.current?.abort(),
  };
}

function overlap(a: Ref, b: Ref): boolean {
  const [p, q] = [parseArea(a.address), parseArea(b.address)];
  if (a.sheet.toLowerCase() !== b.sheet.toLowerCase() || p === null || q === null) return false;
  const apart =
    p.top + p.rows <= q.top || q.top + q.rows <= p.top || p.left + p.columns <= q.left || q.left + q.columns <= p.left;
  return !apart;
}
