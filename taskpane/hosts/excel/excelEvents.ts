import type { HostEvent, Ref, WorkbookHost } from '../../port';
import { parseArea, formatArea } from '../address';
import type { OwnWrites } from './ownWrites';
import { runExcel } from './runExcel';
import { selectedRef } from './selectedRef';

type EventName = Parameters<WorkbookHost['on']>[0];
type Emit = (event: HostEvent) => void;
interface Registration {
  readonly context: OfficeExtension.ClientRequestContext;
  remove(): void;
}

const LOCAL = { remote: false, own: false };

async function changedRef({ worksheetId, address }: Excel.WorksheetChangedEventArgs): Promise<Ref | null> {
  return runExcel(async (context) => {
    const sheet = context.workbook.worksheets.getItemOrNullObject(worksheetId).load('name');
    await context.sync();
    const area = parseArea(address);
    return sheet.isNullObject ? null : { sheet: sheet.name, address: area === null ? address : formatArea(area) };
  });
}

/** Excel says who wrote since ExcelApi 1.14; before, what this add-in was about to write is compared. */
function wroteItself(args: Excel.WorksheetChangedEventArgs, ref: Ref | null, writes: OwnWrites): boolean {
  const expected = ref !== null && writes.recognise(ref);
  const trigger = args.triggerSource as string | undefined;
  return trigger === undefined ? expected : trigger === 'ThisLocalAddin';
}

function attach(context: Excel.RequestContext, name: EventName, emit: Emit, writes: OwnWrites): Registration {
  const { workbook } = context;
  const { worksheets } = workbook;
  switch (name) {
    case 'select':
      return workbook.onSelectionChanged.add(async () => {
        const ref = await runExcel(selectedRef);
        emit(ref === null ? LOCAL : { ref, ...LOCAL });
      });
    case 'change':
      return worksheets.onChanged.add(async (args) => {
        const ref = await changedRef(args);
        const remote = args.source === Excel.EventSource.remote;
        const own = !remote && wroteItself(args, ref, writes);
        emit(ref === null ? { remote, own } : { ref, remote, own });
      });
    case 'calculated':
      return worksheets.onCalculated.add(() => {
        emit(LOCAL);
        return Promise.resolve();
      });
    case 'activated':
      return worksheets.onActivated.add(() => {
        emit(LOCAL);
        return Promise.resolve();
      });
  }
}

/** A failure that no caller waits for still reaches the page's error handler. */
function surface(error: unknown): void {
  queueMicrotask(() => {
    throw error;
  });
}

/** The port's `on`: one handler in Excel a kind of event, while anyone listens. */
export function excelEvents(writes: OwnWrites): WorkbookHost['on'] {
  const listeners = new Map<EventName, Set<Emit>>();
  const registered = new Map<EventName, Promise<Registration>>();

  const register = (name: EventName) => {
    const emit: Emit = (event) => {
      for (const listener of [...(listeners.get(name) ?? [])]) listener(event);
    };
    const registration = runExcel(async (context) => {
      const made = attach(context, name, emit, writes);
      await context.sync();
      return made;
    });
    registration.catch(surface);
    registered.set(name, registration);
  };

  const unregister = async (name: EventName) => {
    const registration = await registered.get(name);
    if ((listeners.get(name)?.size ?? 0) > 0 || registration === undefined) return;
    registered.delete(name);
    await Excel.run(registration.context, async (context) => {
      registration.remove();
      await context.sync();
    });
  };

  return (name, listener) => {
    const own: Emit = (event) => {
      listener(event);
    };
    const set = listeners.get(name) ?? new Set<Emit>();
    listeners.set(name, set.add(own));
    if (!registered.has(name)) register(name);
    return () => {
      set.delete(own);
      if (set.size === 0) unregister(name).catch(surface);
    };
  };
}
