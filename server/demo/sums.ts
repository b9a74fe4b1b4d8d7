/** The few sums behind figures in the prose that no calculator of the product works out. */

const radians = Math.PI / 180;
const density = 7.85e-6; // kg per mm³ of steel, as EN 10219-2 takes it

/** Direction in degrees of a line that rises `up` over `along`. */
export const slope = (up: number, along: number): number => Math.atan2(up, along) / radians;

/** Kilograms in one metre of round steel tube. */
export const kilogramsPerMetre = (od: number, wall: number): number =>
  Math.PI * (od - wall) * wall * density * 1000;

/** Length of a bend along the centreline. */
export const arc = (degrees: number, radius: number): number => degrees * radians * radius;

/** From the corner of two centrelines to where the bend between them begins. */
export const tangent = (degrees: number, radius: number): number =>
  radius * Math.tan((degrees * radians) / 2);

export const sine = (degrees: number): number => Math.sin(degrees * radians);
