export const CRC = 'CRC Handbook of Chemistry and Physics, from memory';
export const JANAF = 'NIST-JANAF Thermochemical Tables, 4th ed. (1998), from memory';
export const ITS90 = 'International Temperature Scale of 1990, fixed point, from memory';
export const CALIBRATION = 'calorimetric calibration value, from memory';
export const TRADE = 'literature of the trade, from memory';
