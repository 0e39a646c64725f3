declare module 'icosphere' {
  type Triple = [number, number, number];

  /** A sphere of radius 1 as a mesh of triangles, divided so many times. */
  function icosphere(level: number): { positions: Triple[]; cells: Triple[] };
  export = icosphere;
}
