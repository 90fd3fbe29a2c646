/** For a vapour in pairs: shifts of the enthalpy of pairing, kJ/mol, and of ln K, in the place of the two terms. */
const PAIRS = { polar: [0, 1.5], bonding: [0, 0.4] };

/**
 * How far a class of fluids may leave corresponding states: mean and standard deviation of the polar and the bonding term,
 * curvature of the ratio to corresponding states for latent heat and pressure, share of the departure that is unsure.
 */
const CLASSES = {
  normal: {
    polar: [0, 0.0005],
    bonding: [0, 1e-6],
    bend: 0.25,
    pressureBend: 0.25,
    vapour: 0.008,
    freedom: 1,
    heatBend: 0.006,
  },
  polar: {
    polar: [0.006, 0.006],
    bonding: [0, 1e-6],
    bend: 1,
    pressureBend: 0.6,
    vapour: 0.015,
    freedom: 1.5,
    heatBend: 0.012,
  },
  strong: {
    polar: [0.035, 0.01],
    bonding: [0, 1e-6],
    bend: 1.5,
    pressureBend: 0.8,
    vapour: 0.02,
    freedom: 1.5,
    heatBend: 0.012,
  },
  nitrile: {
    polar: [0.1, 0.02],
    bonding: [0, 1e-6],
    bend: 2,
    pressureBend: 0.8,
    vapour: 0.03,
    freedom: 1.5,
    heatBend: 0.012,
  },
  bonded: {
    polar: [0.016, 0.006],
    bonding: [0.0001, 0.0001],
    bend: 2.5,
    pressureBend: 1,
    vapour: 0.02,
    freedom: 1.5,
    heatBend: 0.015,
  },
  alcohol: {
    polar: [0, 0.004],
    bonding: [0.003, 0.0015],
    bend: 5,
    pressureBend: 1.5,
    vapour: 0.03,
    freedom: 8,
    heatBend: 0.06,
  },
};

/** What is expected of a fluid before its values are seen. */
export function fluidClass({ class: name, vapour, expectedPolar }) {
  const pairs = vapour?.dimer === undefined ? {} : PAIRS;
  const polar = expectedPolar === undefined ? {} : { polar: [expectedPolar, 0.25 * expectedPolar + 0.001] };
  return { ...CLASSES[name], ...polar, ...pairs };
}
