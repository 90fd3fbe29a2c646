import { describe, expect, it } from 'vitest';
import { catalogue } from '../../../../core/catalogue/find';
import { Problem } from '../../../../core/problem';
import type { Ladder, Substance } from '../../../../core/substance';
import { DEFAULT_SETTINGS } from '../../../../functions/settings/settings';
import { crossings } from '../../../../taskpane/pane/substances/diagram/crossings';
import { diagramOf } from '../../../../taskpane/pane/substances/diagram/diagramOf';
import { diagramRows } from '../../../../taskpane/pane/substances/diagram/diagramRows';
import { diagramWords } from '../../../../taskpane/pane/substances/diagram/diagramWords';
import { frameOf } from '../../../../taskpane/pane/substances/diagram/frame';
import { labelsOf } from '../../../../taskpane/pane/substances/diagram/labelsOf';
import { sidesOf } from '../../../../taskpane/pane/substances/diagram/sidesOf';
import { temperatureWindow } from '../../../../taskpane/pane/substances/diagram/temperatureWindow';
import { latentFacts } from '../../../../taskpane/pane/substances/facts/latentFacts';
import { lineFacts } from '../../../../taskpane/pane/substances/facts/lineFacts';
import { heatCapacityFacts } from '../../../../taskpane/pane/substances/facts/phaseFacts';
import { onScale, unitWriter, writeValue } from '../../../../taskpane/pane/substances/facts/unitWriter';
import { disagreements } from '../../../../taskpane/pane/substances/known/disagreements';
import { knownOf } from '../../../../taskpane/pane/substances/known/knownOf';

const ATMOSPHERE = 101_325;
const BAD = /NaN|Infinity|undefined/;

function ladderOf(substance: Substance): Ladder | undefined {
  try {
    return substance.ladder(ATMOSPHERE);
  } catch (error) {
    if (error instanceof Problem) return undefined;
    throw error;
  }
}

describe.each(catalogue.entries.map(({ name }) => name))('the card of %s', (name) => {
  const substance = catalogue.find(name);
  const writer = unitWriter(DEFAULT_SETTINGS, substance.molarMass);
  const ladder = ladderOf(substance);

  it('draws a diagram of finite numbers, as a whole and around each change', () => {
    if (ladder === undefined) return;
    for (const around of [undefined, ...ladder.gaps.keys()]) {
      const diagram = diagramOf(substance, ladder, temperatureWindow(ladder, around), sidesOf(ladder, around));
      expect(diagram.lines.some(({ stable }) => stable)).toBe(true);
      const frame = frameOf(diagram, 292, {
        x: (kelvin) => onScale(kelvin, writer.temperature),
        y: (enthalpy) => onScale(enthalpy, writer.heat),
      });
      expect(frame.xTo).toBeGreaterThan(frame.xFrom);
      expect(frame.yTo).toBeGreaterThan(frame.yFrom);
      expect(labelsOf(diagram, frame, writer).length).toBeGreaterThan(0);
      expect(diagramWords(name, diagram, writer)).not.toMatch(BAD);
    }
    expect(JSON.stringify(diagramRows(ladder))).not.toMatch(/null/);
  });

  it('has facts, or words, at room temperature and on each side of every change', () => {
    const places = [298.15, ...(ladder?.gaps.flatMap(({ temperatureK: t }) => [t - 1, t, t + 1]) ?? [])];
    for (const temperatureK of places) {
      const at = { temperatureK, pressurePa: ATMOSPHERE, pressureText: '1 atm', outOfRange: 'refuse' as const };
      const quantities = [
        ...latentFacts(substance, at).flatMap(({ kinds }) => kinds.flatMap(({ latent, slope }) => [latent, slope])),
        ...heatCapacityFacts(substance, at),
        ...lineFacts(substance, at),
      ];
      for (const { fact } of quantities) {
        if (fact.answer !== undefined) expect(writeValue(fact.answer, writer).text).not.toMatch(BAD);
      }
      for (const crossing of ladder === undefined ? [] : crossings(substance, ladder, temperatureK)) {
        expect(Number.isFinite(crossing.enthalpy)).toBe(true);
      }
    }
  });

  it('says what is known, and whether its data agree', () => {
    const { known, unknown } = knownOf(substance, ATMOSPHERE);
    expect(known.length).toBeGreaterThan(0);
    for (const { curve } of known) expect(curve.from <= curve.to && curve.sources.length > 0).toBe(true);
    for (const { item } of unknown) expect(known.some((one) => one.item === item)).toBe(false);
    for (const { fact } of disagreements(substance)) {
      if (fact.answer !== undefined) expect(Number.isFinite(fact.answer.value)).toBe(true);
    }
  });
});
