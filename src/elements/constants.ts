import { type Rational, rational } from '../exact/rational.ts';

/*
 * Defining constants of the SI, exact since 20 May 2019 (BIPM, The International System of Units, 9th ed.), and what
 * follows from them without rounding. CODATA 2022 lists the same values, marked exact.
 */

/** Elementary charge e = 1.602176634e-19 C, exact. */
export const ELEMENTARY_CHARGE: Rational = rational(1_602_176_634n, 10n ** 28n);

/** Avogadro constant N_A = 6.02214076e23 mol^-1, exact. */
export const AVOGADRO: Rational = rational(602_214_076n * 10n ** 15n);

/** Boltzmann constant k = 1.380649e-23 J/K, exact. */
export const BOLTZMANN: Rational = rational(1_380_649n, 10n ** 29n);

/** Faraday constant F = e N_A in C/mol, exact: 96485.3321233100184. */
export const FARADAY: Rational = ELEMENTARY_CHARGE.mul(AVOGADRO);

/** Molar gas constant R = N_A k in J/(mol K), exact: 8.31446261815324. */
export const GAS_CONSTANT: Rational = AVOGADRO.mul(BOLTZMANN);
