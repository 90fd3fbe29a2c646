import type { Nasa9Species } from './nasa9Types';

/** The name of a species with the symbols of the elements as usual: the data set writes AL and CL. */
export function speciesLabel({ name }: Pick<Nasa9Species, 'name'>): string {
  return name.replace(/([AC])L/g, '$1l');
}

/** The data set's own short reference of a species, opened up for a reader: `NaCl(L): Liquid. Gurvich 1982, part 1 p. 335`. */
export function speciesSource(species: Pick<Nasa9Species, 'name' | 'comment'>): string {
  const words = species.comment
    .replace(/\.\s*$/, '')
    .replace(/\bHf:\s*/g, 'enthalpy of formation: ')
    .replace(/,\s?(\d{4}[ab]?)(?=[\s.,]|$)/g, ' $1')
    .replace(/\s+/g, ' ')
    .replace(/\s?\bpt(\d) p?(\d)/g, ', part $1 p. $2')
    .replace(/\s?\bp{1,2}(?=\d)/g, ', p. ')
    .replace(/([a-z)])([.,])(?=[A-Z])/g, '$1$2 ')
    .replace(/,(?=[a-z])/g, ', ')
    .replace(/\blambda trans\b\.?/gi, 'lambda transition')
    .replace(/\s+,/g, ',')
    .trim();
  return `${speciesLabel(species)}: ${words}`;
}
