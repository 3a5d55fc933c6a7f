// Figures for people. Rounding belongs here and in the writers, never in the geometry.
import { mmToInch, type LengthUnit } from "./length";

const trimmed = (value: number, decimals: number): string => {
  const text = value.toFixed(decimals);
  const short = text.includes(".") ? text.replace(/0+$/, "").replace(/\.$/, "") : text;
  return short === "-0" ? "0" : short;
};

/** "82", "27.48", "0.225": millimetres to two decimals, below 1 mm to three; inches to three. Without the unit unless asked. */
export function formatLength(mm: number, { unit, withUnit = false }: { readonly unit: LengthUnit; readonly withUnit?: boolean }): string {
  const text = unit === "mm" ? trimmed(mm, Math.abs(mm) < 1 ? 3 : 2) : trimmed(mmToInch(mm), 3);
  return withUnit ? `${text} ${unit}` : text;
}

/** Every digit that a double carries, without noise in the last. */
export const formatExact = (value: number): string => {
  const text = String(Number(value.toPrecision(12)));
  return text === "-0" ? "0" : text;
};

/** "4 3/4" when the length is a whole number of 64ths of an inch to within a thousandth of a millimetre; null when it is not. */
export function formatInchFraction(mm: number): string | null {
  const sixtyFourths = mmToInch(mm) * 64;
  const nearest = Math.round(sixtyFourths);
  // A thousandth of a millimetre: finer than any rule is read.
  if (Math.abs(sixtyFourths - nearest) * (25.4 / 64) > 1 / 1000 || nearest < 0) return null;
  const whole = Math.floor(nearest / 64);
  let [top, bottom] = [nearest % 64, 64];
  while (top > 0 && top % 2 === 0) [top, bottom] = [top / 2, bottom / 2];
  if (top === 0) return String(whole);
  return whole === 0 ? `${top}/${bottom}` : `${whole} ${top}/${bottom}`;
}
