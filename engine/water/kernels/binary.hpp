// The parts of a binary floating-point number (IEEE 754-2019, 3.4).

template <class Real>
struct Split {
  Real exponent;
  Real mantissa;
};

inline constexpr int kMantissaBits = 52;
inline constexpr unsigned long long kOne = 0x3ff0000000000000;         // the bits of 1
inline constexpr unsigned long long kRootOfHalf = 0x3fe6a09e667f3bcd;  // the bits of sqrt(1/2)
inline constexpr unsigned long long kTwoTo52 = 0x4330000000000000;     // the bits of 2^52
inline constexpr double kBiasedTwoTo52 = 4503599627370496.0 + 1023;
inline constexpr double kTwoTo52Value = 4503599627370496.0;
