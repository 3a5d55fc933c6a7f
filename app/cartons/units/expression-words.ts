// What is wrong with a typed figure, and what to type instead.
import type { ExpressionError } from "./expression";

/** `"mn" is not a unit. Type 43, 43mm or 1.69in.` `example` is what a right answer looks like. */
export function describeExpressionError(error: ExpressionError, { example }: { readonly example: string }): string {
  const type = `Type ${example}.`;
  switch (error.code) {
    case "empty":
      return `Nothing is typed here. ${type}`;
    case "unknown-unit":
      return `“${error.word}” is not a unit. ${type}`;
    case "unknown-word":
      return `“${error.word}” is not a number. ${type}`;
    case "syntax":
      return error.word === "" ? `The sum is not finished. ${type}` : `“${error.word}” is out of place. ${type}`;
    case "divide-by-zero":
      return `Nothing can be divided by 0. ${type}`;
    case "not-finite":
      return `That is too large for a figure. ${type}`;
    case "not-a-length":
      return `Lengths can be added, and multiplied or divided by plain numbers. ${type}`;
    case "not-whole":
      return `“${error.word}” is not a whole number. ${type}`;
    case "too-long":
      return `That is longer than any figure. ${type}`;
  }
}
