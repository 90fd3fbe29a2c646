import type { Phase, Rung } from '../../../../core/substance';

/** A rung is a phase's own where phase and crystal form agree; a supercritical rung is liquid and gas in one. */
export function belongsTo(rung: Rung, phase: Phase, form: string | undefined): boolean {
  if (rung.phase === 'supercritical') return phase !== 'solid';
  return rung.phase === phase && (form === undefined || rung.form === undefined || rung.form === form);
}
