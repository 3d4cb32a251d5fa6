// The natural logarithm, the same to the last bit on every processor: the maths library picks its
// variant by the processor, and a kernel for vectors cannot call it.

/// ln x of a normal number above zero, within 1 ulp: ln x = k ln 2 + ln m, with
/// ln m = ln(1 + f) = 2 artanh(s), s = f / (2 + f). Source: the series of artanh, NIST Handbook of
/// Mathematical Functions (2010), 4.38.5; |s| < 0.172, so that ten terms reach 1e-17.
template <class Real>
inline Real natural_logarithm(Real x) {
  const Split<Real> parts = split(x);
  const Real f = parts.mantissa - 1.0;
  const Real s = f / (2.0 + f);
  const Real z = s * s;
  const Real w = z * z;
  // 2/3 z + 2/5 z^2 + ... + 2/21 z^10, even and odd powers apart
  const Real odd = z * (2.0 / 3 + w * (2.0 / 7 + w * (2.0 / 11 + w * (2.0 / 15 + w * (2.0 / 19)))));
  const Real even =
      w * (2.0 / 5 + w * (2.0 / 9 + w * (2.0 / 13 + w * (2.0 / 17 + w * (2.0 / 21)))));
  const Real half_square = 0.5 * f * f;
  // ln 2 in two parts: the first has 33 bits, so that its product with k is exact.
  constexpr double kLn2High = 6.93147180369123816490e-01;
  constexpr double kLn2Low = 1.90821492927058770002e-10;
  const Real k = parts.exponent;
  return k * kLn2High - ((half_square - (s * (half_square + (odd + even)) + k * kLn2Low)) - f);
}
