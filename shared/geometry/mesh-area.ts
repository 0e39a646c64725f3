/** A corner of a mesh in space, in any unit. */
export type Vertex = readonly [number, number, number];

/** A triangle of a mesh by the places of its corners in the list of vertices. */
export type Face = readonly [number, number, number];

function triangleArea(a: Vertex, b: Vertex, c: Vertex): number {
  const [ux, uy, uz] = [b[0] - a[0], b[1] - a[1], b[2] - a[2]];
  const [vx, vy, vz] = [c[0] - a[0], c[1] - a[1], c[2] - a[2]];
  return Math.hypot(uy * vz - uz * vy, uz * vx - ux * vz, ux * vy - uy * vx) / 2;
}

/** Area of a mesh of triangles in the square of its unit; throws a RangeError for a face that names a vertex there is not. */
export function meshArea(vertices: readonly Vertex[], faces: readonly Face[]): number {
  return faces.reduce((sum, [first, second, third]) => {
    const [a, b, c] = [vertices[first], vertices[second], vertices[third]];
    if (!a || !b || !c) throw new RangeError('a face names a vertex that is not there');
    return sum + triangleArea(a, b, c);
  }, 0);
}
