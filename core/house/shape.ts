/** A property as a function of temperature, K; values in the unit that its owner says. */
export interface Shape {
  at(temperatureK: number): number;
  /** Its derivative. */
  slope(temperatureK: number): number;
}

/** A heat capacity: its integral is needed too. */
export interface AreaShape extends Shape {
  /** Integral between two temperatures. */
  area(fromK: number, toK: number): number;
}
