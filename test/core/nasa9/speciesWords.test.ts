import { describe, expect, it } from 'vitest';
import { catalogue } from '../../../core/catalogue/find';
import { Problem } from '../../../core/problem';
import { speciesLabel, speciesSource } from '../../../core/nasa9/speciesWords';
import { ask } from '../catalogue/tour';

describe('species of the data set in words', () => {
  it('have the symbols of the elements as usual', () => {
    const labels = ['AL', 'AL2O3(a)', 'NaCL', 'NH4CL(II)', 'LiCL', 'Ca(L)', 'H2SO4(L)'].map((name) =>
      speciesLabel({ name }),
    );
    expect(labels).toEqual(['Al', 'Al2O3(a)', 'NaCl', 'NH4Cl(II)', 'LiCl', 'Ca(L)', 'H2SO4(L)']);
  });

  it('cite without the abbreviations of the data set', () => {
    const words = (name: string, comment: string): string => speciesSource({ name, comment });
    expect(words('NaNO3(L)', 'Liquid. Gurvich,1982 pt1 p353 pt2 p388.')).toBe(
      'NaNO3(L): Liquid. Gurvich 1982, part 1 p. 353, part 2 p. 388',
    );
    expect(words('AL', 'Hf:Cox,1989. Kaufman,1991b. Gordon,1999.')).toBe(
      'Al: enthalpy of formation: Cox 1989. Kaufman 1991b. Gordon 1999',
    );
    expect(words('Fe(a)', 'Alpha. Below Lambda trans. Chase,1998 p1221.')).toBe(
      'Fe(a): Alpha. Below lambda transition Chase 1998, p. 1221',
    );
    expect(words('Na', 'Hf:Cox,1989. Martin,W.C.,1981. Gordon,1999.')).toBe(
      'Na: enthalpy of formation: Cox 1989. Martin, W.C. 1981. Gordon 1999',
    );
    expect(words('CaF2(a)', 'CrII,cubic.Gurvich,1996a pt1 p461 pt2 p361.')).toBe(
      'CaF2(a): CrII, cubic. Gurvich 1996a, part 1 p. 461, part 2 p. 361',
    );
  });

  it('carry no full stop into the list of sources, nor the capitals of the data set, anywhere in the catalogue', () => {
    const wrong: string[] = [];
    for (const { name } of catalogue.entries) {
      const substance = catalogue.find(name);
      for (const change of substance.changes) {
        const curve = ask(() => substance.latent(change, substance.defaultKind(change)));
        if (curve instanceof Problem) continue;
        for (const text of [curve.method, ...curve.sources]) {
          if (/\bHf:|\bpt\d|[AC]L|,\d{4}|\.$| {2}/.test(text)) wrong.push(`${name}, ${change}: ${text}`);
        }
      }
    }
    expect(wrong).toEqual([]);
  });
});
