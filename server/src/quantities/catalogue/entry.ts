/** One unit of the catalogue: plain data with its source. */
export interface UnitEntry {
  /** Spellings as symbols, case counts; the first is how the unit is printed: `Pa`, `inH2O`. */
  readonly symbols: readonly string[];
  /** Full English names in the singular, lower case; plurals and the spellings -er/-re are derived: `pascal`, `metre`. */
  readonly names: readonly string[];
  /**
   * Exact factor to `of`: a product or quotient of decimal numbers and `pi`, `0.45359237*9.80665/0.0254/0.0254`, `pi/180`.
   * Never rounded where the definition is exact.
   */
  readonly factor: string;
  /** Coherent SI unit as powers of base units, or `1`: `kg m^-1 s^-2`. Base units: m kg s A K mol cd. */
  readonly of: string;
  /** Which SI prefixes are allowed; `large` for those above 1 (tonne), `small` for those below 1. */
  readonly prefixes: 'all' | 'large' | 'small' | 'none';
  /** Points on a scale: the zero in the coherent SI unit, exact: degC 273.15, psig 101325. `factor` is the size of a degree. */
  readonly offset?: { readonly kind: 'temperature' | 'gauge'; readonly zero: string };
  /** `radian` for rad and its fractions, `cycle` for revolution, turn, hertz; the exponent is 1 (hertz, rpm: cycle per time). */
  readonly rotation?: 'radian' | 'cycle';
  /** dB, Np, phon: add to levels only. */
  readonly level?: true;
  /** Relative standard uncertainty where the factor is measured (dalton); absent where exact. */
  readonly uncertainty?: number;
  /** Read only where nothing else fits, because the symbol is also a word or another unit in other houses. */
  readonly weak?: true;
  /** A convention the reader should know of: which pound, which BTU. */
  readonly remark?: string;
  /** `SI Brochure, table 4`, `NIST SP 811, B.8`, `ISO 80000-3`, `common practice`. */
  readonly source: string;
}

/** A family of units: one file of the catalogue. */
export interface UnitFamily {
  readonly field: string;
  readonly units: readonly UnitEntry[];
}

export interface PrefixEntry {
  readonly symbols: readonly string[];
  readonly name: string;
  readonly power: number;
}

/** A constant an engineer meets, with its CODATA 2022 value. */
export interface ConstantEntry {
  readonly name: string;
  readonly symbol: string;
  /** Decimal digits as published; `pi` factors allowed as in `UnitEntry.factor`. */
  readonly value: string;
  /** Unit expression. */
  readonly unit: string;
  /** Relative standard uncertainty; 0 where exact. */
  readonly uncertainty: number;
  /** Rounded forms met in scripts, in this and in other units: `9.81`, `8.314`, `1.987` [cal/(mol K)], `778.17` [ft lbf/BTU]. */
  readonly metAs: readonly { readonly value: string; readonly unit: string }[];
  readonly source: string;
}
