// An add-in whose functions do nothing: what Calc itself and its transport cost.
//
// EMPTY_TWO, EMPTY_THREE: numbers in, a number out. EMPTY_TEXT, EMPTY_TEXT_THREE: anything in, a
// text as long as a stream's out. EMPTY_TABLE, EMPTY_TEXT_TABLE: two columns in, a column of
// numbers or texts out.
#include <busbarbench/XEmptyAddIn.hpp>
#include <com/sun/star/lang/XServiceInfo.hpp>
#include <com/sun/star/uno/XComponentContext.hpp>
#include <cppuhelper/implbase2.hxx>
#include <cppuhelper/supportsservice.hxx>

namespace {

using com::sun::star::uno::Any;
using com::sun::star::uno::Sequence;
using rtl::OUString;

double number_in(const Any& any) {
  double number = 0;
  any >>= number;
  return number;
}

// A text of the length of a stream's that differs from cell to cell, as streams do.
OUString stream_long(double number) {
  OUString text = "steam 55 kg/s, 100 bar, 540 C [1 p=1e+07 t=813.15 h=3476868.5519640464 m=55 #" +
                  OUString::number(number) + "]";
  return text;
}

using Base = cppu::WeakImplHelper2<busbarbench::XEmptyAddIn, com::sun::star::lang::XServiceInfo>;

class EmptyAddIn : public Base {
 public:
  Any SAL_CALL EMPTY_TWO(const Any& a, const Any& b) override {
    return Any(number_in(a) + number_in(b));
  }
  Any SAL_CALL EMPTY_THREE(const Any& a, const Any& b, const Any& c) override {
    return Any(number_in(a) + number_in(b) + number_in(c));
  }
  Any SAL_CALL EMPTY_TEXT(const Any& a, const Any& b, const Any& /*c*/, const Any& /*d*/) override {
    OUString text;
    // A text of its own as long as the one given: the same one would cost Calc nothing to keep.
    if (a >>= text) return Any(text.copy(1) + "]");
    return Any(stream_long(number_in(a) + number_in(b)));
  }
  Any SAL_CALL EMPTY_TEXT_THREE(const Any& a, const Any& b, const Any& c) override {
    return EMPTY_TEXT(a, b, c, Any());
  }
  Any SAL_CALL EMPTY_TABLE(const Any& a, const Any& b) override {
    Sequence<Sequence<Any>> first;
    Sequence<Sequence<Any>> second;
    if (!(a >>= first) || !(b >>= second)) return EMPTY_TWO(a, b);
    const sal_Int32 rows = first.getLength();
    Sequence<Sequence<double>> out(rows);
    auto* row = out.getArray();
    for (sal_Int32 r = 0; r < rows; ++r) {
      const double sum = number_in(first[r][0]) + number_in(second[r][0]);
      row[r] = Sequence<double>(&sum, 1);
    }
    return Any(out);
  }
  Any SAL_CALL EMPTY_TEXT_TABLE(const Any& a, const Any& b) override {
    Sequence<Sequence<Any>> first;
    Sequence<Sequence<Any>> second;
    if (!(a >>= first) || !(b >>= second)) return EMPTY_TEXT(a, b, Any(), Any());
    const sal_Int32 rows = first.getLength();
    Sequence<Sequence<OUString>> out(rows);
    auto* row = out.getArray();
    for (sal_Int32 r = 0; r < rows; ++r) {
      const OUString text = stream_long(number_in(first[r][0]) + number_in(second[r][0]));
      row[r] = Sequence<OUString>(&text, 1);
    }
    return Any(out);
  }

  OUString SAL_CALL getImplementationName() override { return "busbarbench.EmptyAddIn"; }
  sal_Bool SAL_CALL supportsService(const OUString& name) override {
    return cppu::supportsService(this, name);
  }
  Sequence<OUString> SAL_CALL getSupportedServiceNames() override {
    const OUString names[] = {"BUSBARBENCH", "com.sun.star.sheet.AddIn"};
    return Sequence<OUString>(names, 2);
  }
};

}  // namespace

extern "C" SAL_DLLPUBLIC_EXPORT com::sun::star::uno::XInterface* SAL_CALL
busbarbench_get_implementation(com::sun::star::uno::XComponentContext* /*context*/,
                               const Sequence<Any>& /*arguments*/) {
  return cppu::acquire(new EmptyAddIn);
}
