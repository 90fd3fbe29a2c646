/** One standard atmosphere, Pa: the pressure where none is given (BIPM SI Brochure; 10th CGPM, 1954). */
export const STANDARD_ATMOSPHERE_PA = 101325;
