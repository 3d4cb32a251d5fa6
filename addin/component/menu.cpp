// The menu "Busbar": explain the active cell, open the help, say what this is.
//
// A command answers with the text that it shows, so that a macro can have it too; with the argument
// Quiet = true it shows nothing.
#include <com/sun/star/awt/MessageBoxButtons.hpp>
#include <com/sun/star/awt/MessageBoxType.hpp>
#include <com/sun/star/awt/XMessageBox.hpp>
#include <com/sun/star/awt/XMessageBoxFactory.hpp>
#include <com/sun/star/awt/XWindowPeer.hpp>
#include <com/sun/star/beans/PropertyValue.hpp>
#include <com/sun/star/deployment/XPackageInformationProvider.hpp>
#include <com/sun/star/frame/DispatchDescriptor.hpp>
#include <com/sun/star/frame/DispatchResultEvent.hpp>
#include <com/sun/star/frame/DispatchResultState.hpp>
#include <com/sun/star/frame/FeatureStateEvent.hpp>
#include <com/sun/star/frame/XController.hpp>
#include <com/sun/star/frame/XDispatchProvider.hpp>
#include <com/sun/star/frame/XFrame.hpp>
#include <com/sun/star/frame/XModel.hpp>
#include <com/sun/star/frame/XNotifyingDispatch.hpp>
#include <com/sun/star/lang/XInitialization.hpp>
#include <com/sun/star/lang/XMultiComponentFactory.hpp>
#include <com/sun/star/lang/XMultiServiceFactory.hpp>
#include <com/sun/star/lang/XServiceInfo.hpp>
#include <com/sun/star/sheet/XCellRangeAddressable.hpp>
#include <com/sun/star/system/SystemShellExecuteFlags.hpp>
#include <com/sun/star/system/XSystemShellExecute.hpp>
#include <com/sun/star/table/XCellRange.hpp>
#include <com/sun/star/uno/XComponentContext.hpp>
#include <com/sun/star/util/URL.hpp>
#include <com/sun/star/view/XSelectionSupplier.hpp>
#include <cppuhelper/implbase4.hxx>
#include <cppuhelper/supportsservice.hxx>
#include <string>

#include "../cautions.hpp"
#include "engine.hpp"
#include "text.hpp"
#include "why.hpp"
#include "why_document.hpp"
#include "why_tree.hpp"

namespace {

using com::sun::star::awt::XMessageBox;
using com::sun::star::awt::XMessageBoxFactory;
using com::sun::star::awt::XWindowPeer;
using com::sun::star::beans::PropertyValue;
using com::sun::star::frame::DispatchDescriptor;
using com::sun::star::frame::DispatchResultEvent;
using com::sun::star::frame::FeatureStateEvent;
using com::sun::star::frame::XController;
using com::sun::star::frame::XDispatch;
using com::sun::star::frame::XDispatchProvider;
using com::sun::star::frame::XDispatchResultListener;
using com::sun::star::frame::XFrame;
using com::sun::star::frame::XNotifyingDispatch;
using com::sun::star::frame::XStatusListener;
using com::sun::star::lang::XInitialization;
using com::sun::star::lang::XMultiServiceFactory;
using com::sun::star::lang::XServiceInfo;
using com::sun::star::sheet::XCellRangeAddressable;
using com::sun::star::table::CellRangeAddress;
using com::sun::star::table::XCellRange;
using com::sun::star::uno::Any;
using com::sun::star::uno::Reference;
using com::sun::star::uno::Sequence;
using com::sun::star::uno::UNO_QUERY;
using com::sun::star::uno::UNO_QUERY_THROW;
using com::sun::star::uno::XComponentContext;
using com::sun::star::uno::XInterface;
using com::sun::star::util::URL;
using com::sun::star::view::XSelectionSupplier;
using rtl::OUString;

constexpr char kProtocol[] = "busbar.calc.menu:";
constexpr char kExtension[] = "busbar.calc.extension";

// The name of the first Busbar function that is called below a node.
std::string first_function(const busbar::addin::Node& node) {
  if (node.kind == busbar::addin::NodeKind::busbar_call) return node.word;
  for (const busbar::addin::Node& child : node.children) {
    std::string found = first_function(child);
    if (!found.empty()) return found;
  }
  return {};
}

class Menu final : public cppu::WeakImplHelper4<XDispatchProvider, XNotifyingDispatch,
                                                XInitialization, XServiceInfo> {
 public:
  explicit Menu(XComponentContext* context) : context_(context) {}

  void SAL_CALL initialize(const Sequence<Any>& arguments) override {
    if (arguments.hasElements()) arguments[0] >>= frame_;
  }

  OUString SAL_CALL getImplementationName() override { return "busbar.calc.Menu"; }
  sal_Bool SAL_CALL supportsService(const OUString& name) override {
    return cppu::supportsService(this, name);
  }
  Sequence<OUString> SAL_CALL getSupportedServiceNames() override {
    const OUString name("com.sun.star.frame.ProtocolHandler");
    return Sequence<OUString>(&name, 1);
  }

  Reference<XDispatch> SAL_CALL queryDispatch(const URL& url, const OUString&, sal_Int32) override {
    if (url.Protocol != kProtocol) return {};
    return this;
  }
  Sequence<Reference<XDispatch>> SAL_CALL
  queryDispatches(const Sequence<DispatchDescriptor>& wanted) override {
    Sequence<Reference<XDispatch>> found(wanted.getLength());
    Reference<XDispatch>* const out = found.getArray();
    for (sal_Int32 i = 0; i < wanted.getLength(); ++i)
      out[i] = queryDispatch(wanted[i].FeatureURL, wanted[i].FrameName, wanted[i].SearchFlags);
    return found;
  }

  void SAL_CALL dispatch(const URL& url, const Sequence<PropertyValue>& arguments) override {
    run(url, arguments);
  }
  void SAL_CALL
  dispatchWithNotification(const URL& url, const Sequence<PropertyValue>& arguments,
                           const Reference<XDispatchResultListener>& listener) override {
    const OUString text = run(url, arguments);
    if (!listener.is()) return;
    DispatchResultEvent event;
    event.Source = static_cast<cppu::OWeakObject*>(this);
    event.State = com::sun::star::frame::DispatchResultState::SUCCESS;
    event.Result <<= text;
    listener->dispatchFinished(event);
  }
  void SAL_CALL addStatusListener(const Reference<XStatusListener>& listener,
                                  const URL& url) override {
    if (!listener.is()) return;
    FeatureStateEvent state;
    state.Source = static_cast<cppu::OWeakObject*>(this);
    state.FeatureURL = url;
    state.IsEnabled = true;
    state.Requery = false;
    listener->statusChanged(state);
  }
  void SAL_CALL removeStatusListener(const Reference<XStatusListener>&, const URL&) override {}

 private:
  OUString run(const URL& url, const Sequence<PropertyValue>& arguments) {
    bool quiet = false;
    for (const PropertyValue& argument : arguments)
      if (argument.Name == "Quiet") argument.Value >>= quiet;
    OUString text;
    try {
      if (url.Path == "explain") {
        text = explanation();
        if (!quiet) show("Explain this cell", text);
      } else if (url.Path == "help") {
        text = help_page();
        if (!quiet) open(text);
      } else if (url.Path == "about") {
        text = about();
        if (!quiet) show("About Busbar", text);
      }
    } catch (const com::sun::star::uno::Exception& e) {
      text = "Busbar could not do this: " + e.Message;
      if (!quiet) show("Busbar", text);
    } catch (...) {
      // No memory for a sentence: nothing can be shown, and nothing may leave this method.
    }
    return text;
  }

  Reference<XInterface> document() const {
    if (!frame_.is()) return {};
    const Reference<XController> controller = frame_->getController();
    return controller.is() ? Reference<XInterface>(controller->getModel()) : nullptr;
  }

  // The cell with the cursor, also while a larger range is selected; null where there is none.
  Reference<XCellRange> active_cell() const {
    const Reference<XInterface> model = document();
    const Reference<XSelectionSupplier> selection(frame_.is() ? frame_->getController() : nullptr,
                                                  UNO_QUERY);
    if (!model.is() || !selection.is()) return {};
    const Any selected = selection->getSelection();
    const Reference<XCellRange> single = single_cell(selected);
    if (single.is()) return single;
    // An empty selection leaves the cursor alone as what is selected.
    const Reference<XMultiServiceFactory> factory(model, UNO_QUERY);
    if (!factory.is()) return {};
    selection->select(Any(factory->createInstance("com.sun.star.sheet.SheetCellRanges")));
    const Reference<XCellRange> cell = single_cell(selection->getSelection());
    selection->select(selected);
    return cell;
  }

  static Reference<XCellRange> single_cell(const Any& selected) {
    const Reference<XCellRange> range(selected, UNO_QUERY);
    const Reference<XCellRangeAddressable> addressable(selected, UNO_QUERY);
    if (!range.is() || !addressable.is()) return {};
    const CellRangeAddress where = addressable->getRangeAddress();
    const bool single = where.StartColumn == where.EndColumn && where.StartRow == where.EndRow;
    return single ? range : nullptr;
  }

  OUString explanation() const {
    const Reference<XCellRange> cell = active_cell();
    if (!cell.is()) return "Place the cursor on a cell first.";
    return busbar::addin::to_utf16(busbar::addin::explain_cell(context_, document(), cell));
  }

  static OUString about() {
    std::string text = "Busbar ";
    text += busbar_version();
    text += ", " + std::to_string(busbar_function_count()) +
            " functions for the appraisal of thermal generating plant.\n\n";
    text += busbar::addin::kCautions;
    text +=
        "\n\nLicensed under the Apache License, Version 2.0, without warranty or conditions of any "
        "kind.";
    if (!busbar::addin::engine_mismatch().empty())
      text += "\n\n" + busbar::addin::engine_mismatch();
    return busbar::addin::to_utf16(text);
  }

  // The page of the function in the active cell, else the index.
  OUString help_page() const {
    const Reference<com::sun::star::deployment::XPackageInformationProvider> packages(
        context_->getValueByName("/singletons/com.sun.star.deployment.PackageInformationProvider"),
        UNO_QUERY_THROW);
    const OUString folder = packages->getPackageLocation(kExtension) + "/help/";
    const std::string function = function_in_active_cell();
    if (function.empty()) return folder + "index.html";
    return folder + "functions/" + busbar::addin::to_utf16(function) + ".html";
  }

  std::string function_in_active_cell() const {
    const Reference<XCellRangeAddressable> cell(active_cell(), UNO_QUERY);
    if (!cell.is()) return {};
    const CellRangeAddress where = cell->getRangeAddress();
    const busbar::addin::SheetDocument sheets(document());
    const busbar::addin::Address address{where.Sheet, where.StartRow, where.StartColumn};
    if (sheets.content(address) != busbar::addin::Content::formula) return {};
    const busbar::addin::CellFormula formula = sheets.formula(address);
    return first_function(busbar::addin::parse_formula(formula.tokens, formula.base,
                                                       busbar::addin::token_numbers(sheets)));
  }

  Reference<XInterface> service(const char* name) const {
    return context_->getServiceManager()->createInstanceWithContext(OUString::createFromAscii(name),
                                                                    context_);
  }

  void open(const OUString& url) const {
    const Reference<com::sun::star::system::XSystemShellExecute> shell(
        service("com.sun.star.system.SystemShellExecute"), UNO_QUERY_THROW);
    shell->execute(url, OUString(), com::sun::star::system::SystemShellExecuteFlags::URIS_ONLY);
  }

  void show(const char* title, const OUString& text) const {
    const Reference<XMessageBoxFactory> boxes(service("com.sun.star.awt.Toolkit"), UNO_QUERY);
    const Reference<XWindowPeer> parent(frame_.is() ? frame_->getContainerWindow() : nullptr,
                                        UNO_QUERY);
    if (!boxes.is() || !parent.is()) return;
    const Reference<XMessageBox> box = boxes->createMessageBox(
        parent, com::sun::star::awt::MessageBoxType_INFOBOX,
        com::sun::star::awt::MessageBoxButtons::BUTTONS_OK, OUString::createFromAscii(title), text);
    if (box.is()) box->execute();
  }

  Reference<XComponentContext> context_;
  Reference<XFrame> frame_;
};

}  // namespace

extern "C" SAL_DLLPUBLIC_EXPORT XInterface* SAL_CALL busbar_calc_menu(XComponentContext* context,
                                                                      const Sequence<Any>&) {
  return cppu::acquire(new Menu(context));
}
