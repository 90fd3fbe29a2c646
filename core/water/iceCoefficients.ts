/** Coefficients of the Gibbs equation for ice Ih: IAPWS R10-06(2009), Tables 1 and 2. */

export const TRIPLE_TEMPERATURE_K = 273.16;
/** Experimental triple-point pressure; here only the reducing pressure. */
export const ICE_REDUCING_PRESSURE_PA = 611.657;
export const NORMAL_PRESSURE_PA = 101325;

/** g00 to g04, J/kg. */
export const ICE_G0 = [
  -632020.233335886, 0.655022213658955, -1.89369929326131e-8, 3.39746123271053e-15, -5.56464869058991e-22,
] as const;
/** The version of s0 that shares the reference state of R6-95, J/(kg K). */
export const ICE_S0 = -3327.33756492168;
export const ICE_T1 = [0.0368017112855051, 0.0510878114959572] as const;
export const ICE_T2 = [0.337315741065416, 0.335449415919309] as const;
/** J/(kg K) */
export const ICE_R1 = [44.7050716285388, 65.6876847463481] as const;
export const ICE_R20 = [-72.597457432922, -78.100842711287] as const;
export const ICE_R21 = [-5.57107698030123e-5, 4.64578634580806e-5] as const;
export const ICE_R22 = [2.34801409215913e-11, -2.85651142904972e-11] as const;
