/** Melting and sublimation pressures of ordinary water: IAPWS R14-08(2011), Eqs. 1 to 6. */

/** Phases of ice that meet the liquid, with the temperature range of their melting curve, K. */
export const MELTING_RANGES = {
  Ih: [251.165, 273.16],
  III: [251.165, 256.164],
  V: [256.164, 273.31],
  VI: [273.31, 355],
  VII: [355, 715],
} as const;
export type IcePhase = keyof typeof MELTING_RANGES;

/** Pressure at which ice Ih, ice III and liquid meet: above it no ice Ih melts, Pa. */
export const HIGHEST_ICE_IH_PRESSURE_PA = 208.566e6;

/** Melting pressure of one phase of ice, Pa. */
export function meltingPressureFit(phase: IcePhase, temperatureK: number): number {
  switch (phase) {
    case 'Ih': {
      const theta = temperatureK / 273.16;
      return (
        611.657 *
        (1 + 1195393.37 * (1 - theta ** 3) + 80818.3159 * (1 - theta ** 25.75) + 3338.2686 * (1 - theta ** 103.75))
      );
    }
    case 'III':
      return 208.566e6 * (1 - 0.299948 * (1 - (temperatureK / 251.165) ** 60));
    case 'V':
      return 350.1e6 * (1 - 1.18721 * (1 - (temperatureK / 256.164) ** 8));
    case 'VI':
      return 632.4e6 * (1 - 1.07476 * (1 - (temperatureK / 273.31) ** 4.6));
    case 'VII': {
      const theta = temperatureK / 355;
      return (
        2216e6 * Math.exp(1.73683 * (1 - 1 / theta) - 0.0544606 * (1 - theta ** 5) + 8.06106e-8 * (1 - theta ** 22))
      );
    }
  }
}

/** Sublimation pressure of ice Ih, 50 K to 273.16 K, Pa. */
export function sublimationPressureFit(temperatureK: number): number {
  const theta = temperatureK / 273.16;
  return (
    611.657 *
    Math.exp(
      (-21.2144006 * theta ** 0.00333333333 + 27.3203819 * theta ** 1.20666667 - 6.1059813 * theta ** 1.70333333) /
        theta,
    )
  );
}

/** Lowest temperature of the liquid at a pressure above the reach of ice Ih (208.566 MPa to 1000 MPa), K. */
export function highPressureMeltingTemperature(pressurePa: number): number {
  if (pressurePa <= 350.1e6) return 251.165 * (1 + (pressurePa / 208.566e6 - 1) / 0.299948) ** (1 / 60);
  if (pressurePa <= 632.4e6) return 256.164 * (1 + (pressurePa / 350.1e6 - 1) / 1.18721) ** (1 / 8);
  return 273.31 * (1 + (pressurePa / 632.4e6 - 1) / 1.07476) ** (1 / 4.6);
}
