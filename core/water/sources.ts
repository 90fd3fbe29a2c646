export const R6_95 = 'IAPWS R6-95(2018), Formulation 1995 for fluid water';
export const R10_06 = 'IAPWS R10-06(2009), Equation of State 2006 for ice Ih';
export const R14_08 = 'IAPWS R14-08(2011), melting and sublimation pressures';
