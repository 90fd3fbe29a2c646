/** A text that wants a place, with the points where it may begin, end or be centred: the first free one is taken. */
export interface WantedLabel {
  /** The text, and shorter ones that will do where there is no room for it. */
  readonly texts: readonly string[];
  readonly role: 'phase' | 'transition' | 'beyond' | 'probe';
  readonly places: readonly LabelPlace[];
}

export interface LabelPlace {
  readonly x: number;
  readonly y: number;
  readonly anchor: 'start' | 'middle' | 'end';
}

export interface PlacedLabel extends LabelPlace {
  readonly text: string;
  readonly role: WantedLabel['role'];
}

/** Pixels, of a rectangle in which labels may stand. */
export interface LabelArea {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

interface Box {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

/** Width of a letter in the widest of the pane's typefaces, and half the height of a line, pixels. */
const LETTER: Readonly<Record<WantedLabel['role'], number>> = { phase: 6.4, beyond: 6.4, transition: 7.3, probe: 7.3 };
const HALF_LINE = 7;

function boxOf({ text, role, x, y, anchor }: PlacedLabel): Box {
  const width = text.length * LETTER[role];
  const left = anchor === 'start' ? x : anchor === 'end' ? x - width : x - width / 2;
  return { left, right: left + width, top: y - HALF_LINE, bottom: y + HALF_LINE };
}

const apart = (a: Box, b: Box): boolean =>
  a.right <= b.left || b.right <= a.left || a.bottom <= b.top || b.bottom <= a.top;

/**
 * Gives each label the first of its places that lies in the area, touches no label placed before it and covers no
 * point that is drawn; a label without such a place is left out, since the table below the picture has it.
 */
export function placeLabels(
  wanted: readonly WantedLabel[],
  area: LabelArea,
  drawn: readonly { readonly x: number; readonly y: number }[],
  already: readonly PlacedLabel[] = [],
): PlacedLabel[] {
  const boxes = already.map(boxOf);
  const placed: PlacedLabel[] = [];
  for (const { texts, role, places } of wanted) {
    const fitting = texts
      .flatMap((text) => places.map((place) => ({ text, role, ...place })))
      .find((label) => isFree(boxOf(label), area, boxes, drawn));
    if (fitting === undefined) continue;
    boxes.push(boxOf(fitting));
    placed.push(fitting);
  }
  return placed;
}

function isFree(
  box: Box,
  area: LabelArea,
  boxes: readonly Box[],
  drawn: readonly { readonly x: number; readonly y: number }[],
): boolean {
  const inside = box.left >= area.left && box.right <= area.right && box.top >= area.top && box.bottom <= area.bottom;
  return (
    inside &&
    boxes.every((other) => apart(box, other)) &&
    drawn.every(({ x, y }) => x < box.left || x > box.right || y < box.top || y > box.bottom)
  );
}
