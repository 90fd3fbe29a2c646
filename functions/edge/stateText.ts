import { findPhase, plainName } from '../../core/catalogue/find';
import type { State } from '../../core/path/state';
import { Problem } from '../../core/problem';
import { parseQuantity } from '../../core/units/parseQuantity';
import type { Phase } from '../../core/substance';
import type { Settings } from '../settings/settings';
import { unitFor } from './unitFor';
import type { Key } from './spec';

const ALLOWED =
  'a temperature, or a text as "98 degC liquid", "saturated liquid", "saturated vapor", "vapor fraction 0.95", "subcooled 5 K", "superheated 10 K", "melting solid", "melting liquid"';

/** Reads a state: a number is a temperature in the workbook's unit, a text says more. */
export function stateKey(argument: string, key: Key, settings: Settings): State {
  if (typeof key === 'number') {
    const unit = unitFor('temperature', settings);
    const temperatureK = key * unit.factor + unit.offset;
    if (temperatureK > 0) return { form: 'temperature', temperatureK };
    throw refused(argument, `${key} ${unit.symbol}, at or below absolute zero`);
  }
  if (key === undefined) throw refused(argument, 'nothing');
  return readState(argument, key, settings);
}

function readState(argument: string, text: string, settings: Settings): State {
  const words = text.trim().toLowerCase().split(/\s+/);
  const [first = '', ...others] = words;
  const rest = text.trim().slice(first.length).trim();
  switch (first) {
    case 'saturated': {
      const phase = phaseWord(argument, text, rest);
      if (phase === 'solid') throw refused(argument, `"${text}"`);
      return { form: 'saturated', phase };
    }
    case 'melting': {
      const phase = phaseWord(argument, text, rest);
      if (phase === 'gas') throw refused(argument, `"${text}"`);
      return { form: 'melting', phase };
    }
    case 'vapor':
    case 'vapour':
      if (others[0] === 'fraction') {
        return { form: 'fraction', vapor: parseQuantity(others.slice(1).join(' '), 'share', settings, argument).si };
      }
      throw refused(argument, `"${text}"`);
    case 'subcooled':
    case 'superheated':
      return { form: first, deltaK: parseQuantity(rest, 'difference', settings, argument).si };
    default:
      return temperatureState(argument, text, settings);
  }
}

/** A temperature with its unit, and perhaps a phase behind it. */
function temperatureState(argument: string, text: string, settings: Settings): State {
  const match = /^(.*?)[\s,]+([a-z]+)$/i.exec(text.trim());
  const phase = match === null ? undefined : phaseOf(match[2] ?? '');
  const quantity = phase === undefined ? text : (match?.[1] ?? '');
  // words where a number should stand are no slip in a unit: the whole list of states helps more
  if (!/^[-+−.,]?\s*\d/.test(quantity.trim())) throw refused(argument, `"${text}"`);
  const temperatureK = parseQuantity(quantity, 'temperature', settings, argument).si;
  return phase === undefined ? { form: 'temperature', temperatureK } : { form: 'temperature', temperatureK, phase };
}

function phaseOf(word: string): Phase | undefined {
  try {
    return findPhase(word);
  } catch {
    return undefined;
  }
}

function phaseWord(argument: string, text: string, word: string): Phase {
  const phase = phaseOf(plainName(word));
  if (phase === undefined) throw refused(argument, `"${text}"`);
  return phase;
}

function refused(argument: string, received: string): Problem {
  return new Problem({ code: 'argument', argument, allowed: ALLOWED, received });
}
