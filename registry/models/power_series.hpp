// Sums of terms n x^i y^j with constant exponents, as the equations of IAPWS are made of.
//
// The exponents are known to the compiler: only the powers that occur are made, each by one multiplication of powers
// already at hand, and each term costs two multiplications. No pow, no loop at run time, the same code for any Number
// that has a default constructor.
#pragma once

#include <array>
#include <cstddef>
#include <utility>

namespace entropy_ledger::registry {

struct PowerTerm {
    int i;     // exponent of x
    int j;     // exponent of y
    double n;  // coefficient
};

// The factor with which a term enters a sum.
using TermWeight = double (*)(int i, int j);

namespace term_weight {
constexpr double one(int, int) { return 1.0; }
constexpr double i(int i, int) { return i; }                  // x d/dx
constexpr double ii(int i, int) { return i * (i - 1); }       // x^2 d2/dx2
constexpr double j(int, int j) { return j; }                  // y d/dy
constexpr double jj(int, int j) { return j * (j - 1); }       // y^2 d2/dy2
constexpr double ij(int i, int j) { return i * j; }           // x y d2/dxdy
} // namespace term_weight

namespace detail {

// Which powers must be made so that every exponent of the terms can be had: index k for |exponent| k.
template <std::size_t Size>
struct PowerPlan {
    std::array<bool, Size> positive{};
    std::array<bool, Size> negative{};
};

template <const auto& Terms, int PowerTerm::*Exponent>
constexpr int greatest_exponent()
{
    int greatest = 1;
    for (const PowerTerm& term : Terms) {
        const int e = term.*Exponent;
        if (e > greatest)
            greatest = e;
        if (-e > greatest)
            greatest = -e;
    }
    return greatest;
}

// x^k is made as the square of x^(k/2) for even k, as x^(k-1) x for odd k.
template <std::size_t Size>
constexpr void close_plan(std::array<bool, Size>& needed)
{
    for (std::size_t k = Size - 1; k >= 2; --k)
        if (needed[k])
            needed[k % 2 == 0 ? k / 2 : k - 1] = true;
}

template <const auto& Terms, int PowerTerm::*Exponent>
constexpr auto make_plan()
{
    PowerPlan<static_cast<std::size_t>(greatest_exponent<Terms, Exponent>()) + 1> plan;
    for (const PowerTerm& term : Terms) {
        const int e = term.*Exponent;
        if (e > 0)
            plan.positive[static_cast<std::size_t>(e)] = true;
        if (e < 0)
            plan.negative[static_cast<std::size_t>(-e)] = true;
    }
    close_plan(plan.positive);
    close_plan(plan.negative);
    return plan;
}

} // namespace detail

// The powers of one variable that the terms need.
template <const auto& Terms, int PowerTerm::*Exponent, class Number>
class Powers {
    static constexpr auto plan = detail::make_plan<Terms, Exponent>();
    static constexpr std::size_t size = plan.positive.size();
    static constexpr bool has_negative = [] {
        for (const bool needed : plan.negative)
            if (needed)
                return true;
        return false;
    }();

public:
    explicit Powers(const Number& x)
    {
        positive_[1] = x;
        fill<true>(positive_, std::make_index_sequence<size>());
        if constexpr (has_negative) {
            negative_[1] = 1.0 / x;
            fill<false>(negative_, std::make_index_sequence<size>());
        }
    }

    template <int Power>
    const Number& at() const
    {
        static_assert(Power != 0);
        if constexpr (Power > 0)
            return positive_[static_cast<std::size_t>(Power)];
        else
            return negative_[static_cast<std::size_t>(-Power)];
    }

private:
    template <bool Positive, std::size_t... K>
    static void fill(std::array<Number, size>& table, std::index_sequence<K...>)
    {
        (make<Positive, K>(table), ...);
    }

    template <bool Positive, std::size_t K>
    static void make(std::array<Number, size>& table)
    {
        if constexpr (K >= 2 && (Positive ? plan.positive[K] : plan.negative[K])) {
            if constexpr (K % 2 == 0)
                table[K] = table[K / 2] * table[K / 2];
            else
                table[K] = table[K - 1] * table[1];
        }
    }

    std::array<Number, size> positive_;
    std::array<Number, has_negative ? size : 1> negative_;
};

// The sum over Terms at one (x, y). Made once, asked for as many weighted sums as wanted.
template <const auto& Terms, class Number>
class PowerSeries {
public:
    PowerSeries(const Number& x, const Number& y) : x_(x), y_(y) {}

    // sum of Weight(i, j) n x^i y^j; added pairwise, so that rounding stays small and additions can overlap
    template <TermWeight Weight>
    Number sum() const
    {
        return part<Weight, 0, selection<Weight>.count>();
    }

private:
    struct Selection {
        std::array<PowerTerm, Terms.size()> terms{};
        std::size_t count = 0;
    };

    template <TermWeight Weight>
    static constexpr Selection selection = [] {
        Selection result;
        for (const PowerTerm& term : Terms) {
            const double n = Weight(term.i, term.j) * term.n;
            if (n != 0.0)
                result.terms[result.count++] = {term.i, term.j, n};
        }
        return result;
    }();

    template <TermWeight Weight, std::size_t First, std::size_t Last>
    Number part() const
    {
        if constexpr (Last - First == 1) {
            constexpr PowerTerm term = selection<Weight>.terms[First];
            if constexpr (term.i == 0 && term.j == 0)
                return Number(term.n);
            else if constexpr (term.i == 0)
                return term.n * y_.template at<term.j>();
            else if constexpr (term.j == 0)
                return term.n * x_.template at<term.i>();
            else
                return term.n * (x_.template at<term.i>() * y_.template at<term.j>());
        } else {
            constexpr std::size_t middle = First + (Last - First) / 2;
            return part<Weight, First, middle>() + part<Weight, middle, Last>();
        }
    }

    Powers<Terms, &PowerTerm::i, Number> x_;
    Powers<Terms, &PowerTerm::j, Number> y_;
};

} // namespace entropy_ledger::registry
