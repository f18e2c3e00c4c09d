/** Permittivity of vacuum, F/m: CODATA 2018, 8.8541878128(13)e-12. */
export const epsilon0 = 8.8541878128e-12;

/** Boltzmann constant, J/K: exact in the SI of 2019. */
export const boltzmann = 1.380649e-23;
