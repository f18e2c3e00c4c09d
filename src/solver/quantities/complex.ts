/** Plain complex numbers: data only, so that they survive a worker. Hot loops use pairs of typed arrays instead. */
export interface Complex {
  readonly re: number;
  readonly im: number;
}

/** Arithmetic of complex numbers. */
export const complex = (re: number, im = 0): Complex => ({ re, im });
export const add = (a: Complex, b: Complex): Complex => ({ re: a.re + b.re, im: a.im + b.im });
export const subtract = (a: Complex, b: Complex): Complex => ({ re: a.re - b.re, im: a.im - b.im });
export const multiply = (a: Complex, b: Complex): Complex => ({
  re: a.re * b.re - a.im * b.im,
  im: a.re * b.im + a.im * b.re,
});
export const modulus = (a: Complex): number => Math.hypot(a.re, a.im);
export const argument = (a: Complex): number => Math.atan2(a.im, a.re);

/** a / b by Smith's method, so that neither overflows for large parts. */
export function divide(a: Complex, b: Complex): Complex {
  if (Math.abs(b.re) >= Math.abs(b.im)) {
    const r = b.im / b.re;
    const d = b.re + b.im * r;
    return { re: (a.re + a.im * r) / d, im: (a.im - a.re * r) / d };
  }
  const r = b.re / b.im;
  const d = b.re * r + b.im;
  return { re: (a.re * r + a.im) / d, im: (a.im * r - a.re) / d };
}
