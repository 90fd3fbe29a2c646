import type { Gap, Ladder, Rung } from '../substance';
import { idealBranch, requirePressure } from './fluidBranch';
import type { FluidParts } from './fluidParts';

/**
 * Phases and transitions of a fluid at one pressure, from the solid at its melting point (or below, where its heat capacity
 * is known) to the vapour.
 *
 * @throws Problem `range` above the pressure to which vapour on the saturation line is described
 */
export function fluidLadder(parts: FluidParts, pressurePa: number): Ladder {
  const { numbers, line, highestVapourPa } = parts;
  requirePressure(pressurePa, highestVapourPa, `heating paths of ${numbers.name}`);
  return pressurePa < line.pressure(numbers.meltingK)
    ? belowTriple(parts, pressurePa)
    : throughLiquid(parts, pressurePa);
}

function throughLiquid(parts: FluidParts, pressurePa: number): Ladder {
  const { numbers, line, liquid, solid } = parts;
  const { meltingK, fusion } = numbers;
  const boils = line.temperature(pressurePa);
  const liquidRung: Rung = {
    phase: 'liquid',
    fromK: meltingK,
    toK: boils,
    enthalpy: (k) => liquid.enthalpy(k, pressurePa),
  };
  const gas = gasRung(parts, pressurePa, boils);
  const boiling = gapBetween('vaporization', boils, liquidRung, gas);
  const missing = missingOf(parts);
  if (fusion === undefined) return { pressurePa, rungs: [liquidRung, gas], gaps: [boiling], ...missing };
  const top = liquidRung.enthalpy(meltingK) - fusion.value;
  const melting: Rung =
    solid === undefined
      ? { phase: 'solid', fromK: meltingK, toK: meltingK, enthalpy: () => top }
      : { phase: 'solid', fromK: solid.fromK, toK: meltingK, enthalpy: solid.enthalpy };
  return {
    pressurePa,
    rungs: [melting, liquidRung, gas],
    gaps: [gapBetween('fusion', meltingK, melting, liquidRung), boiling],
    ...missing,
  };
}

/** Solid and vapour, or the vapour alone where nothing is known of the solid. */
function belowTriple(parts: FluidParts, pressurePa: number): Ladder {
  const { numbers, sublimation, solid } = parts;
  const missing = missingOf(parts);
  if (sublimation === undefined || solid === undefined || pressurePa < sublimation.pressure(sublimation.fromK)) {
    const { meltingK, name } = numbers;
    const from = sublimation === undefined ? meltingK : sublimation.fromK;
    const gas = gasRung(parts, pressurePa, from);
    return { pressurePa, rungs: [gas], gaps: [], ...missing, missingBelow: `heat capacity of solid ${name}` };
  }
  const frost = sublimation.temperature(pressurePa);
  const gas = gasRung(parts, pressurePa, frost);
  const cold: Rung = { phase: 'solid', fromK: solid.fromK, toK: frost, enthalpy: solid.enthalpy };
  return { pressurePa, rungs: [cold, gas], gaps: [gapBetween('sublimation', frost, cold, gas)], ...missing };
}

/** Vapour from a temperature on; only at that temperature where its heat capacity is not known. */
function gasRung(parts: FluidParts, pressurePa: number, fromK: number): Rung {
  const { gas, line } = parts;
  if (gas === undefined) {
    const enthalpy = line.liquid(fromK) + line.latent(fromK);
    return { phase: 'gas', fromK, toK: fromK, enthalpy: () => enthalpy };
  }
  return { phase: 'gas', fromK, toK: idealBranch(parts).toK, enthalpy: (k) => gas.enthalpy(k, pressurePa) };
}

function gapBetween(change: string, temperatureK: number, below: Rung, above: Rung): Gap {
  return { change, temperatureK, below: below.enthalpy(temperatureK), above: above.enthalpy(temperatureK) };
}

function missingOf({ numbers, gas, solid }: FluidParts): Pick<Ladder, 'sources' | 'missingBelow' | 'missingAbove'> {
  const { sources, fusion, name } = numbers;
  const cited = [...sources.latent, ...sources.heatCapacity, ...sources.gas];
  return {
    sources: [...new Set(fusion === undefined ? cited : [...cited, fusion.source])],
    ...(solid === undefined ? { missingBelow: `heat capacity of solid ${name}` } : {}),
    ...(gas === undefined ? { missingAbove: `heat capacity of ${name} vapour` } : {}),
  };
}
