declare module 'dxf-writer/src/Handle' {
  /** The library's counter of entity handles. */
  const Handle: { seed: number };
  export default Handle;
}
