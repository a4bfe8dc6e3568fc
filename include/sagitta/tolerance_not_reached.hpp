// What is thrown when a numerical integration cannot be made as accurate as asked.
#pragma once

#include <stdexcept>
#include <string>

namespace sagitta {

/// Says what was asked and what was reached (relative errors).
class tolerance_not_reached : public std::runtime_error {
public:
    tolerance_not_reached(const std::string& sentence, double reached)
        : std::runtime_error(sentence), reached_(reached) {}

    [[nodiscard]] double reached() const { return reached_; }

private:
    double reached_;
};

}  // namespace sagitta
