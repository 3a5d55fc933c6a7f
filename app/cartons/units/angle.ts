// Angles are branded: a degree taken for a radian is a silent mistake.
declare const degree: unique symbol;
declare const radian: unique symbol;
export type Deg = number & { readonly [degree]: true };
export type Rad = number & { readonly [radian]: true };

export const deg = (value: number): Deg => value as Deg;
export const toRadians = (angle: Deg): Rad => ((angle * Math.PI) / 180) as Rad;
export const toDegrees = (angle: Rad): Deg => ((angle * 180) / Math.PI) as Deg;
