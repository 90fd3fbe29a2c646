/**
 * The mark: two enthalpy curves that draw together as temperature rises, and the gap between them.
 * Everything in a unit square, y downwards.
 */
const T_FROM = 0.15;
const T_TO = 0.85;
const STEPS = 24;

const curve = (y) =>
  Array.from({ length: STEPS + 1 }, (_, i) => {
    const t = i / STEPS;
    return [T_FROM + t * (T_TO - T_FROM), y(t)];
  });

const lower = (t) => 0.81 - 0.27 * t ** 1.3;
const upper = (t) => 0.27 - 0.07 * t + 0.19 * t ** 3;
const GAP_AT = 0.3;
const gapX = T_FROM + GAP_AT * (T_TO - T_FROM);

export const COLOURS = { ground: '#12333F', curve: '#EAF4F2', gap: '#F2B441' };
export const CORNER = 0.18;

/** Strokes from back to front: points, half width, colour. */
export const STROKES = [
  {
    points: [
      [gapX, lower(GAP_AT)],
      [gapX, upper(GAP_AT)],
    ],
    half: 0.055,
    colour: COLOURS.gap,
  },
  { points: curve(lower), half: 0.05, colour: COLOURS.curve },
  { points: curve(upper), half: 0.05, colour: COLOURS.curve },
];
