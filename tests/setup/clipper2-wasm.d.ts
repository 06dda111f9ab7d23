// The package's own entry for types points at a file that it does not ship.
declare module 'clipper2-wasm' {
  import type { MainModule } from 'clipper2-wasm/dist/clipper2z.d.ts';
  const factory: () => Promise<MainModule>;
  export default factory;
}
