import { millimetresPerUnit } from '../sheet/drawing-scale.ts';
import type { Unit } from '../units/unit.ts';

/** Scales larger than life: 1, 2, 5 and their tens after ISO 5455, and between them 3, 4 and 8, where those would waste the room. */
const ENLARGEMENTS = [500, 400, 300, 200, 100, 80, 50, 40, 30, 20, 10, 8, 5, 4, 3, 2, 1];

/** The largest standard enlargement at which width × height (in `unit`) stays within `room` (millimetres of paper), and its millimetres of paper per unit. */
export function chooseEnlargement(
  width: number,
  height: number,
  unit: Unit,
  room: { readonly width: number; readonly height: number },
): { readonly text: string; readonly scale: number } {
  const mm = millimetresPerUnit(unit);
  const times = ENLARGEMENTS.find((n) => width * mm * n <= room.width && height * mm * n <= room.height);
  if (times !== undefined) return { text: `${times} : 1`, scale: times * mm };
  const scale = Math.min(room.width / width, room.height / height);
  return { text: `1 : ${Math.ceil(mm / scale)}`, scale: mm / Math.ceil(mm / scale) };
}
