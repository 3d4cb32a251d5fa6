// One row of a coefficient table of an IAPWS release.
#pragma once

namespace busbar::water::tables {

/// A term n x^i y^j; the digits of n are those printed in the release.
/// `i` is a double because table 25 of R7-97(2012) has quarters.
struct Term {
  double i;
  int j;
  double n;
};

}  // namespace busbar::water::tables
