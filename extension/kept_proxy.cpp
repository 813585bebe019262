#include "extension/kept_proxy.hpp"

#include <uno/dispatcher.h>
#include <uno/environment.hxx>
#include <uno/lbnames.h>
#include <uno/mapping.hxx>

#include <utility>

namespace entropy_ledger::extension {

void KeptProxy::keep(com::sun::star::uno::XInterface* interface, const com::sun::star::uno::Type& type)
{
    let_go();
    const com::sun::star::uno::Mapping to_binary(
        com::sun::star::uno::Environment(rtl::OUString(CPPU_CURRENT_LANGUAGE_BINDING_NAME)),
        com::sun::star::uno::Environment(rtl::OUString(UNO_LB_UNO)));
    if (to_binary.is())
        proxy_ = static_cast<uno_Interface*>(to_binary.mapInterface(interface, type));
}

void KeptProxy::let_go()
{
    if (uno_Interface* proxy = std::exchange(proxy_, nullptr))
        proxy->release(proxy);
}

} // namespace entropy_ledger::extension
