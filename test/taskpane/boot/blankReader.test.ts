import { afterEach, describe, expect, it } from 'vitest';
import { withBlanks } from '../../../functions/edge/blanks';
import { startBlankReader } from '../../../taskpane/boot/blankReader';
import { memoryHost } from '../memoryHost';

describe('startBlankReader', () => {
  let stop: () => void = () => undefined;
  afterEach(() => {
    stop();
  });
  function open() {
    const host = memoryHost({ evaluate: () => '' });
    host.book.addSheet('Data');
    host.type({ sheet: 'Data', address: 'A1:A4' }, [[0], [null], [5], ['=""']]);
    stop = startBlankReader(host);
    return host;
  }

  it('tells a true 0 from an empty cell that the host handed over as 0', async () => {
    open();
    expect(await withBlanks([[0], [0], [5]], 'Data!A1:A3')).toEqual([[0], [null], [5]]);
  });

  it('takes a cell with a formula for filled, whatever it gives', async () => {
    open();
    expect(await withBlanks([[0]], 'Data!$A$4')).toEqual([[0]]);
  });

  it('reads once for a burst, however many ask', async () => {
    const host = open();
    const asked = Array.from({ length: 200 }, (_, i) => withBlanks([[0]], `Data!A${String(i + 1)}`));
    const answers = await Promise.all(asked);
    expect(host.crossings).toBe(1);
    expect(answers[0]).toEqual([[0]]);
    expect(answers[1]).toEqual([[null]]);
    expect(answers[199]).toEqual([[null]]);
  });

  it('keeps nothing after a burst', async () => {
    const host = open();
    expect(await withBlanks([[0]], 'Data!A2')).toEqual([[null]]);
    host.type({ sheet: 'Data', address: 'A2' }, [[0]]);
    expect(await withBlanks([[0]], 'Data!A2')).toEqual([[0]]);
    expect(host.crossings).toBe(2);
  });

  it('knows nothing of other workbooks, and does not stop the others of the burst', async () => {
    open();
    const [foreign, ours] = await Promise.all([
      withBlanks([[0]], "'[Other.xlsx]Data'!A2"),
      withBlanks([[0]], 'Data!A2'),
    ]);
    expect(foreign).toEqual([[0]]);
    expect(ours).toEqual([[null]]);
  });
});
