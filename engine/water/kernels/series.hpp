// Sums of n x^i y^j over a coefficient table, unrolled when compiled: no std::pow, no loop.
//
// `Real` is double, or the lanes of a vector (batch/lanes.hpp). Nothing below calls the maths
// library, and nothing of std:: is instantiated into code.

/// Which sums are wanted; they are combined with |.
enum Wanted : unsigned {
  kValue = 1,  ///< sum c, with c = n x^i y^j
  kX = 2,      ///< sum i c = x d/dx
  kXX = 4,     ///< sum i (i-1) c = x^2 d2/dx2
  kY = 8,      ///< sum j c = y d/dy
  kYY = 16,    ///< sum j (j-1) c = y^2 d2/dy2
  kYYY = 32,   ///< sum j (j-1) (j-2) c = y^3 d3/dy3
  kXY = 64,    ///< sum i j c = x y d2/(dx dy)
};

/// The sums that were asked for; the others stay zero.
template <class Real>
struct Sums {
  Real value{};
  Real x{};
  Real xx{};
  Real y{};
  Real yy{};
  Real yyy{};
  Real xy{};
};

namespace series_detail {

// Types only.
template <int... kIndex>
using Indices = std::integer_sequence<int, kIndex...>;

template <int kCount>
using IndicesTo = std::make_integer_sequence<int, kCount>;

template <const auto& kTable>
inline constexpr int kRows = static_cast<int>(sizeof(kTable) / sizeof(kTable[0]));

// The exponent of x as an integer: tables with quarters take x^(1/4) and kScale = 4.
template <const auto& kTable, int kScale>
constexpr int exponent_x(int row) {
  return static_cast<int>(kTable[row].i * kScale);
}

struct Span {
  int lowest = 0;
  int highest = 0;
};

template <const auto& kTable, int kScale>
constexpr Span span_x() {
  Span span;
  for (int k = 0; k < kRows<kTable>; ++k) {
    const int e = exponent_x<kTable, kScale>(k);
    if (e < span.lowest) span.lowest = e;
    if (e > span.highest) span.highest = e;
  }
  return span;
}

template <const auto& kTable>
constexpr Span span_y() {
  Span span;
  for (int k = 0; k < kRows<kTable>; ++k) {
    const int e = kTable[k].j;
    if (e < span.lowest) span.lowest = e;
    if (e > span.highest) span.highest = e;
  }
  return span;
}

// x^kLowest to x^kHighest. Each power is the product of two halves, so that the chain of roundings
// is short. Inlined by force: the compiler then drops those that no term uses.
template <int kLowest, int kHighest, class Real>
struct Powers {
  Real up[kHighest + 1];
  Real down[1 - kLowest];

  [[gnu::always_inline]] explicit Powers(Real x) {
    fill(up, x, IndicesTo<kHighest + 1>{});
    if constexpr (kLowest < 0) {
      fill(down, 1.0 / x, IndicesTo<1 - kLowest>{});
    }
  }

  template <int kExponent>
  [[nodiscard, gnu::always_inline]] Real to() const {
    if constexpr (kExponent >= 0) {
      return up[kExponent];
    } else {
      return down[-kExponent];
    }
  }

 private:
  template <int... kIndex>
  [[gnu::always_inline]] static void fill(Real* power, Real x, Indices<kIndex...>) {
    ((kIndex == 0   ? void(power[kIndex] = Real{} + 1.0)
      : kIndex == 1 ? void(power[kIndex] = x)
                    : void(power[kIndex] = power[kIndex / 2] * power[kIndex - kIndex / 2])),
     ...);
  }
};

// Terms with the same i stand together in the tables: their sums over y are taken first and then
// multiplied with x^i once.
template <class Real>
struct Group {
  Real value;
  Real y;
  Real yy;
  Real yyy;
};

template <const auto& kTable, int kScale, unsigned kSet, int kRow, class Real, class PowersX,
          class PowersY>
[[gnu::always_inline]] inline void add_row(Sums<Real>& sums, Group<Real>& group, const PowersX& px,
                                           const PowersY& py) {
  constexpr double n = kTable[kRow].n;
  constexpr double j = kTable[kRow].j;
  constexpr double i = kTable[kRow].i;
  constexpr int e = exponent_x<kTable, kScale>(kRow);
  constexpr bool first = [] {
    if constexpr (kRow == 0) {
      return true;
    } else {
      return exponent_x<kTable, kScale>(kRow - 1) != exponent_x<kTable, kScale>(kRow);
    }
  }();
  constexpr bool last = [] {
    if constexpr (kRow + 1 == kRows<kTable>) {
      return true;
    } else {
      return exponent_x<kTable, kScale>(kRow + 1) != exponent_x<kTable, kScale>(kRow);
    }
  }();
  constexpr bool value = (kSet & (kValue | kX | kXX)) != 0;
  constexpr bool y = (kSet & (kY | kXY)) != 0;

  if constexpr (first) group = Group<Real>{};
  const Real power = py.template to<kTable[kRow].j>();
  if constexpr (value) {
    if constexpr (first) {
      group.value = n * power;
    } else {
      group.value = group.value + n * power;
    }
  }
  if constexpr (y && j != 0) group.y = group.y + (n * j) * power;
  if constexpr ((kSet & kYY) != 0 && j != 0 && j != 1) {
    group.yy = group.yy + (n * j * (j - 1)) * power;
  }
  if constexpr ((kSet & kYYY) != 0 && j != 0 && j != 1 && j != 2) {
    group.yyy = group.yyy + (n * j * (j - 1) * (j - 2)) * power;
  }
  if constexpr (last) {
    const Real x = px.template to<e>();
    if constexpr (value) {
      const Real part = x * group.value;
      if constexpr ((kSet & kValue) != 0) sums.value = sums.value + part;
      if constexpr ((kSet & kX) != 0 && e != 0) sums.x = sums.x + i * part;
      if constexpr ((kSet & kXX) != 0 && e != 0) sums.xx = sums.xx + (i * (i - 1)) * part;
    }
    if constexpr (y) {
      const Real part = x * group.y;
      if constexpr ((kSet & kY) != 0) sums.y = sums.y + part;
      if constexpr ((kSet & kXY) != 0 && e != 0) sums.xy = sums.xy + i * part;
    }
    if constexpr ((kSet & kYY) != 0) sums.yy = sums.yy + x * group.yy;
    if constexpr ((kSet & kYYY) != 0) sums.yyy = sums.yyy + x * group.yyy;
  }
}

template <const auto& kTable, int kScale, unsigned kSet, class Real, int... kRow>
[[gnu::always_inline]] inline Sums<Real> sum_rows(Real x, Real y, Indices<kRow...>) {
  constexpr Span sx = span_x<kTable, kScale>();
  constexpr Span sy = span_y<kTable>();
  const Powers<sx.lowest, sx.highest, Real> px(x);
  const Powers<sy.lowest, sy.highest, Real> py(y);
  Sums<Real> sums;
  Group<Real> group{};
  (add_row<kTable, kScale, kSet, kRow>(sums, group, px, py), ...);
  return sums;
}

}  // namespace series_detail

/// The sums `kSet` (Wanted) of n x^i y^j over the rows of a table.
///
/// x and y must not be zero where the table has negative exponents. With kScale = 4 the caller
/// hands over x^(1/4).
template <const auto& kTable, unsigned kSet, int kScale = 1, class Real>
[[gnu::always_inline]] inline Sums<Real> series(Real x, Real y) {
  return series_detail::sum_rows<kTable, kScale, kSet>(
      x, y, series_detail::IndicesTo<series_detail::kRows<kTable>>{});
}
