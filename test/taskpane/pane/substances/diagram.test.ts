import { describe, expect, it } from 'vitest';
import { water } from '../../../../core/water/water';
import { DEFAULT_SETTINGS } from '../../../../functions/settings/settings';
import { parseSettingsText } from '../../../../functions/settings/parseSettingsText';
import { captionWords } from '../../../../taskpane/pane/substances/diagram/captionWords';
import { crossings } from '../../../../taskpane/pane/substances/diagram/crossings';
import { diagramOf } from '../../../../taskpane/pane/substances/diagram/diagramOf';
import { diagramRows } from '../../../../taskpane/pane/substances/diagram/diagramRows';
import { diagramWords } from '../../../../taskpane/pane/substances/diagram/diagramWords';
import { frameOf, pixelX, pixelY, valueAtX } from '../../../../taskpane/pane/substances/diagram/frame';
import { labelsOf } from '../../../../taskpane/pane/substances/diagram/labelsOf';
import { niceStep, onStep } from '../../../../taskpane/pane/substances/diagram/niceStep';
import { placeLabels } from '../../../../taskpane/pane/substances/diagram/placeLabels';
import { probeLabels } from '../../../../taskpane/pane/substances/diagram/probeLabels';
import { sidesOf } from '../../../../taskpane/pane/substances/diagram/sidesOf';
import { sliderWords } from '../../../../taskpane/pane/substances/diagram/sliderWords';
import { temperatureWindow, widened } from '../../../../taskpane/pane/substances/diagram/temperatureWindow';
import { onScale, unitWriter } from '../../../../taskpane/pane/substances/facts/unitWriter';
import { madeUp } from './madeUp';

const ATMOSPHERE = 101_325;
const wax = madeUp();
const ladder = wax.ladder(ATMOSPHERE);
const all = temperatureWindow(ladder);
const writer = unitWriter(DEFAULT_SETTINGS, wax.molarMass);
/** A few roundings of numbers up to 2e5. */
const ROUNDING = 1e-9;

describe('temperatureWindow', () => {
  it('holds every transition with room beside them, and no more than the ladder knows', () => {
    // 30 and 80 °C lie 50 K apart: 0.12 of the hotter one in kelvin, 42.4 K, is the wider room.
    expect(all.fromK).toBeCloseTo(303.15 - 0.12 * 353.15, 9);
    expect(all.toK).toBeCloseTo(353.15 + 0.12 * 353.15, 9);
    const cold = temperatureWindow(water.ladder(500));
    expect(cold.fromK).toBeGreaterThan(0);
  });

  it('looks closely at one transition, not across its neighbours', () => {
    const near = temperatureWindow(ladder, 0);
    expect(near.fromK).toBeLessThan(303.15);
    expect(near.toK).toBeGreaterThan(303.15);
    expect(near.toK).toBeLessThan(353.15);
  });

  it('reaches down to room temperature where that is near', () => {
    const hot = {
      ...ladder,
      gaps: [{ ...ladder.gaps[0]!, temperatureK: 380 }],
      rungs: [{ ...ladder.rungs[0]!, toK: 500 }],
    };
    expect(temperatureWindow(hot).fromK).toBe(298.15);
  });

  it('widens for a temperature outside, and for no other', () => {
    expect(widened(all, 320)).toEqual(all);
    expect(widened(all, 450).toK).toBeGreaterThan(450);
    expect(widened(all, 200).fromK).toBeLessThan(200);
  });
});

describe('diagramOf', () => {
  const diagram = diagramOf(wax, ladder, all, undefined);

  it('draws each stable phase from transition to transition, and follows it dashed beyond', () => {
    expect(diagram.lines.map(({ name, stable }) => [name, stable])).toEqual([
      ['solid (alpha)', true],
      ['solid (beta)', true],
      ['liquid', true],
      ['solid (alpha)', false],
      ['solid (beta)', false],
      ['liquid', false],
    ]);
    const beta = diagram.lines[1]?.points ?? [];
    expect(beta[0]).toEqual({ temperatureK: 303.15, enthalpy: 20_000 });
    expect(beta.at(-1)?.temperatureK).toBe(353.15);
    // 20 kJ/kg + 1.5 kJ/(kg K) × 50 K
    expect(Math.abs((beta.at(-1)?.enthalpy ?? 0) - 95_000)).toBeLessThanOrEqual(ROUNDING);
  });

  it('shows transitions as gaps of their heats', () => {
    expect(diagram.gaps.map(({ change, above, below }) => [change, Math.round(above - below)])).toEqual([
      ['alpha-beta', 20_000],
      ['fusion', 100_000],
    ]);
  });

  it('joins dashed lines to their own stable ones without a step', () => {
    for (const dashed of diagram.lines.filter(({ stable }) => !stable)) {
      const own = diagram.lines.find(({ name, stable }) => stable && name === dashed.name);
      const ends = (line: typeof own) => [line?.points[0], line?.points.at(-1)];
      const meeting = ends(dashed).flatMap((a) =>
        ends(own)
          .filter((b) => Math.abs((a?.temperatureK ?? 0) - (b?.temperatureK ?? 1)) < 1e-9)
          .map((b) => [a, b]),
      );
      expect(meeting.length).toBe(1);
      for (const [a, b] of meeting) {
        expect(Math.abs((a?.enthalpy ?? 0) - (b?.enthalpy ?? 1))).toBeLessThanOrEqual(1e-6);
      }
    }
  });

  it('follows only the named phases where it looks at one change', () => {
    const close = diagramOf(wax, ladder, temperatureWindow(ladder, 0), sidesOf(ladder, 0));
    expect([...new Set(close.lines.filter(({ stable }) => !stable).map(({ name }) => name))]).toEqual([
      'solid (alpha)',
      'solid (beta)',
    ]);
    expect(sidesOf(ladder, undefined)).toBeUndefined();
  });

  it('draws water as ice, liquid and vapour with its two gaps, and the vapour of cold water dashed', () => {
    const one = water.ladder(ATMOSPHERE);
    const drawn = diagramOf(water, one, temperatureWindow(one), undefined);
    expect(drawn.gaps.map(({ change }) => change)).toEqual(['fusion', 'vaporization']);
    expect(drawn.lines.filter(({ stable }) => !stable).map(({ name }) => name)).toContain('ideal gas');
    for (const { points } of drawn.lines) {
      for (const { enthalpy } of points) expect(Number.isFinite(enthalpy)).toBe(true);
    }
  });
});

describe('crossings', () => {
  it('meets every curve at a temperature, each with its slope', () => {
    // At 70 °C: beta 20 + 1.5 × 40 = 80 kJ/kg; liquid 195 − 2 × 10 = 175 kJ/kg; alpha is known to 60 °C only.
    const found = crossings(wax, ladder, 343.15);
    expect(found.map(({ name, stable }) => [name, stable])).toEqual([
      ['solid (beta)', true],
      ['liquid', false],
    ]);
    expect(Math.abs((found[0]?.enthalpy ?? 0) - 80_000)).toBeLessThanOrEqual(1e-6);
    expect(Math.abs((found[1]?.enthalpy ?? 0) - 175_000)).toBeLessThanOrEqual(1e-6);
    // A difference of two enthalpies near 2e5 over 0.1 K.
    expect(Math.abs((found[0]?.slope ?? 0) - 1500)).toBeLessThanOrEqual(1e-6);
    expect(Math.abs((found[1]?.slope ?? 0) - 2000)).toBeLessThanOrEqual(1e-6);
  });

  it('meets both sides of a transition at its own temperature', () => {
    const found = crossings(wax, ladder, 353.15);
    expect(found.map(({ name, stable }) => [name, stable])).toEqual([
      ['solid (beta)', true],
      ['liquid', true],
    ]);
    expect(Math.round((found[1]?.enthalpy ?? 0) - (found[0]?.enthalpy ?? 0))).toBe(100_000);
  });

  it('has the isobaric latent heat of water between liquid and vapour', () => {
    const found = crossings(water, water.ladder(ATMOSPHERE), 298.15);
    const at = (name: string) => found.find((one) => one.name === name)?.enthalpy ?? NaN;
    expect(found.find(({ name }) => name === 'liquid')?.stable).toBe(true);
    const boiling = crossings(water, water.ladder(ATMOSPHERE), water.saturationTemperature('stable').at(ATMOSPHERE));
    const gap = (boiling.at(-1)?.enthalpy ?? 0) - (boiling.at(-2)?.enthalpy ?? 0);
    // IAPWS R6-95(2018): 2256.47 kJ/kg at 101.325 kPa, half a unit of the last digit.
    expect(Math.abs(gap / water.molarMass - 2_256_470)).toBeLessThanOrEqual(5);
    // At 25 °C and one atmosphere vapour is followed as an ideal gas, and called so.
    expect(at('ideal gas') - at('liquid')).toBeGreaterThan(gap);
  });
});

describe('frame and labels', () => {
  const diagram = diagramOf(wax, ladder, all, undefined);
  const frame = frameOf(diagram, 292, {
    x: (kelvin) => onScale(kelvin, writer.temperature),
    y: (enthalpy) => onScale(enthalpy, writer.heat),
  });

  it('maps its edges to the ends of the values, there and back', () => {
    expect(pixelX(frame, frame.xFrom)).toBe(frame.left);
    expect(pixelX(frame, frame.xTo)).toBe(frame.width - frame.right);
    expect(pixelY(frame, frame.yFrom)).toBe(frame.height - frame.bottom);
    expect(pixelY(frame, frame.yTo)).toBe(frame.top);
    // One rounding each way of numbers near 100.
    expect(Math.abs(valueAtX(frame, pixelX(frame, 55)) - 55)).toBeLessThanOrEqual(1e-12);
    expect(valueAtX(frame, -100)).toBe(frame.xFrom);
    expect(valueAtX(frame, 5000)).toBe(frame.xTo);
  });

  it('keeps all labels inside, apart, and names what it can', () => {
    const labels = labelsOf(diagram, frame, writer);
    expect(labels.map(({ text }) => text)).toContain('fusion 100');
    expect(new Set(labels.map(({ text, role }) => text + role)).size).toBe(labels.length);
    const box = (label: (typeof labels)[number]) => {
      const width = label.text.length * 6;
      const left = label.anchor === 'start' ? label.x : label.anchor === 'end' ? label.x - width : label.x - width / 2;
      return { left, right: left + width, top: label.y - 6, bottom: label.y + 6 };
    };
    for (const [i, label] of labels.entries()) {
      const a = box(label);
      expect(a.left >= frame.left && a.right <= frame.width && a.top >= frame.top).toBe(true);
      for (const other of labels.slice(i + 1)) {
        const b = box(other);
        expect(a.right <= b.left || b.right <= a.left || a.bottom <= b.top || b.bottom <= a.top).toBe(true);
      }
    }
  });

  it('takes a shorter text, then no text, where there is no room', () => {
    const place = { x: 10, y: 20, anchor: 'start' as const };
    const wanted = { texts: ['a long name', 'short'], role: 'phase' as const, places: [place] };
    const area = { left: 0, right: 60, top: 0, bottom: 40 };
    expect(placeLabels([wanted], area, []).map(({ text }) => text)).toEqual(['short']);
    expect(placeLabels([wanted, wanted], area, [])).toHaveLength(1);
    expect(placeLabels([wanted], area, [{ x: 20, y: 20 }])).toEqual([]);
  });

  it('writes the heat at the movable temperature beside its bracket, clear of the names', () => {
    const names = labelsOf(diagram, frame, writer);
    const [number] = probeLabels(frame, crossings(wax, ladder, 343.15), 343.15, writer, names, []);
    // 175 − 80 kJ/kg
    expect(number?.text).toBe('95');
    expect(number?.role).toBe('probe');
  });
});

describe('the diagram in words and as a table', () => {
  it('says what it spans and what happens from cold to hot', () => {
    expect(diagramWords(wax.name, diagramOf(wax, ladder, all, undefined), writer)).toBe(
      'Enthalpy of wax two against temperature at 101.325 kPa, from −12.378 to 122.378 °C: ' +
        'solid (alpha), then alpha-beta at 30 °C over a gap of 20 kJ/kg; ' +
        'solid (beta), then fusion at 80 °C over a gap of 100 kJ/kg; liquid. ' +
        'Dashed, where it is not the stable phase: solid (alpha), solid (beta), liquid.',
    );
  });

  it('explains slopes, gaps and dashes as far as it has them, and what lies beyond', () => {
    const words = captionWords(diagramOf(wax, ladder, all, undefined), ladder, writer);
    expect(words).toContain('a gap is a latent heat, in kJ/kg, of the isobaric kind');
    expect(words).not.toContain('Colder');
    const whole = captionWords(diagramOf(wax, ladder, { fromK: 200, toK: 500 }, undefined), ladder, writer);
    expect(whole).toContain('Colder it would take the solid alpha heat capacity of wax two.');
    expect(whole).toContain('Hotter it would take the liquid heat capacity of wax two.');
  });

  it('lists phases with mean slopes and transitions with heats', () => {
    const rows = diagramRows(ladder);
    expect(rows.map(({ name }) => name)).toEqual(['solid (alpha)', 'alpha-beta', 'solid (beta)', 'fusion', 'liquid']);
    const [alpha, change] = rows;
    expect(alpha?.of === 'phase' && Math.abs((alpha.slope ?? 0) - 1000) < 1e-6).toBe(true);
    expect(change).toEqual({ of: 'transition', name: 'alpha-beta', atK: 303.15, latent: 20_000 });
  });

  it('reads the slider out: temperature, stable phase, heats between neighbours', () => {
    expect(sliderWords(ladder, crossings(wax, ladder, 343.15), 343.15, writer)).toBe(
      '70 °C, solid (beta), solid (beta) to liquid 95 kJ/kg',
    );
  });

  it('follows the decimal separator', () => {
    const comma = unitWriter(parseSettingsText('decimal=,', DEFAULT_SETTINGS), wax.molarMass);
    expect(sliderWords(ladder, [], 300, comma)).toBe('26,85 °C, solid (alpha)');
  });
});

describe('niceStep', () => {
  it.each([
    [180, 200, 1],
    [300, 200, 2],
    [1000, 200, 5],
    [1800, 200, 10],
    [0.9, 200, 0.005],
  ])('divides %s into about %s parts by %s', (span, parts, step) => {
    expect(niceStep(span, parts)).toBe(step);
  });

  it('stays a number for a span of nothing, and rounds to whole steps', () => {
    expect(niceStep(0, 200)).toBe(1);
    expect(onStep(99.974, 0.1)).toBe(100);
    expect(onStep(0.30000000000000004, 0.1)).toBe(0.3);
  });
});
