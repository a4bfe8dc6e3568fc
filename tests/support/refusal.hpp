// What an invalid_input says that a call throws; empty where nothing was refused.
#pragma once

#include <sagitta/invalid_input.hpp>

#include <string>

template <class Function>
std::string refusal(const Function& f) {
    try {
        f();
    } catch (const sagitta::invalid_input& refused) {
        return refused.what();
    }
    return "";
}
