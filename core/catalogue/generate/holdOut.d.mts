export interface Judged {
  readonly name: string;
  readonly kind: 'p' | 'latent' | 'cp';
  readonly reduced: number;
  readonly deviation: number;
  readonly stated: number;
}
export interface Models {
  readonly [name: string]: unknown;
}
export function loadForHoldOut(): Promise<Models>;
export function majerHoldOut(models: Models): Promise<Judged[]>;
export function leaveOneOut(models: Models): Promise<Judged[]>;
export function waterHoldOut(models: Models): Judged[];
