// The lanes of one vector as a number, so that the kernels compile for it as they do for a double.
// Read inside the namespace of an instruction set (batch/kernels.hpp).

namespace hn = hwy::HWY_NAMESPACE;

using Tag = hn::ScalableTag<double>;
using Bits = hn::RebindToUnsigned<Tag>;
inline constexpr std::size_t kLanes = hn::MaxLanes(Tag());

struct Lanes {
  hn::Vec<Tag> v;
};

struct Mask {
  hn::Mask<Tag> m;
};

HWY_INLINE Lanes all_lanes(double x) { return {hn::Set(Tag(), x)}; }
HWY_INLINE Lanes load(const double* from) { return {hn::LoadU(Tag(), from)}; }
HWY_INLINE void store(Lanes x, double* to) { hn::StoreU(x.v, Tag(), to); }

HWY_INLINE Lanes operator+(Lanes a, Lanes b) { return {hn::Add(a.v, b.v)}; }
HWY_INLINE Lanes operator-(Lanes a, Lanes b) { return {hn::Sub(a.v, b.v)}; }
HWY_INLINE Lanes operator*(Lanes a, Lanes b) { return {hn::Mul(a.v, b.v)}; }
HWY_INLINE Lanes operator/(Lanes a, Lanes b) { return {hn::Div(a.v, b.v)}; }
HWY_INLINE Lanes operator-(Lanes a) { return {hn::Neg(a.v)}; }
HWY_INLINE Lanes operator+(Lanes a, double b) { return a + all_lanes(b); }
HWY_INLINE Lanes operator-(Lanes a, double b) { return a - all_lanes(b); }
HWY_INLINE Lanes operator*(Lanes a, double b) { return a * all_lanes(b); }
HWY_INLINE Lanes operator/(Lanes a, double b) { return a / all_lanes(b); }
HWY_INLINE Lanes operator+(double a, Lanes b) { return all_lanes(a) + b; }
HWY_INLINE Lanes operator-(double a, Lanes b) { return all_lanes(a) - b; }
HWY_INLINE Lanes operator*(double a, Lanes b) { return all_lanes(a) * b; }
HWY_INLINE Lanes operator/(double a, Lanes b) { return all_lanes(a) / b; }

HWY_INLINE Mask operator<(Lanes a, Lanes b) { return {hn::Lt(a.v, b.v)}; }
HWY_INLINE Mask operator<=(Lanes a, Lanes b) { return {hn::Le(a.v, b.v)}; }
HWY_INLINE Mask operator>(Lanes a, Lanes b) { return {hn::Gt(a.v, b.v)}; }
HWY_INLINE Mask operator>=(Lanes a, Lanes b) { return {hn::Ge(a.v, b.v)}; }
HWY_INLINE Mask operator==(Lanes a, Lanes b) { return {hn::Eq(a.v, b.v)}; }
HWY_INLINE Mask operator<(Lanes a, double b) { return a < all_lanes(b); }
HWY_INLINE Mask operator<=(Lanes a, double b) { return a <= all_lanes(b); }
HWY_INLINE Mask operator>(Lanes a, double b) { return a > all_lanes(b); }
HWY_INLINE Mask operator>=(Lanes a, double b) { return a >= all_lanes(b); }
HWY_INLINE Mask operator&(Mask a, Mask b) { return {hn::And(a.m, b.m)}; }
HWY_INLINE Mask operator|(Mask a, Mask b) { return {hn::Or(a.m, b.m)}; }
HWY_INLINE Mask operator!(Mask a) { return {hn::Not(a.m)}; }
HWY_INLINE bool all(Mask a) { return hn::AllTrue(Tag(), a.m); }
HWY_INLINE bool none(Mask a) { return hn::AllFalse(Tag(), a.m); }

HWY_INLINE Lanes select(Mask condition, Lanes yes, Lanes no) {
  return {hn::IfThenElse(condition.m, yes.v, no.v)};
}
HWY_INLINE Lanes select(Mask condition, Lanes yes, double no) {
  return select(condition, yes, all_lanes(no));
}
HWY_INLINE Lanes select(Mask condition, double yes, Lanes no) {
  return select(condition, all_lanes(yes), no);
}
HWY_INLINE Lanes select(Mask condition, double yes, double no) {
  return select(condition, all_lanes(yes), all_lanes(no));
}
HWY_INLINE Lanes root(Lanes x) { return {hn::Sqrt(x.v)}; }
HWY_INLINE Lanes magnitude(Lanes x) { return {hn::Abs(x.v)}; }

#include "water/kernels/binary.hpp"

HWY_INLINE Split<Lanes> split(Lanes x) {
  const Bits d;
  const auto bits = hn::BitCast(d, x.v);
  const auto one = hn::Set(d, kOne);
  const auto biased =
      hn::ShiftRight<kMantissaBits>(hn::Add(hn::Sub(bits, hn::Set(d, kRootOfHalf)), one));
  return {
      Lanes{hn::BitCast(Tag(), hn::Or(biased, hn::Set(d, kTwoTo52)))} - kBiasedTwoTo52,
      Lanes{hn::BitCast(Tag(), hn::Sub(hn::Add(bits, one), hn::ShiftLeft<kMantissaBits>(biased)))}};
}

HWY_INLINE Lanes upper_half(Lanes x) {
  const Bits d;
  const auto half = hn::ShiftRight<32>(hn::BitCast(d, x.v));
  return Lanes{hn::BitCast(Tag(), hn::Or(half, hn::Set(d, kTwoTo52)))} - kTwoTo52Value;
}
