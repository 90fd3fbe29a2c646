import type { Mark } from '../../answer';

export const IDEAL_GAS: Mark = {
  code: 'ideal-gas',
  text: 'vapour as an ideal gas, volume of the condensed phase neglected',
};

export function METASTABLE(text: string): Mark {
  return { code: 'metastable', text };
}
