import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { heat } from '../../../core/path/heat';
import { plainWords, Problem } from '../../../core/problem';
import type { Curve, Substance } from '../../../core/substance';
import { ask, ATMOSPHERE, KINDS, placesOn, seeded, substances, tours } from './tour';

/** Fourth-order central difference; truncation h^4 f^(5)/30, rounding some eps f/h. */
function derivative(curve: Curve, t: number, h: number): number {
  const rise = (step: number): number => curve.at(t + step) - curve.at(t - step);
  return (8 * rise(h) - rise(2 * h)) / (12 * h);
}

const number = (value: number): string => value.toPrecision(8);

describe('every curve of every substance', () => {
  it('is finite from one end of its range to the other', () => {
    const draw = seeded(1);
    const wrong: string[] = [];
    for (const { what, curve } of tours.flatMap(({ curves }) => curves)) {
      if (!(curve.from <= curve.to)) wrong.push(`${what}: range ${curve.from} to ${curve.to}`);
      for (const x of placesOn(curve, 25, draw)) {
        if (Number.isFinite(curve.at(x))) continue;
        wrong.push(`${what}: ${curve.at(x)} at ${x}`);
        break;
      }
    }
    expect(wrong).toEqual([]);
  });

  it('states an uncertainty that is finite and not negative, or none', () => {
    const draw = seeded(2);
    const wrong: string[] = [];
    for (const { what, curve } of tours.flatMap(({ curves }) => curves)) {
      for (const x of placesOn(curve, 5, draw)) {
        const u = curve.uncertaintyAt?.(x);
        if (u === undefined || (u >= 0 && Number.isFinite(u))) continue;
        wrong.push(`${what}: uncertainty ${u} at ${x}`);
        break;
      }
    }
    expect(wrong).toEqual([]);
  });

  it('names its method, its sources and what it describes, and its marks speak', () => {
    const wrong: string[] = [];
    for (const { what, curve } of tours.flatMap(({ curves }) => curves)) {
      if (curve.method.trim() === '' || curve.subject.trim() === '') wrong.push(`${what}: no method or subject`);
      if (curve.sources.length === 0 || curve.sources.some((s) => s.trim().length < 5)) wrong.push(`${what}: sources`);
      for (const x of [curve.from, curve.to]) {
        for (const mark of curve.marksAt?.(x) ?? [])
          if (mark.text.trim() === '') wrong.push(`${what}: mark ${mark.code}`);
      }
    }
    expect(wrong).toEqual([]);
  });

  it('of latent heat is not negative, but for a metastable continuation', () => {
    const draw = seeded(3);
    const wrong: string[] = [];
    for (const { pairs } of tours) {
      for (const { what, latent } of pairs) {
        for (const x of placesOn(latent, 10, draw)) {
          const metastable = latent.marksAt?.(x).some(({ code }) => code === 'metastable') ?? false;
          if (metastable || latent.at(x) >= 0) continue;
          wrong.push(`${what}: ${latent.at(x)} J/mol at ${x} K`);
          break;
        }
      }
    }
    expect(wrong).toEqual([]);
  });

  it('of heat capacity is positive', () => {
    const draw = seeded(4);
    const wrong: string[] = [];
    for (const { what, curve } of tours.flatMap(({ curves }) => curves)) {
      if (!what.includes(' cp ')) continue;
      for (const x of placesOn(curve, 10, draw)) {
        // Third law: nothing at 0 K itself.
        if (x > 0 && !(curve.at(x) > 0)) wrong.push(`${what}: ${curve.at(x)} at ${x} K`);
      }
    }
    expect(wrong).toEqual([]);
  });
});

describe('the slope of a latent heat', () => {
  it('is the derivative of the latent heat of the same kind', () => {
    const draw = seeded(5);
    const wrong: string[] = [];
    for (const { what, latent, slope } of tours.flatMap(({ pairs }) => pairs)) {
      const from = Math.max(latent.from, slope.from);
      const to = Math.min(latent.to, slope.to);
      if (to - from < 1) continue;
      // Near a critical point latent heats run into it like a power below one: no difference quotient holds there.
      const margin = 0.03 * (to - from);
      const h = Math.min(margin / 4, 2e-4 * to);
      let smooth = 0;
      for (let i = 0; i < 12; i++) {
        const t = from + margin + (to - from - 2 * margin) * draw();
        const expected = derivative(latent, t, h);
        const scale = Math.abs(expected) + Math.abs(latent.at(t)) / t;
        // A crystal form changes, or a polynomial ends, within the stencil: there is a jump or a corner, and no derivative.
        if (Math.abs(derivative(latent, t, h / 3) - expected) > 1e-5 * scale) continue;
        smooth++;
        if (Math.abs(slope.at(t) - expected) <= 2e-5 * scale) continue;
        wrong.push(`${what} at ${number(t)} K: slope ${number(slope.at(t))}, difference ${number(expected)}`);
        break;
      }
      if (smooth < 6) wrong.push(`${what}: smooth at ${smooth} of 12 places only`);
    }
    expect(wrong).toEqual([]);
  });
});

describe('the saturation line', () => {
  const lines = tours.flatMap(({ substance, curves }) =>
    (['stable', 'ice', 'liquid'] as const).flatMap((surface) => {
      const find = (property: string) => curves.find(({ what }) => what === `${substance.name} ${property} ${surface}`);
      const pressure = find('saturation pressure');
      const temperature = find('saturation temperature');
      return pressure === undefined ? [] : [{ what: pressure.what, p: pressure.curve, t: temperature?.curve }];
    }),
  );

  it('rises with temperature', () => {
    const wrong: string[] = [];
    for (const { what, p } of lines) {
      let last = p.at(p.from);
      for (let i = 1; i <= 400; i++) {
        const t = Math.min(p.to, p.from + ((p.to - p.from) * i) / 400);
        const next = p.at(t);
        if (!(next > last)) {
          wrong.push(`${what}: ${last} Pa, then ${next} Pa at ${t} K`);
          break;
        }
        last = next;
      }
    }
    expect(wrong).toEqual([]);
  });

  it('is the same read backwards: T(p(T)) = T', () => {
    const draw = seeded(6);
    const wrong: string[] = [];
    for (const { what, p, t } of lines) {
      if (t === undefined) {
        wrong.push(`${what}: no way back`);
        continue;
      }
      for (const x of placesOn(p, 20, draw)) {
        const pressure = Math.min(Math.max(p.at(x), t.from), t.to);
        // 1e-9 of T from the solver, and what the ends of the range leave of the pressure.
        if (Math.abs(t.at(pressure) - x) <= 1e-8 * x) continue;
        wrong.push(`${what} at ${x} K: back at ${t.at(pressure)} K`);
        break;
      }
    }
    expect(wrong).toEqual([]);
  });
});

/** Hottest and coldest temperature that the ladder knows. */
function ends(substance: Substance): { from: number; to: number } | undefined {
  const ladder = ask(() => substance.ladder(ATMOSPHERE));
  if (ladder instanceof Problem) return undefined;
  const first = ladder.rungs[0];
  const last = ladder.rungs.at(-1);
  return first === undefined || last === undefined ? undefined : { from: first.fromK, to: Math.min(last.toK, 6000) };
}

describe('heating paths at one atmosphere', () => {
  it('ladders are whole: rungs meet at their transitions, and enthalpy rises', () => {
    const wrong: string[] = [];
    for (const substance of substances) {
      const ladder = ask(() => substance.ladder(ATMOSPHERE));
      if (ladder instanceof Problem) {
        wrong.push(`${substance.name}: ${ladder.message}`);
        continue;
      }
      const { rungs, gaps } = ladder;
      if (rungs.length !== gaps.length + 1) wrong.push(`${substance.name}: ${rungs.length} rungs, ${gaps.length} gaps`);
      gaps.forEach((gap, i) => {
        const [cold, hot] = [rungs[i], rungs[i + 1]];
        if (cold?.toK !== gap.temperatureK || hot?.fromK !== gap.temperatureK) {
          wrong.push(
            `${substance.name}: ${gap.change} at ${gap.temperatureK} K between ${cold?.toK} and ${hot?.fromK} K`,
          );
        } else {
          const size = Math.abs(gap.above) + Math.abs(gap.below) + 1;
          if (Math.abs(cold.enthalpy(gap.temperatureK) - gap.below) > 1e-9 * size)
            wrong.push(`${substance.name}: below`);
          if (Math.abs(hot.enthalpy(gap.temperatureK) - gap.above) > 1e-9 * size)
            wrong.push(`${substance.name}: above`);
        }
        if (!(gap.above >= gap.below)) wrong.push(`${substance.name}: ${gap.change} gives heat off`);
      });
      for (const rung of rungs) {
        const to = Math.min(rung.toK, 6000);
        let last = -Infinity;
        for (let i = 0; i <= 20; i++) {
          const h = rung.enthalpy(rung.fromK + ((to - rung.fromK) * i) / 20);
          if (!(h >= last) || !Number.isFinite(h))
            wrong.push(`${substance.name} ${rung.form ?? ''} ${rung.phase}: ${h}`);
          last = h;
        }
      }
    }
    expect(wrong).toEqual([]);
  });

  it.each(substances.map((substance) => [substance.name, substance] as const))(
    'of %s: a cycle closes and the way back turns the sign',
    (_, substance) => {
      const span = ends(substance);
      if (span === undefined) return;
      const temperature = fc.double({ min: span.from, max: span.to, noNaN: true });
      fc.assert(
        fc.property(temperature, temperature, temperature, (a, b, c) => {
          const go = (from: number, to: number): number | Problem =>
            ask(() =>
              heat(
                substance,
                { form: 'temperature', temperatureK: from },
                { form: 'temperature', temperatureK: to },
                ATMOSPHERE,
              ),
            );
          const [ab, bc, ca, ba] = [go(a, b), go(b, c), go(c, a), go(b, a)];
          for (const way of [ab, bc, ca, ba]) {
            // A path may only be refused for what it would have to guess.
            if (way instanceof Problem) return way.data.code === 'argument' || way.data.code === 'missing';
          }
          const size = 1 + Math.abs(Number(ab)) + Math.abs(Number(bc)) + Math.abs(Number(ca));
          // Three differences of enthalpies, whose zero may lie far off: 1e-9 of what is added up.
          return (
            Math.abs(Number(ab) + Number(bc) + Number(ca)) <= 1e-9 * size &&
            Math.abs(Number(ab) + Number(ba)) <= 1e-9 * size
          );
        }),
        { seed: 2006, numRuns: 40 },
      );
    },
  );

  it('across boiling and melting take up what LATENT says', () => {
    const wrong: string[] = [];
    const boils: Substance[] = [];
    for (const substance of substances) {
      const line = ask(() => substance.saturationPressure('liquid'));
      const latent = ask(() => substance.latent('vaporization', 'coexistence'));
      if (!(line instanceof Problem) && !(latent instanceof Problem)) {
        const from = Math.max(line.from, latent.from);
        const to = Math.min(line.to, latent.to);
        for (const share of [0.3, 0.5, 0.7, 0.9]) {
          const t = from + share * (to - from);
          const across = ask(() =>
            heat(substance, { form: 'saturated', phase: 'liquid' }, { form: 'saturated', phase: 'gas' }, line.at(t)),
          );
          if (across instanceof Problem) {
            // Near the critical point a path may be refused, with its range.
            if (across.data.code === 'argument') wrong.push(`${substance.name} at ${number(t)} K: ${across.message}`);
          } else {
            boils.push(substance);
            if (Math.abs(across - latent.at(t)) > 1e-6 * latent.at(t)) {
              wrong.push(`${substance.name} at ${number(t)} K: HEAT ${number(across)}, LATENT ${number(latent.at(t))}`);
            }
          }
        }
      }
      const melts = substance.transitionTemperature('fusion');
      const fusion = ask(() => substance.latent('fusion', 'isobaric'));
      if (melts === undefined || fusion instanceof Problem) continue;
      const across = ask(() =>
        heat(substance, { form: 'melting', phase: 'solid' }, { form: 'melting', phase: 'liquid' }, ATMOSPHERE),
      );
      if (across instanceof Problem) {
        // Carbon dioxide has no liquid at one atmosphere.
        if (across.data.code !== 'missing') wrong.push(`${substance.name}: ${across.message}`);
      } else if (Math.abs(across - fusion.at(melts)) > 1e-6 * fusion.at(melts)) {
        wrong.push(`${substance.name} melting: HEAT ${number(across)}, LATENT ${number(fusion.at(melts))}`);
      }
    }
    expect(wrong).toEqual([]);
    expect(new Set(boils).size).toBeGreaterThanOrEqual(40);
  });
});

describe('what is missing is said, never guessed', () => {
  it('every problem is data with words, and names the substance', () => {
    const wrong: string[] = [];
    for (const { what, problem } of tours.flatMap(({ substance, problems }) =>
      problems.map((p) => ({ ...p, substance })),
    )) {
      const words = plainWords(problem.data);
      if (problem.data.code === 'argument') wrong.push(`${what}: ${words}`);
      if (/undefined|NaN|Infinity|null|\[object/.test(words) || words.trim() !== words || words.length < 12) {
        wrong.push(`${what}: "${words}"`);
      }
    }
    expect(wrong).toEqual([]);
  });

  it('every change listed has a latent heat, of its default kind or else of one that is named, at its own temperature', () => {
    const wrong: string[] = [];
    for (const substance of substances) {
      for (const change of substance.changes) {
        const latent = ask(() => substance.latent(change, substance.defaultKind(change)));
        if (latent instanceof Problem) {
          // A vapour that associates: the step to the single molecules may be all that is known, and is named.
          const some = KINDS.some((kind) => !(ask(() => substance.latent(change, kind)) instanceof Problem));
          if (!some || !/kind=/.test(latent.message)) wrong.push(`${substance.name} ${change}: ${latent.message}`);
          continue;
        }
        const at = substance.transitionTemperature(change);
        if (at !== undefined && !(at >= latent.from && at <= latent.to)) {
          wrong.push(`${substance.name} ${change}: ${at} K is outside [${latent.from}, ${latent.to}] K`);
        }
        if ((change === 'fusion' || change.includes('-')) && at === undefined)
          wrong.push(`${substance.name} ${change}: when?`);
      }
    }
    expect(wrong).toEqual([]);
  });

  it('disagreement is a small number with its sources, or is said to be missing', () => {
    const wrong: string[] = [];
    for (const substance of substances) {
      for (const change of substance.changes) {
        const latent = ask(() => substance.latent(change, substance.defaultKind(change)));
        if (latent instanceof Problem) continue;
        const [a, b] = [0.4, 0.6].map((share) => latent.from + share * (latent.to - latent.from));
        const answer = ask(() => substance.disagreement(change, a!, b!));
        if (answer instanceof Problem) continue;
        // Cited data of one substance may differ by some percent of the latent heat; more is a mistake.
        const most = 0.1 * Math.abs(latent.at(a!));
        if (!(Math.abs(answer.value) <= most) || answer.sources.length === 0) {
          wrong.push(`${substance.name} ${change}: ${answer.value} J/mol of ${latent.at(a!)}`);
        }
      }
    }
    expect(wrong).toEqual([]);
  });
});
