/**
 * The library `latentry`: latent heats, heat capacities, heating paths, fits and units, in SI and without a host.
 */
export type { Answer, Datum, LatentKind, Mark } from './answer';
export { evaluate, valueAt, type OutOfRange } from './evaluate';
export { meanOver } from './meanOver';
export { nearest } from './nearest';
export { plainWords, Problem, type ProblemData, type QuantityWriter } from './problem';
export type {
  CatalogueEntry,
  Change,
  Curve,
  Gap,
  Ladder,
  LambdaPoint,
  Phase,
  Rung,
  Substance,
  SubstanceGroup,
  Surface,
} from './substance';
export { catalogue, findChange, findPhase, findSubstance } from './catalogue/find';
export { makeRegistry, type Registry } from './catalogue/registry';
export { water } from './water/water';

export { convertLine, type ScaleChange } from './fit/convertLine';
export { fitDeltaCp, type FitOptions } from './fit/fitDeltaCp';
export { FIT_COLUMNS, FIT_ROWS, fitTable, type FitLabels } from './fit/fitTable';
export type { Curvature, FitBasis, Interval, LineDiagnostics, LineFit } from './fit/fitTypes';
export { latentFromFit, type FitPrediction } from './fit/latentFromFit';
export type { LeftOut } from './fit/leftOut';
export { readFitTable, type FitFromTable } from './fit/readFitTable';
export { readRows, type Rows } from './fit/readRows';

export type { House, HouseFault } from './house/house';
export { houseRegistry } from './house/houseRegistry';
export { monotoneTable } from './house/monotoneTable';
export { readHouse, type HouseOptions } from './house/readHouse';

export { readForm, type Form } from './kirchhoff/form';
export { kirchhoff, type KirchhoffInput, type KirchhoffResult } from './kirchhoff/kirchhoff';

export { nasa9Cp } from './nasa9/nasa9Cp';
export { nasa9Enthalpy } from './nasa9/nasa9Enthalpy';
export { nasa9Entropy } from './nasa9/nasa9Entropy';
export { nasa9Gibbs } from './nasa9/nasa9Gibbs';
export { nasa9Species } from './nasa9/nasa9Species';
export type { Nasa9Species } from './nasa9/nasa9Types';

export { enthalpy } from './path/enthalpy';
export { heat } from './path/heat';
export { heatSteps, type HeatPath, type HeatStep } from './path/heatSteps';
export { placeState } from './path/placeState';
export type { Place } from './path/place';
export type { State } from './path/state';

export { conversion, type ConversionNeeds } from './units/conversion';
export { convert } from './units/convert';
export { differenceUnit } from './units/differenceUnit';
export { fromSi } from './units/fromSi';
export { fromMolar } from './units/fromMolar';
export { parseQuantity, type Quantity, type QuantitySettings } from './units/parseQuantity';
export { readHeader, type Header } from './units/readHeader';
export { toMolar } from './units/toMolar';
export { toSi } from './units/toSi';
export type { Basis, QuantityKind, Unit, UnitKind } from './units/unit';
export { unitOf } from './units/unitOf';

export { chiSquareAbove } from './statistics/chiSquareAbove';
export { compensatedSum } from './statistics/compensatedSum';
export { fisherFAbove } from './statistics/fisherFAbove';
export { studentTBelow } from './statistics/studentTBelow';
export { studentTBothTails } from './statistics/studentTBothTails';
export { studentTQuantile } from './statistics/studentTQuantile';

export {
  COMPOSITION_PARTS,
  compositionHeatCapacity,
  compositionPolynomial,
  type Composition,
} from './estimate/compositionHeatCapacity';
export { acentricLatent } from './estimate/acentricLatent';
export { atomsOf } from './estimate/atomsOf';
export type { BoilingPoint } from './estimate/boilingPoint';
export { chenLatent } from './estimate/chenLatent';
export { chickosDifference } from './estimate/chickosDifference';
export { chickosLatent, type ChickosInput } from './estimate/chickosLatent';
export { kistiakowskyLatent } from './estimate/kistiakowskyLatent';
export { koppHeatCapacity } from './estimate/koppHeatCapacity';
export { neumannHeatCapacity, type Constituent } from './estimate/neumannHeatCapacity';
export { riedelLatent } from './estimate/riedelLatent';
export { troutonLatent } from './estimate/troutonLatent';
export { vetereLatent } from './estimate/vetereLatent';
export { watsonLatent, type WatsonInput } from './estimate/watsonLatent';
