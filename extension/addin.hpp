// What all add-ins share. An add-in itself (generated) adds the methods of its interface.
//
// The texts for the function wizard stand in the configuration (CalcAddIns.xcu), not in the component: Calc then lists
// the functions without loading the library. That leaves nothing to do for com::sun::star::sheet::XAddIn.
#pragma once

#include "extension/kept_proxy.hpp"

#include <com/sun/star/lang/XServiceInfo.hpp>
#include <cppu/unotype.hxx>
#include <cppuhelper/basemutex.hxx>
#include <cppuhelper/compbase2.hxx>
#include <cppuhelper/supportsservice.hxx>
#include <rtl/ref.hxx>
#include <rtl/ustring.hxx>

namespace entropy_ledger::extension {

template <class Interface>
class AddIn : private cppu::BaseMutex,
              public cppu::WeakComponentImplHelper2<Interface, com::sun::star::lang::XServiceInfo> {
public:
    // Not in the constructor: there the object has no owner yet.
    void keep_proxy()
    {
        proxy_.keep(static_cast<Interface*>(this), cppu::UnoType<Interface>::get());
    }

    rtl::OUString SAL_CALL getImplementationName() override { return name_; }
    sal_Bool SAL_CALL supportsService(const rtl::OUString& service) override
    {
        return cppu::supportsService(this, service);
    }
    com::sun::star::uno::Sequence<rtl::OUString> SAL_CALL getSupportedServiceNames() override
    {
        return com::sun::star::uno::Sequence<rtl::OUString>(&name_, 1);
    }

protected:
    // The implementation and its one service are named as the prefix of the cell functions.
    explicit AddIn(const char* name)
        : cppu::WeakComponentImplHelper2<Interface, com::sun::star::lang::XServiceInfo>(m_aMutex),
          name_(rtl::OUString::createFromAscii(name))
    {
    }

    void SAL_CALL disposing() override { proxy_.let_go(); }

private:
    rtl::OUString name_;
    KeptProxy proxy_;
};

// The component loader's constructor function of an add-in: a new object, owned by the caller.
template <class Service>
com::sun::star::uno::XInterface* create() noexcept
{
    try {
        const rtl::Reference<Service> service(new Service);
        service->keep_proxy();
        service->acquire();
        return static_cast<cppu::OWeakObject*>(service.get());
    } catch (...) {
        return nullptr; // which the service manager reports as a failure to create the service
    }
}

} // namespace entropy_ledger::extension
