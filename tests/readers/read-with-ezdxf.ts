import { PYTHON } from '../setup/readers.ts';
import { runReader } from './run-reader.ts';

/** What ezdxf finds in one file; contours as [x, y, bulge], paths as [x, y, z]. */
export interface EzdxfFile {
  readonly version: string;
  /** Codes and messages of the audit. */
  readonly errors: readonly string[];
  readonly fixes: readonly string[];
  readonly units: number;
  readonly measurement: number;
  readonly extmin: readonly number[];
  readonly extmax: readonly number[];
  readonly limmin: readonly number[];
  readonly limmax: readonly number[];
  readonly layers: readonly { readonly name: string; readonly colour: number; readonly lineType: string }[];
  readonly lineTypes: readonly string[];
  readonly entities: readonly EzdxfEntity[];
}

export interface EzdxfEntity {
  readonly type: string;
  readonly layer: string;
  readonly colour: number;
  readonly closed: boolean;
  readonly is3d: boolean;
  readonly text: string;
  readonly points: readonly (readonly [number, number, number])[];
}

const SCRIPT = `
import json, sys, ezdxf
from ezdxf import recover

def entity(e):
    kind = e.dxftype()
    out = {"type": kind, "layer": e.dxf.layer, "colour": e.dxf.color, "closed": False, "is3d": False, "text": "", "points": []}
    if kind == "LWPOLYLINE":
        out["closed"] = e.closed
        out["points"] = [list(p) for p in e.get_points("xyb")]
    elif kind == "POLYLINE":
        out["closed"] = e.is_closed
        out["is3d"] = e.is_3d_polyline
        at = lambda v: v.dxf.location
        flat = lambda v: [at(v).x, at(v).y, v.dxf.bulge if v.dxf.hasattr("bulge") else 0]
        out["points"] = [[at(v).x, at(v).y, at(v).z] if e.is_3d_polyline else flat(v) for v in e.vertices]
        if not e.is_3d_polyline and any(at(v).z != 0 for v in e.vertices):
            raise ValueError("a flat polyline has a height")
    elif kind == "TEXT":
        out["text"] = e.dxf.text
        out["points"] = [list(e.dxf.insert)]
    return out

def read(path):
    doc = ezdxf.readfile(path)
    audit = doc.audit()
    # The tolerant reader notes what the strict one mends in silence.
    _, second = recover.readfile(path)
    said = lambda entries: ["%s %s" % (e.code, e.message) for e in entries]
    header = doc.header
    return {
        "version": doc.dxfversion,
        "errors": said(audit.errors) + said(second.errors),
        "fixes": said(audit.fixes) + said(second.fixes),
        "units": header.get("$INSUNITS", -1), "measurement": header.get("$MEASUREMENT", -1),
        "extmin": list(header.get("$EXTMIN", ())), "extmax": list(header.get("$EXTMAX", ())),
        "limmin": list(header.get("$LIMMIN", ())), "limmax": list(header.get("$LIMMAX", ())),
        "layers": [{"name": l.dxf.name, "colour": l.dxf.color, "lineType": l.dxf.linetype} for l in doc.layers],
        "lineTypes": [l.dxf.name for l in doc.linetypes],
        "entities": [entity(e) for e in doc.modelspace()],
    }

print(json.dumps([read(path) for path in sys.argv[1:]]))
`;

/** Reads and audits DXF files with ezdxf, all in one process. Throws when one cannot be read at all. */
export function readWithEzdxf(paths: readonly string[]): EzdxfFile[] {
  return JSON.parse(runReader(PYTHON, ['-c', SCRIPT, ...paths])) as EzdxfFile[];
}
