// How exporters write figures. The only place where a figure of a carton is rounded.

const FOURTH = 1e4;

/** A figure with at most four decimals: never an exponent, never −0. Fit for SVG, PDF and DXF alike. */
export const plain = (value: number): string => String(Math.round(value * FOURTH) / FOURTH + 0);

/** A figure as a drawing shows it: hundredths of a millimetre, no idle zeros. */
export const shown = (value: number): string => String(Math.round(value * 100) / 100 + 0);
