/** A Cartesian triple; its unit and frame are named where it is handed out. */
export interface Vector {
  readonly x: number;
  readonly y: number;
  readonly z: number;
}

/** Rows of a rotation: `rotated = rows · vector`. */
export type Rotation = readonly [Vector, Vector, Vector];

export const add = (a: Vector, b: Vector): Vector => ({ x: a.x + b.x, y: a.y + b.y, z: a.z + b.z });
export const subtract = (a: Vector, b: Vector): Vector => ({ x: a.x - b.x, y: a.y - b.y, z: a.z - b.z });
export const scale = (a: Vector, factor: number): Vector => ({
  x: a.x * factor,
  y: a.y * factor,
  z: a.z * factor,
});
export const dot = (a: Vector, b: Vector): number => a.x * b.x + a.y * b.y + a.z * b.z;
export const length = (a: Vector): number => Math.sqrt(dot(a, a));
export const cross = (a: Vector, b: Vector): Vector => ({
  x: a.y * b.z - a.z * b.y,
  y: a.z * b.x - a.x * b.z,
  z: a.x * b.y - a.y * b.x,
});

/** The angle between two directions, radians in [0, π]; exact near 0 and π, where an arc cosine is not. */
export const angleBetween = (a: Vector, b: Vector): number => Math.atan2(length(cross(a, b)), dot(a, b));

export const rotate = (rotation: Rotation, a: Vector): Vector => ({
  x: dot(rotation[0], a),
  y: dot(rotation[1], a),
  z: dot(rotation[2], a),
});

/** The inverse of a rotation is its transpose. */
export const transpose = ([r0, r1, r2]: Rotation): Rotation => [
  { x: r0.x, y: r1.x, z: r2.x },
  { x: r0.y, y: r1.y, z: r2.y },
  { x: r0.z, y: r1.z, z: r2.z },
];

export interface Spherical {
  /** Radians in (−π, π]. */
  readonly longitude: number;
  /** Radians in [−π/2, π/2]. */
  readonly latitude: number;
  /** In the vector's own unit. */
  readonly distance: number;
}

export function sphericalOf(a: Vector): Spherical {
  return {
    longitude: Math.atan2(a.y, a.x),
    latitude: Math.atan2(a.z, Math.hypot(a.x, a.y)),
    distance: length(a),
  };
}

export function unitVector(longitude: number, latitude: number): Vector {
  const cosLatitude = Math.cos(latitude);
  return {
    x: cosLatitude * Math.cos(longitude),
    y: cosLatitude * Math.sin(longitude),
    z: Math.sin(latitude),
  };
}
