// DIN 1343 and ISO 10780 (from memory, verify): the normal state of a gas, which a unit with "(n)" refers to.
export const NORMAL_TEMPERATURE = 273.15;
export const NORMAL_PRESSURE = 101_325;

// CODATA 2018, exact since the revision of the SI: R = N_A k.
export const GAS_CONSTANT = 8.314_462_618_153_24;
