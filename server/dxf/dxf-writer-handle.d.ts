/** dxf-writer's counter of handles, one for the whole process; it ships without types. */
declare module 'dxf-writer/src/Handle.js' {
  const Handle: { seed: number };
  export default Handle;
}
