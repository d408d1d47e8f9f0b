import type { FaultPath } from "../errors/fault.js";

/** Critical constants of a gas as raw doubles in coherent SI. */
export interface CriticalConstants {
  /** Critical temperature in kelvin, above 0. */
  readonly temperatureK: number;
  /** Critical pressure in pascal, above 0. */
  readonly pressurePa: number;
  /** Pitzer's acentric factor. */
  readonly acentricFactor?: number;
  /** Critical volume in cubic metres per mole, above 0. */
  readonly volumeM3PerMol?: number;
}

/** One gas as an equation of state sees it. */
export interface GasComponent {
  /** Label of the species, unique within a mixture. */
  readonly label: string;
  /** Critical constants; absent where none are known. */
  readonly critical?: CriticalConstants;
}

/** Departures from the ideal gas at the same temperature, pressure and composition, per mole of mixture. */
export interface GasDeparture {
  /** H - H(ideal gas) in J/mol. */
  readonly enthalpy: number;
  /** S - S(ideal gas) in J/mol/K. */
  readonly entropy: number;
  /** G - G(ideal gas) in J/mol. */
  readonly gibbsEnergy: number;
}

/** A gas mixture at one temperature, pressure and composition, as raw doubles. */
export interface GasState {
  /** Compressibility factor Z = pV/(RT). */
  readonly compressibilityFactor: number;
  /** Molar volume in m3/mol. */
  readonly molarVolume: number;
  /** ln of the fugacity coefficient of each component, in the order of the components. */
  readonly lnFugacityCoefficients: readonly number[];
  readonly departure: GasDeparture;
  /** Present where the caller let the equation continue outside its validity: what is exceeded, in one line. */
  readonly outsideValidity?: string;
}

/** An equation of state with the constants of its components prepared. */
export interface GasMixture {
  /**
   * The state of the mixture.
   *
   * @param temperatureK - in kelvin, above 0
   * @param pressurePa - in pascal, above 0
   * @param moleFractions - one per component, in their order, each from 0 to 1; their sum is the caller's business
   */
  state(temperatureK: number, pressurePa: number, moleFractions: ArrayLike<number>): GasState;
}

/**
 * An equation of state of gases: plain data and one function, handed in by the caller wherever a gas is not ideal.
 *
 * A user's own equation of state is any object of this form.
 */
export interface EquationOfState {
  /** Name of the equation. */
  readonly name: string;
  /** What the equation was made from, as JSON-serialisable data. */
  readonly parameters: Readonly<Record<string, unknown>>;
  /**
   * Checks the components once and prepares their constants.
   *
   * @param components - at least one, with different labels
   * @param path - where the components lie in the caller's input, for faults
   */
  mixture(components: readonly GasComponent[], path?: FaultPath): GasMixture;
}
