/** A text that wants a place, with the points where it may begin, end or be centred: the first free one is taken. */
export interface WantedLabel {
  readonly text: string;
  readonly role: 'phase' | 'transition' | 'beyond';
  readonly places: readonly LabelPlace[];
}

export interface LabelPlace {
  readonly x: number;
  readonly y: number;
  readonly anchor: 'start' | 'middle' | 'end';
}

export type PlacedLabel = Omit<WantedLabel, 'places'> & LabelPlace;

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

/** Width of a letter and half the height of a line in the diagram's type, pixels. */
const LETTER = 6.4;
const HALF_LINE = 7;

function boxOf(text: string, { x, y, anchor }: LabelPlace): Box {
  const width = text.length * LETTER;
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
): PlacedLabel[] {
  const boxes: Box[] = [];
  const placed: PlacedLabel[] = [];
  for (const { text, role, places } of wanted) {
    const free = places.find((place) => {
      const box = boxOf(text, place);
      const inside =
        box.left >= area.left && box.right <= area.right && box.top >= area.top && box.bottom <= area.bottom;
      return (
        inside &&
        boxes.every((other) => apart(box, other)) &&
        drawn.every(({ x, y }) => x < box.left || x > box.right || y < box.top || y > box.bottom)
      );
    });
    if (free === undefined) continue;
    boxes.push(boxOf(text, free));
    placed.push({ text, role, ...free });
  }
  return placed;
}
