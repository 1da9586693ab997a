/** One characteristic number: plain data with its source. */
export interface NumberEntry {
  /** The usual name first. */
  readonly names: readonly string[];
  readonly symbol: string;
  /** As the source writes it; for people, not for machines. */
  readonly expression: string;
  /**
   * The number as products of kinds of quantity, each with its numerical factor in front where that is not 1:
   * `2 * force / density / velocity^2 / area`. Further forms with μ/ρ for a kinematic viscosity, k/(ρ c) for a thermal
   * diffusivity and a length squared for an area are derived from these.
   */
  readonly forms: readonly string[];
  /** Kinds of quantity that the number is usually written to find. */
  readonly finds?: readonly string[];
  /** 1: in every textbook of its field; 2: usual; 3: special. */
  readonly standing: 1 | 2 | 3;
  /** Standards and books are named as far as the definition is found there; no wording is taken from them. */
  readonly source: string;
}

/** The numbers of one field: one file each. */
export interface NumberFamily {
  readonly field: string;
  readonly numbers: readonly NumberEntry[];
}
