export type TextOptions = {
  /** True unless the unit already stands in a label or a column head. */
  withUnit?: boolean;
  /** Decimals instead of the usual ones of this quantity. */
  decimals?: number;
  /** A plus before what is above zero, for differences. */
  signed?: boolean;
};
