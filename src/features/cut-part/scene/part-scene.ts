import {
  AmbientLight,
  BufferAttribute,
  BufferGeometry,
  DirectionalLight,
  DoubleSide,
  LineBasicMaterial,
  MeshBasicMaterial,
  OrthographicCamera,
  Quaternion,
  Scene,
  Vector3,
  WebGLRenderer,
} from 'three';
import type { Extents, Point } from '#shared/kernel/contour/contour.ts';
import type { Face } from '#shared/kernel/line-sets/line-set.ts';
import type { Flip } from '#shared/kernel/particulars/particulars.ts';
import type { FaceMesh } from '../mesh/face-mesh.ts';
import type { Slice } from '../mesh/slice.ts';
import { NO_TURN, type Hold } from '../model/turning.ts';
import type { Picture, Plane, Rgb } from '../sweeping/picture.ts';
import { spreadOut, visibleHeight } from './lay-out.ts';
import { BEHIND_LINES, PartCopy } from './part-copy.ts';
import { colourOf, makePalette, paintPalette } from './scene-colours.ts';

/** Light that falls everywhere, and from the upper left of the screen. */
const AMBIENT = 1.6;
const LAMP = 2;

/** What is shown of a picture. */
export interface Showing {
  /** 'both': two copies, the part turned over beside the part, as in the spread. */
  readonly shown: 'front' | 'back' | 'both';
  readonly loose: boolean;
  readonly flip: Flip;
}

export interface SceneColours {
  /** Of each face: untouched first, then each layer. */
  readonly palettes: Readonly<Record<Face, readonly Rgb[]>>;
  readonly inside: Rgb;
  readonly ink: Rgb;
}

/** The cut part in three dimensions on a canvas. It draws after each change, at most once a frame of the screen, and never otherwise. */
export class PartScene {
  private readonly renderer: WebGLRenderer;
  private readonly scene = new Scene();
  private readonly camera = new OrthographicCamera();
  private readonly geometries = {
    front: new BufferGeometry(),
    back: new BufferGeometry(),
    cap: new BufferGeometry(),
    outline: new BufferGeometry(),
  };
  private readonly inside = new MeshBasicMaterial({ side: DoubleSide, ...BEHIND_LINES });
  private readonly ink = new LineBasicMaterial();
  private readonly palettes = { front: makePalette(), back: makePalette() };
  private readonly copies: readonly [PartCopy, PartCopy];
  private region: Extents = { minX: 0, minY: 0, maxX: 1, maxY: 1 };
  private thickness = 1;
  private meshes: { front: FaceMesh; back: FaceMesh } | null = null;
  private slice: Slice | null = null;
  private size = { width: 1, height: 1 };
  private hold: Hold = { turn: NO_TURN, zoom: 1, pan: { x: 0, y: 0 } };
  private frame = 0;
  private showing: Showing = { shown: 'front', loose: false, flip: 'side-to-side' };

  /** Throws when the browser has no WebGL. */
  constructor(canvas: HTMLCanvasElement) {
    this.renderer = new WebGLRenderer({ canvas, antialias: true, alpha: true });
    this.renderer.localClippingEnabled = true;
    this.renderer.setClearAlpha(0);
    const { front, back, cap, outline } = this.geometries;
    const { palettes, inside, ink } = this;
    const surfaces = [
      { geometry: front, palette: palettes.front },
      { geometry: back, palette: palettes.back },
    ];
    const shared = { surfaces, cap, outline, inside, ink };
    this.copies = [new PartCopy(shared), new PartCopy(shared)];
    const lamp = new DirectionalLight(undefined, LAMP);
    lamp.position.set(-0.45, 0.6, 1);
    this.camera.add(lamp, lamp.target);
    this.scene.add(this.camera, new AmbientLight(undefined, AMBIENT), ...this.copies.map((copy) => copy.group));
  }

  /** A picture in colours. The place it is seen from stays. */
  setPicture(picture: Picture, { palettes, inside, ink }: SceneColours): void {
    for (const face of ['front', 'back'] as const) {
      const geometry = this.geometries[face];
      const { positions, index, by } = picture[face];
      paintPalette(this.palettes[face], palettes[face]);
      if (this.meshes?.[face] === picture[face]) continue;
      geometry.dispose();
      geometry.setAttribute('position', new BufferAttribute(positions, 3));
      // One number where the palette's picture has a place right and a place up: up is 0.
      geometry.setAttribute('uv', new BufferAttribute(by, 1, true));
      geometry.setIndex(new BufferAttribute(index, 1));
    }
    this.meshes = picture;
    this.region = picture.region;
    this.thickness = picture.thickness;
    this.inside.color = colourOf(inside);
    this.ink.color = colourOf(ink);
    this.setShowing(this.showing);
  }

  setShowing(showing: Showing): void {
    this.showing = showing;
    const places = spreadOut(this.region, this.thickness, showing);
    this.copies.forEach(({ group }, i) => {
      const place = places[i];
      group.visible = place !== undefined;
      if (!place) return;
      group.quaternion.set(...place.turn);
      group.position.set(-place.from.x, -place.from.y, -place.from.z).applyQuaternion(group.quaternion);
      group.position.x += place.to.x;
      group.position.y += place.to.y;
    });
    for (const face of ['front', 'back'] as const) {
      const mesh = this.meshes?.[face];
      if (mesh) this.geometries[face].setDrawRange(0, showing.loose ? Infinity : mesh.looseFrom);
    }
    this.geometries.cap.setDrawRange(0, showing.loose || !this.slice ? Infinity : this.slice.looseFrom);
    this.geometries.outline.setDrawRange(0, showing.loose || !this.slice ? Infinity : this.slice.outlineLooseFrom / 3);
    this.drawSoon();
  }

  /** The plane takes effect at once, its slice once that is worked out. */
  setSlice(plane: Plane | null, slice: Slice | null): void {
    const { shown, flip } = this.showing;
    // The cut side is to look to the right and up, where the part is first held to be seen from.
    const turns = shown === 'back' && plane?.runs === (flip === 'side-to-side' ? 'upright' : 'level');
    for (const copy of this.copies) copy.cutAt(plane, !turns);
    this.drawSoon();
    if (slice === this.slice) return;
    this.slice = slice;
    const { cap, outline } = this.geometries;
    cap.dispose();
    outline.dispose();
    cap.setAttribute('position', new BufferAttribute(slice?.positions ?? new Float32Array(), 3));
    cap.setIndex(new BufferAttribute(slice?.index ?? new Uint32Array(), 1));
    outline.setAttribute('position', new BufferAttribute(slice?.outline ?? new Float32Array(), 3));
    this.setShowing(this.showing);
  }

  /** CSS pixels; the canvas' own size follows, its style never does. */
  resize(width: number, height: number, pixelRatio: number): void {
    this.size = { width, height };
    this.renderer.setPixelRatio(Math.min(pixelRatio, 2));
    this.renderer.setSize(width, height, false);
    this.drawSoon();
  }

  setHold(hold: Hold): void {
    this.hold = hold;
    this.drawSoon();
  }

  /** Length of the part to one CSS pixel, as it is held. */
  lengthOfPixel(): number {
    return (
      visibleHeight(this.region, this.thickness, this.showing, this.size.width / this.size.height) /
      this.hold.zoom /
      this.size.height
    );
  }

  private drawSoon(): void {
    cancelAnimationFrame(this.frame);
    this.frame = requestAnimationFrame(() => this.draw());
  }

  private draw(): void {
    const { hold } = this;
    const { width, height } = this.size;
    const half = (this.lengthOfPixel() * height) / 2;
    const { camera } = this;
    const reach = 8 * (this.region.maxX - this.region.minX + this.region.maxY - this.region.minY + this.thickness);
    camera.left = (-half * width) / height;
    camera.right = (half * width) / height;
    camera.top = half;
    camera.bottom = -half;
    camera.near = 0;
    camera.far = 2 * reach;
    camera.quaternion.set(...hold.turn).invert();
    camera.position.set(-hold.pan.x, -hold.pan.y, reach).applyQuaternion(camera.quaternion);
    camera.updateProjectionMatrix();
    this.renderer.render(this.scene, this.camera);
  }

  /** The place of the frame under a place of the screen (pixels from its middle, right and up), on the face that looks this way; null beside the board. */
  placeUnder(at: Point): Point | null {
    const { hold } = this;
    const pixel = this.lengthOfPixel();
    const back = new Quaternion(...hold.turn).invert();
    const eye = new Vector3(at.x * pixel - hold.pan.x, at.y * pixel - hold.pan.y, 0).applyQuaternion(back);
    const ahead = new Vector3(0, 0, -1).applyQuaternion(back);
    for (const { group } of this.copies) {
      if (!group.visible) continue;
      const home = group.quaternion.clone().invert();
      const from = eye.clone().sub(group.position).applyQuaternion(home);
      const way = ahead.clone().applyQuaternion(home);
      const z = way.z < 0 ? 0 : -this.thickness;
      const place = from.addScaledVector(way, (z - from.z) / way.z);
      const { minX, minY, maxX, maxY } = this.region;
      if (place.x >= minX && place.x <= maxX && place.y >= minY && place.y <= maxY) return { x: place.x, y: place.y };
    }
    return null;
  }

  dispose(): void {
    cancelAnimationFrame(this.frame);
    for (const geometry of Object.values(this.geometries)) geometry.dispose();
    for (const copy of this.copies) copy.dispose();
    for (const palette of Object.values(this.palettes)) palette.dispose();
    this.inside.dispose();
    this.ink.dispose();
    this.renderer.dispose();
  }
}
