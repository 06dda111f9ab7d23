import {
  Group,
  LineSegments,
  Mesh,
  MeshLambertMaterial,
  Plane as ClippingPlane,
  Vector3,
  type BufferGeometry,
  type LineBasicMaterial,
  type MeshBasicMaterial,
  type Texture,
} from 'three';
import type { Plane } from '../sweeping/picture.ts';

/** Surfaces give way to lines drawn along them. */
export const BEHIND_LINES = { polygonOffset: true, polygonOffsetFactor: 1, polygonOffsetUnits: 1 };

/** What all copies of the part share: its surfaces with their colours, and what shows where it is cut open. */
export interface SharedParts {
  readonly surfaces: readonly { readonly geometry: BufferGeometry; readonly palette: Texture }[];
  readonly cap: BufferGeometry;
  readonly outline: BufferGeometry;
  readonly inside: MeshBasicMaterial;
  readonly ink: LineBasicMaterial;
}

/** One copy of the part: the materials of its surfaces are its own, since each copy is cut by a plane of its own. */
export class PartCopy {
  readonly group = new Group();
  private readonly skins: readonly MeshLambertMaterial[];
  private readonly opened: readonly (Mesh | LineSegments)[];

  constructor({ surfaces, cap, outline, inside, ink }: SharedParts) {
    this.skins = surfaces.map(
      ({ palette }) => new MeshLambertMaterial({ map: palette, flatShading: true, ...BEHIND_LINES }),
    );
    this.opened = [new Mesh(cap, inside), new LineSegments(outline, ink)];
    const meshes = [...surfaces.map(({ geometry }, i) => new Mesh(geometry, this.skins[i])), ...this.opened];
    for (const mesh of meshes) mesh.frustumCulled = false;
    this.group.add(...meshes);
  }

  /** Keeps what lies left of an upright plane or below a level one, or the other side; frame view. */
  cutAt(plane: Plane | null, keepsLow: boolean): void {
    this.group.updateMatrixWorld(true);
    const side = keepsLow ? -1 : 1;
    const kept =
      plane &&
      new ClippingPlane(plane.runs === 'upright' ? new Vector3(side, 0, 0) : new Vector3(0, side, 0), -side * plane.at);
    kept?.applyMatrix4(this.group.matrixWorld);
    for (const skin of this.skins) skin.clippingPlanes = kept ? [kept] : null;
    for (const part of this.opened) part.visible = plane !== null;
  }

  dispose(): void {
    for (const skin of this.skins) skin.dispose();
  }
}
