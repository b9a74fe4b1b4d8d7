import type { Spot } from "./drawing-parts.tsx";

/** A word that belongs beside a place; `out` is a unit vector away from the work, y upward. */
export interface Word {
  at: Spot;
  out: Spot;
  text: string;
  soft: boolean;
}

interface Box {
  left: number;
  right: number;
  top: number;
  bottom: number;
}

/** Letters of 15 units in the mono face: 9 wide. */
const letter = 9;

/**
 * Puts each word beside its place, on the other side or a little further off where something is in the way, and
 * leaves out those for which there is no room. Earlier words go first.
 *
 * @param line a closed run of places that no word may cover
 * @returns the words with the middle of their baseline as `at`
 */
export function placedWords(
  words: readonly Word[],
  line: readonly Spot[],
  sheet: { width: number; height: number },
): Word[] {
  const taken: Box[] = [];
  const kept: Word[] = [];
  for (const word of words) {
    for (const [way, further] of tries) {
      const at = beside(word, way, further);
      const box = boxOf(at, word.text);
      if (!within(box, sheet) || taken.some((other) => meets(box, other)) || crosses(box, line)) continue;
      taken.push(box);
      kept.push({ ...word, at });
      break;
    }
  }
  return kept;
}

const tries = [
  [1, 0],
  [-1, 4],
  [1, 16],
  [-1, 20],
  [1, 32],
] as const;

function beside({ at: [x, y], out: [ox, oy], text }: Word, way: number, further: number): Spot {
  const reach = way * (9 + further + (Math.abs(ox) * text.length * letter) / 2 + Math.abs(oy) * 6);
  return [x + ox * reach, y - oy * reach + 5];
}

function boxOf([x, y]: Spot, text: string): Box {
  const half = (text.length * letter) / 2 + 2;
  return { left: x - half, right: x + half, top: y - 13, bottom: y + 4 };
}

function within(
  { left, right, top, bottom }: Box,
  { width, height }: { width: number; height: number },
): boolean {
  return left >= 0 && right <= width && top >= 0 && bottom <= height - 28;
}

function meets(a: Box, b: Box): boolean {
  return a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom;
}

/** Whether the line runs through the box, looked at every few units of it. */
function crosses({ left, right, top, bottom }: Box, line: readonly Spot[]): boolean {
  return line.some(([x, y], index) => {
    const [nextX, nextY] = line[(index + 1) % line.length] ?? [x, y];
    const steps = Math.max(1, Math.ceil(Math.hypot(nextX - x, nextY - y) / 4));
    for (let step = 0; step < steps; step += 1) {
      const [px, py] = [x + ((nextX - x) * step) / steps, y + ((nextY - y) * step) / steps];
      if (px > left && px < right && py > top && py < bottom) return true;
    }
    return false;
  });
}
