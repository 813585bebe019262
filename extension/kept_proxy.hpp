// Keeps the bridge's proxy of an add-in alive.
#pragma once

#include <com/sun/star/uno/Type.hxx>
#include <com/sun/star/uno/XInterface.hpp>

typedef struct _uno_Interface uno_Interface;

namespace entropy_ledger::extension {

// Calc calls add-ins through UNO's reflection, which works on the binary form of an interface: for a C++ object that
// is a proxy, made for the call and thrown away after it, unless one exists. Holding one more than halves the cost of a
// cheap cell function. The proxy holds the object in turn, so someone has to let it go: the add-in does so when the
// service manager, which keeps the one instance of each add-in, disposes of it at the end of the program.
class KeptProxy {
public:
    KeptProxy() = default;
    KeptProxy(const KeptProxy&) = delete;
    KeptProxy& operator=(const KeptProxy&) = delete;
    ~KeptProxy() { let_go(); }

    // `interface` points to the interface of the given type. Without a bridge nothing is kept, and calls are slower.
    void keep(com::sun::star::uno::XInterface* interface, const com::sun::star::uno::Type& type);
    void let_go();

private:
    uno_Interface* proxy_ = nullptr;
};

} // namespace entropy_ledger::extension
