/** The limits of what is recorded in the field, as plain numbers: shared by schemas, services and the phone's own checks. */
export const plantsMost = 2_000;
export const tapePlacesMost = 1_000;
export const leafCollarsMost = 20;
export const marksMost = 1_000;
