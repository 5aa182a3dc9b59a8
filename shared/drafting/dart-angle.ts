const degrees = Math.PI / 180;

/**
 * Opening of a dart, mm, at a distance from its point: 2 R sin(angle/2). The angle at the point stays the
 * same wherever the dart is moved (NIMI, CITS Dress Making 2024, p. 195, seen).
 */
export const dartOpening = (angle: number, distance: number): number =>
  2 * distance * Math.sin((angle * degrees) / 2);

/** Angle at the point of a dart, degrees, from the width of its mouth and the length of a leg: the opening turned round. */
export const dartAngle = (width: number, leg: number): number =>
  (2 * Math.asin(Math.min(1, width / 2 / leg))) / degrees;
