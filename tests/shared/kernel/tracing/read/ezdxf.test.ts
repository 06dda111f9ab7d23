import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { FoundDrawing } from '#shared/kernel/tracing/found-drawing.ts';
import { readDrawing } from '#shared/kernel/tracing/read/read-drawing.ts';
import { runReader } from '../../../../readers/run-reader.ts';
import { PYTHON } from '../../../../setup/readers.ts';
import { countOf, farthestOf, lengthOf, placesAlong, rowsByEntity } from './found.ts';

/**
 * Files that ezdxf writes, with every type that is read, and what ezdxf makes of them: for each entity, blocks
 * unfolded, its length and places on it, so many that the chords between them keep within 0.0003 mm.
 */
const SCRIPT = `
import json, math, random, sys, ezdxf

FINE = 0.0003

def runs(e):
    kind = e.dxftype()
    if kind == "LINE":
        return [[e.dxf.start, e.dxf.end]]
    if kind in ("LWPOLYLINE", "POLYLINE"):
        return [run for part in e.virtual_entities() for run in runs(part)]
    if kind == "INSERT":
        # Through ezdxf's matrices, as its own unfolding knows no leaning axes.
        inner = [run for part in e.block() for run in runs(part)]
        each = list(e.multi_insert()) if e.mcount > 1 else [e]
        return [list(one.matrix44().transform_vertices(run)) for one in each for run in inner]
    return [list(e.flattening(FINE))]

def leaves(e):
    if e.dxftype() != "INSERT":
        return 1
    return e.mcount * sum(leaves(inner) for inner in e.block())

def seen(e):
    parts = [[(v[0], v[1]) for v in run] for run in runs(e)]
    length = sum(math.dist(a, b) for run in parts for a, b in zip(run, run[1:]))
    return {"type": e.dxftype(), "leaves": leaves(e), "runs": parts, "length": length}

def flat(m, r):
    at = lambda: (r.uniform(-400, 400), r.uniform(-400, 400))
    m.add_line(at(), at())
    m.add_circle(at(), r.uniform(1, 90))
    for a, b in ((350, 20), (0, 270), (90, 450), (-30, 15), (180, 180.5)):
        m.add_arc(at(), r.uniform(1, 90), a, b)
    m.add_ellipse(at(), at() + (0,), r.uniform(0.05, 1))
    m.add_ellipse(at(), at() + (0,), r.uniform(0.05, 1), r.uniform(0, 6), r.uniform(0, 6))
    m.add_lwpolyline([at() + (r.uniform(-1.5, 1.5),) for _ in range(7)], format="xyb", close=True)
    m.add_lwpolyline([at() + (r.choice([0, 1, -1, 0.3]),) for _ in range(5)], format="xyb")
    m.add_polyline2d([at() + (r.uniform(-1, 1),) for _ in range(5)], format="xyb", close=True)
    m.add_polyline3d([at() + (0,) for _ in range(5)])

def splines(m, r):
    at = lambda: (r.uniform(-400, 400), r.uniform(-400, 400), 0)
    for degree in (1, 2, 3, 5):
        m.add_open_spline([at() for _ in range(9)], degree=degree)
    m.add_rational_spline([at() for _ in range(8)], [r.uniform(0.2, 5) for _ in range(8)], degree=3)
    m.add_spline().set_closed([at() for _ in range(8)], degree=3)
    m.add_spline().set_closed_rational([at() for _ in range(8)], [r.uniform(0.5, 2) for _ in range(8)], degree=3)
    m.add_spline_control_frame([at() for _ in range(6)], method="chord")

def below(m, r):
    down = dict(extrusion=(0, 0, -1))
    at = lambda: (r.uniform(-400, 400), r.uniform(-400, 400))
    m.add_line(at(), at(), dxfattribs=down)
    m.add_circle(at(), r.uniform(1, 90), dxfattribs=down)
    m.add_arc(at(), r.uniform(1, 90), 340, 50, dxfattribs=down)
    m.add_ellipse(at(), at() + (0,), 0.4, 0.2, 2.9, dxfattribs=down)
    m.add_lwpolyline([at() + (0.7,) for _ in range(5)], format="xyb", close=True, dxfattribs=down)
    m.add_polyline2d([at() + (-0.4,) for _ in range(5)], format="xyb", dxfattribs=down)
    m.add_polyline3d([at() + (0,) for _ in range(5)], dxfattribs=down)

def blocks(doc, m, r):
    inner = doc.blocks.new("INNER", base_point=(3, -2))
    inner.add_circle((5, 5), 12)
    inner.add_arc((5, 5), 12, 300, 60)
    inner.add_lwpolyline([(0, 0, 0.5), (30, 0, 0), (30, 20, -0.8)], format="xyb", close=True)
    inner.add_ellipse((0, 0), (20, 5, 0), 0.3)
    inner.add_open_spline([(0, 0, 0), (10, 20, 0), (30, 10, 0), (50, 0, 0)])
    outer = doc.blocks.new("OUTER", base_point=(1, 1))
    outer.add_line((0, 0), (40, 0))
    outer.add_blockref("INNER", (20, 10), dxfattribs=dict(rotation=25, xscale=1.5, yscale=1.5, zscale=1.5))
    outer.add_blockref("INNER", (20, 10), dxfattribs=dict(rotation=-70, xscale=-1, yscale=1))
    put = lambda name, **more: m.add_blockref(name, (r.uniform(-400, 400), r.uniform(-400, 400)), dxfattribs=more)
    put("INNER")
    put("INNER", rotation=33, xscale=2, yscale=2, zscale=2)
    put("INNER", rotation=200, xscale=-2, yscale=2, zscale=2)
    put("INNER", rotation=15, xscale=1, yscale=3)
    put("INNER", rotation=15, xscale=-1, yscale=-0.5)
    put("INNER", rotation=40, column_count=3, row_count=2, column_spacing=100, row_spacing=80, xscale=0.5, yscale=0.5)
    put("OUTER", rotation=10)
    put("OUTER", rotation=10, xscale=2, yscale=0.7)
    put("OUTER", rotation=120, xscale=-1)
    put("INNER", rotation=40, extrusion=(0, 0, -1))
    put("OUTER", rotation=40, xscale=-2, yscale=2, extrusion=(0, 0, -1))

def write(folder, version, seed):
    r = random.Random(seed)
    doc = ezdxf.new(version)
    if version != "R12":
        doc.header["$INSUNITS"] = 4
        doc.header["$MEASUREMENT"] = 1
    m = doc.modelspace()
    if version == "R12":
        m.add_line((0, 0), (30, 40)); m.add_circle((9, 9), 4); m.add_arc((1, 2), 8, 300, 60)
        m.add_polyline2d([(0, 0, 0.4), (90, 0, -1), (90, 50, 0)], format="xyb", close=True)
        m.add_polyline3d([(0, 0, 5), (30, 0, 5), (30, 9, 5)])
        b = doc.blocks.new("B"); b.add_arc((0, 0), 5, 10, 200); b.add_line((0, 0), (9, 0))
        m.add_blockref("B", (50, 50), dxfattribs=dict(rotation=30, xscale=2, yscale=2, zscale=2))
    else:
        flat(m, r); splines(m, r); below(m, r); blocks(doc, m, r)
    path = "%s/%s-%d.dxf" % (folder, version, seed)
    doc.saveas(path)
    doc = ezdxf.readfile(path)
    m = doc.modelspace()
    return {"path": path, "entities": len(m), "seen": [seen(e) for e in m]}

print(json.dumps([write(sys.argv[1], *job) for job in json.loads(sys.argv[2])]))
`;

interface Written {
  readonly path: string;
  readonly entities: number;
  readonly seen: readonly {
    readonly type: string;
    /** Entities that are no INSERT, in the end. */
    readonly leaves: number;
    readonly runs: readonly (readonly (readonly [number, number])[])[];
    readonly length: number;
  }[];
}

const JOBS = [
  ['R12', 0],
  ['R2000', 1],
  ['R2018', 4],
] as const;

let folder: string;
let files: { written: Written; found: FoundDrawing }[];

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'stilepost-read-'));
  const written = JSON.parse(runReader(PYTHON, ['-c', SCRIPT, folder, JSON.stringify(JOBS)])) as Written[];
  files = written.map((file) => ({ written: file, found: readDrawing(readFileSync(file.path)) }));
}, 120_000);

afterAll(() => rmSync(folder, { recursive: true, force: true }));

/** 0.01 mm of ours and what ezdxf's chords leave, at most three times as large in a block. */
const NEAR = 0.01 + 0.001;

/** Chords that leave an arc of radius r by s are shorter by s / 3r; the smallest radius is 1 mm. */
const SHORTER = 0.001 / 3 + 1e-5;

describe('When ezdxf has written a file with every type of entity', () => {
  test.each(JOBS.map(([version], i) => [version, i] as const))('then %s comes in whole', (_, i) => {
    const { written, found } = files[i]!;
    expect(found.incomplete).toBe(false);
    expect(found.census.filter((row) => row.fate !== 'kept')).toEqual([]);
    expect(found.placed.filter((row) => row.fate !== 'kept')).toEqual([]);
    expect(countOf(found.census)).toBe(written.entities);
    expect(rowsByEntity(found).length).toBe(written.seen.reduce((sum, { leaves }) => sum + leaves, 0));
  });

  test.each(JOBS.map(([version], i) => [version, i] as const))(
    'then in %s each entity has the length and the places that ezdxf gives it',
    (_, i) => {
      const { written, found } = files[i]!;
      const ours = rowsByEntity(found);
      let at = 0;
      written.seen.forEach(({ type, leaves, runs, length }, k) => {
        const rows = ours.slice(at, (at += leaves)).flat();
        const what = `${type}, entity ${k}`;
        expect(Math.abs(lengthOf(rows) / length - 1), what).toBeLessThan(SHORTER);
        expect(farthestOf(rows, runs.flat(), NEAR), what).toBeLessThanOrEqual(NEAR);
        // And nothing of ours lies away from ezdxf's chords.
        const chords = runs.flatMap((run) => run.slice(1).map(([x, y], j) => [...run[j]!, x, y, 0] as const));
        const places = rows.flatMap((row) => placesAlong(row, 3));
        expect(farthestOf(chords, places, NEAR), what).toBeLessThanOrEqual(NEAR);
      });
    },
  );
});
