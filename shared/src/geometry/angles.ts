export function radians(degrees: number): number {
  return (degrees * Math.PI) / 180;
}

export function degrees(radianValue: number): number {
  return (radianValue * 180) / Math.PI;
}
