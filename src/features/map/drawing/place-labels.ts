/** A word to be written by a spot of the screen, pixels. The first in the list have the first choice. */
export interface LabelWish {
  id: string;
  x: number;
  y: number;
  width: number;
  height: number;
  /** Half the size of the mark it stands beside. */
  clear: number;
  /** Over the spot itself, as in the middle of a field. */
  centred?: boolean;
  /** Written even where it lies on a mark: what a person has chosen. */
  must?: boolean;
}

export interface PlacedLabel {
  id: string;
  /** Top left. */
  left: number;
  top: number;
}

interface Box {
  left: number;
  top: number;
  right: number;
  bottom: number;
}

const CELL = 64;

const apart = (a: Box, b: Box) => a.left >= b.right || b.left >= a.right || a.top >= b.bottom || b.top >= a.bottom;

/** Boxes by the squares of the screen they touch: a label is held only against its neighbours. */
class Taken {
  private cells = new Map<string, Box[]>();

  private *keys(box: Box): Generator<string> {
    for (let x = Math.floor(box.left / CELL); x <= Math.floor(box.right / CELL); x++) {
      for (let y = Math.floor(box.top / CELL); y <= Math.floor(box.bottom / CELL); y++) yield `${x} ${y}`;
    }
  }

  add(box: Box): void {
    for (const key of this.keys(box)) {
      const list = this.cells.get(key);
      if (list) list.push(box);
      else this.cells.set(key, [box]);
    }
  }

  free(box: Box): boolean {
    for (const key of this.keys(box)) {
      for (const other of this.cells.get(key) ?? []) {
        if (!apart(box, other)) return false;
      }
    }
    return true;
  }
}

function* spots({ x, y, width, height, clear, centred }: LabelWish): Generator<[number, number]> {
  if (centred) {
    yield [x - width / 2, y - height / 2];
    yield [x - width / 2, y - height * 1.7];
    yield [x - width / 2, y + height * 0.7];
    return;
  }
  const gap = clear + 3;
  yield [x + gap, y - height / 2];
  yield [x - gap - width, y - height / 2];
  yield [x - width / 2, y - gap - height];
  yield [x - width / 2, y + gap];
  yield [x + gap, y - gap - height];
  yield [x + gap, y + gap];
  yield [x - gap - width, y - gap - height];
  yield [x - gap - width, y + gap];
}

/** Labels that lie on no other label and no mark, whole on the screen where its size is given; one that fits nowhere is left out. */
export function placeLabels(
  wishes: readonly LabelWish[],
  marks: readonly { x: number; y: number; clear: number }[],
  screen?: { width: number; height: number },
): PlacedLabel[] {
  const taken = new Taken();
  for (const { x, y, clear } of marks)
    taken.add({ left: x - clear, top: y - clear, right: x + clear, bottom: y + clear });
  const placed: PlacedLabel[] = [];
  const written: Box[] = [];
  for (const wish of wishes) {
    const boxes = [...spots(wish)]
      .map(([left, top]): Box => ({ left, top, right: left + wish.width, bottom: top + wish.height }))
      .filter(
        (box) => !screen || (box.left >= 0 && box.top >= 0 && box.right <= screen.width && box.bottom <= screen.height),
      );
    const words = (box: Box) => written.every((other) => apart(box, other));
    const box = boxes.find((one) => taken.free(one)) ?? (wish.must ? boxes.find(words) : undefined);
    if (!box) continue;
    taken.add(box);
    written.push(box);
    placed.push({ id: wish.id, left: box.left, top: box.top });
  }
  return placed;
}
