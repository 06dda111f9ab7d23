/**
 * A rigid move of the plane, with or without turning it over: x' = sx·x + dx, y' = sy·y + dy, sx and sy ±1.
 * Boards are only ever shifted and turned over, so nothing more general is needed, and coordinates stay exact.
 */
export interface Placement {
  readonly sx: 1 | -1;
  readonly sy: 1 | -1;
  readonly dx: number;
  readonly dy: number;
}
