/** Conversions that hold exactly or by definition. Sources stand beside those that are conventions. */

/** 1 acre = 43,560 square feet (definition). */
export const SQUARE_FEET_PER_ACRE = 43_560;

/** 43,560 × 144. */
export const SQUARE_INCHES_PER_ACRE = 6_272_640;

export const INCHES_PER_FOOT = 12;

/** International inch (definition). */
export const CENTIMETERS_PER_INCH = 2.54;

/** International foot: 43,560 × 0.3048². */
export const SQUARE_METERS_PER_ACRE = 4046.8564224;

export const SQUARE_METERS_PER_HECTARE = 10_000;

/** Acres in one hectare, from the two lines above. */
export const ACRES_PER_HECTARE = SQUARE_METERS_PER_HECTARE / SQUARE_METERS_PER_ACRE;

/** The 97.5 % point of the standard normal distribution, for two-sided 95 % intervals. */
export const NORMAL_QUANTILE_975 = 1.959963984540054;

/** Two numbers closer than this are the same number; decimals such as 0.1 × 3 leave that much behind. */
export const SAME_NUMBER = 1e-9;
