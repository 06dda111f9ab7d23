/** The parts of npm's dxf that the tests read with; it ships without types. */
declare module 'dxf' {
  interface ReadFile {
    readonly header: Readonly<Record<string, unknown>>;
    readonly entities: readonly { readonly type: string; readonly layer: string; readonly closed?: boolean }[];
  }
  interface Polylines {
    readonly polylines: readonly {
      readonly layer?: { readonly name: string };
      readonly vertices: readonly (readonly number[])[];
    }[];
  }
  export function parseString(text: string): ReadFile;
  export function toPolylines(file: ReadFile): Polylines;
}
