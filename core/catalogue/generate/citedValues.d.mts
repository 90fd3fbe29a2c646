import type { Models } from './holdOut.mjs';

export interface CitedValue {
  readonly name: string;
  readonly kind: 'p' | 'latent' | 'cp';
  readonly temperatureK: number;
  readonly value: number;
  readonly source: string;
  readonly confirmed: boolean;
  readonly deviation: number;
  readonly stated: number;
  readonly within: boolean;
}
export function citedValues(models: Models, fitted: unknown): CitedValue[];
