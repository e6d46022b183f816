/** A bushel of corn weighs 56 lb at its standard moisture (definition of the trade). */
export const CORN_BUSHEL_POUNDS = 56;

/** Standard moisture of corn, percent of the wet weight. */
export const CORN_STANDARD_MOISTURE_PERCENT = 15.5;
