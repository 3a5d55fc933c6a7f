// Millimetres and inches. 1 inch is 25.4 mm exactly (international inch, 1959).

export type LengthUnit = "mm" | "in";
export const MM_PER_INCH = 25.4;
export const mmToInch = (mm: number): number => mm / MM_PER_INCH;
export const inchToMm = (inch: number): number => inch * MM_PER_INCH;

/** What a unit typed behind a figure is worth in millimetres; undefined when it is not a unit of length. */
export function millimetresPer(word: string): number | undefined {
  switch (word.toLowerCase()) {
    case "mm":
    case "millimetre":
    case "millimetres":
      return 1;
    case "cm":
      return 10;
    case "m":
      return 1000;
    case "in":
    case "inch":
    case "inches":
    case '"':
    case "″":
    case "”":
    case "''":
      return MM_PER_INCH;
    default:
      return undefined;
  }
}
