/** Between which stands the true one lies, and what that rests on. */
export type StandInterval = {
  plantsPerAcreLower: number;
  plantsPerAcreUpper: number;
  level: 0.95;
  method: 'binomial-wilson' | 'poisson-exact' | 't-of-mean' | 'ratio-linearized' | 'stratified-satterthwaite';
  /** `counting-only`: of the plants in this one length; it says nothing about the rest of the field. */
  basis: 'counting-only' | 'row-samples' | 'strips' | 'zones';
  /** How many row samples, strips or zones it rests on. */
  units: number;
  /** Present where the interval is a t interval. */
  student: { standardErrorPlantsPerAcre: number; degreesOfFreedom: number } | null;
};
