// What is thrown when a value is wrong at run time.
#pragma once

#include <stdexcept>

namespace sagitta {

/// A value that the library cannot work with: it names the argument, the value with its unit, and the bound.
/// Nothing is ever clamped or ignored instead.
class invalid_input : public std::invalid_argument {
public:
    using std::invalid_argument::invalid_argument;
};

}  // namespace sagitta
