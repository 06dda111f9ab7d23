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
} from 'three';
import type { Plane } from '../work/picture.ts';

/** Surfaces give way to lines drawn along them. */
export const BEHIND_LINES = { polygonOffset: true, polygonOffsetFactor: 1, polygonOffsetUnits: 1 };

/** One copy of the part: its own materials, since each copy is cut by a plane of its own. */
export class PartCopy {
  readonly group = new Group();
  private readonly skin = new MeshLambertMaterial({ vertexColors: true, flatShading: true, ...BEHIND_LINES });
  private readonly meshes: readonly [Mesh, Mesh, Mesh, LineSegments];

  constructor(
    front: BufferGeometry,
    back: BufferGeometry,
    cap: BufferGeometry,
    outline: BufferGeometry,
    inside: MeshBasicMaterial,
    ink: LineBasicMaterial,
  ) {
    this.meshes = [
      new Mesh(front, this.skin),
      new Mesh(back, this.skin),
      new Mesh(cap, inside),
      new LineSegments(outline, ink),
    ];
    for (const mesh of this.meshes) mesh.frustumCulled = false;
    this.group.add(...this.meshes);
  }

  /** Keeps what lies left of an upright plane or below a level one, or the other side; frame view. */
  cutAt(plane: Plane | null, keepsLow: boolean): void {
    this.group.updateMatrixWorld(true);
    const side = keepsLow ? -1 : 1;
    const kept =
      plane &&
      new ClippingPlane(plane.runs === 'upright' ? new Vector3(side, 0, 0) : new Vector3(0, side, 0), -side * plane.at);
    this.skin.clippingPlanes = kept ? [kept.applyMatrix4(this.group.matrixWorld)] : null;
    this.meshes[2].visible = plane !== null;
    this.meshes[3].visible = plane !== null;
  }

  dispose(): void {
    this.skin.dispose();
  }
}
