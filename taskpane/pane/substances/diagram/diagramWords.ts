import { number } from '../../look/number';
import { onScale, written, type UnitWriter } from '../facts/unitWriter';
import type { Diagram } from './diagramOf';

/** The diagram for those who cannot see it: its span, then every phase and transition from cold to hot. */
export function diagramWords(name: string, diagram: Diagram, writer: UnitWriter): string {
  const { temperature, pressure, heat, decimal } = writer;
  const at = (kelvin: number) => written(kelvin, temperature, decimal);
  const stable = diagram.lines.filter((line) => line.stable);
  const steps = stable.map((line, i) => {
    const gap = diagram.gaps[i];
    if (gap === undefined) return line.name;
    const latent = number((gap.above - gap.below) * heat.scale, decimal);
    return `${line.name}, then ${gap.change} at ${at(gap.temperatureK)} over a gap of ${latent} ${heat.unit}`;
  });
  const dashed = [...new Set(diagram.lines.filter((line) => !line.stable).map((line) => line.name))];
  const beyond = dashed.length === 0 ? '' : ` Dashed, where it is not the stable phase: ${dashed.join(', ')}.`;
  return (
    `Enthalpy of ${name} against temperature at ${written(diagram.pressurePa, pressure, decimal)}, ` +
    `from ${number(onScale(diagram.window.fromK, temperature), decimal)} to ${at(diagram.window.toK)}: ` +
    `${steps.join('; ')}.${beyond}`
  );
}
