/** A property class. Stresses in MPa. */
export interface BoltGrade {
  grade: string;
  /** Ultimate strength fub that EN 1993-1-8 reckons with. */
  ultimate: number;
  /** Stress under proof load, to M16 and above. */
  proof: number;
  proofAboveM16: number;
  /** αv with the threads in the shear plane. */
  shearFactor: number;
}

/**
 * Property classes of ISO 898-1.
 *
 * @see ISO 898-1:2013, table 3, for the proof stress; EN 1993-1-8:2005, tables 3.1 and 3.4, for fub and αv. Class 12.9
 * is not in EN 1993-1-8: fub is its nominal strength and αv that of 10.9.
 */
export const boltGrades = [
  { grade: "4.6", ultimate: 400, proof: 225, proofAboveM16: 225, shearFactor: 0.6 },
  { grade: "4.8", ultimate: 400, proof: 310, proofAboveM16: 310, shearFactor: 0.5 },
  { grade: "5.6", ultimate: 500, proof: 280, proofAboveM16: 280, shearFactor: 0.6 },
  { grade: "5.8", ultimate: 500, proof: 380, proofAboveM16: 380, shearFactor: 0.5 },
  { grade: "6.8", ultimate: 600, proof: 440, proofAboveM16: 440, shearFactor: 0.5 },
  { grade: "8.8", ultimate: 800, proof: 580, proofAboveM16: 600, shearFactor: 0.6 },
  { grade: "10.9", ultimate: 1000, proof: 830, proofAboveM16: 830, shearFactor: 0.5 },
  { grade: "12.9", ultimate: 1200, proof: 970, proofAboveM16: 970, shearFactor: 0.5 },
] as const satisfies readonly BoltGrade[];

/** Sizes from M4 to M24, ISO 261 first and second choice. */
export const boltSizes = [
  "M4",
  "M5",
  "M6",
  "M8",
  "M10",
  "M12",
  "M14",
  "M16",
  "M18",
  "M20",
  "M22",
  "M24",
] as const;
