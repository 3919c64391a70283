/** One group of outputs of a model: the function that computes it and the unit of what it returns. */
export interface OutputDescription {
  /** Name of the exported function; it takes (elements, constants, t). */
  readonly function: string;
  readonly unit: string;
}

/** A model as the rest of the program knows it. The equations stand in the file alone. */
export interface ModelDescription {
  readonly name: string;
  /** What the model computes, in one line. */
  readonly title: string;
  /** The published source of the equations. */
  readonly source: string;
  readonly file: URL;
  readonly outputs: Readonly<Record<string, OutputDescription>>;
  /** Fields of the elements with their units. */
  readonly units: Readonly<Record<string, string>>;
  /** Values of the constants' record. */
  readonly constants: Readonly<Record<string, number>>;
  /** Rotation rate of the frame of the position about its z axis, rad/s; 0 for an inertial frame. */
  readonly frameRate: number;
  /** Named domains, each a range for every field of the elements and for t. */
  readonly domains: Readonly<Record<string, Domain>>;
}

/** A closed range of an input and where it comes from. */
export interface Range {
  readonly min: number;
  readonly max: number;
  readonly from: string;
}

/** Ranges of all inputs of a model, by name. */
export type Domain = Readonly<Record<string, Range>>;
