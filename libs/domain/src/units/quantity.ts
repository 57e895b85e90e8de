declare const unit: unique symbol;

/** A number that carries its unit in its type; it costs nothing at run time. */
export type Quantity<U extends string> = number & { readonly [unit]: U };

export type Mm = Quantity<'mm'>;
export type MPa = Quantity<'MPa'>;
export type MPaSqrtMm = Quantity<'MPa·√mm'>;
export type MPaSqrtM = Quantity<'MPa·√m'>;
export type Degrees = Quantity<'°'>;
export type Celsius = Quantity<'°C'>;

/** A length in millimetres. */
export const mm = (value: number) => value as Mm;
/** A stress in megapascals (N/mm²). */
export const mpa = (value: number) => value as MPa;
/** A stress intensity in MPa·√mm. */
export const mpaSqrtMm = (value: number) => value as MPaSqrtMm;
/** A stress intensity in MPa·√m. */
export const mpaSqrtM = (value: number) => value as MPaSqrtM;
/** An angle in degrees. */
export const degrees = (value: number) => value as Degrees;
/** A temperature in degrees Celsius. */
export const celsius = (value: number) => value as Celsius;
