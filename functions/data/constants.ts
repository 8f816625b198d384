/**
 * Gas constant, J/(mol K): the Boltzmann constant 1.380649e-23 J/K times the Avogadro constant
 * 6.02214076e23 1/mol, both exact since 2019. The product is 8.31446261815324 with no more digits.
 * Source: SI Brochure, 9th edition (2019), section 2.2; CODATA 2018 and 2022 (from memory).
 */
export const GAS_CONSTANT = 8.31446261815324;

/** Celsius temperature is kelvin less this. Source: SI Brochure, 9th edition, section 2.3.1 (from memory). */
export const ZERO_CELSIUS_K = 273.15;

/** Standard atmosphere, bar: 101325 Pa exactly. Source: 10th CGPM (1954), resolution 4 (from memory). */
export const STANDARD_ATMOSPHERE_BAR = 1.01325;

/** Gas constant, L bar/(mol K): the same, 1 L bar being 100 J exactly. */
export const GAS_CONSTANT_L_BAR = 0.0831446261815324;

/** By definition of the prefix. */
export const JOULE_PER_KILOJOULE = 1000;
