// Instantiates the main functions beside the globals of names.hpp, using each of these once.
double use_the_library() {
    const auto beam_of_globals = simple_beam(L * m, EI * N * m2);
    const auto all = dead * uniform_load(w * kN / m) +
                     live * partial_uniform_load(q * kN / m, between(from * m, to * m)) +
                     linear_load(0.0 * kN / m, w * kN / m, between(a * m, b * m)) + point_load(P * kN, at(x * m)) +
                     applied_couple(C * kN * m, at(at_ * m)) + settlement(end::right, t * m);
    const auto answer = beam_of_globals.under(all);
    load_list<> list;
    list += point_load(F * kN, at(place * m));
    list *= factor;
    const auto turned = mirrored(cantilever(span * m, E * Pa * I * m4)).under(list);
    const auto clamped = fixed_beam(L * m, EI * N * m2).under(support_rotation(end::left, phi * mrad));
    const auto propped = propped_cantilever(L * m, EI * N * m2).under(uniform_load(load * kN / m));
    const auto greatest = greatest_deflection(answer);
    const auto integrated = moment_area(answer, a * m, b * m);
    const auto read = parse<dimension::length>("7.2 m");
    fmt::print("{:.1f mm} at {:.2f m}\n", greatest.value, greatest.at);
    return answer.deflection(x * m) / mm + answer.slope(x * m) / mrad + answer.moment(x * m) / (kN * m) +
           answer.shear(x * m) / kN + answer.load(x * m) / (kN / m) + answer.reaction(end::left) / kN +
           answer.end_moment(end::left) / (kN * m) + turned.deflection(span * m) / mm +
           clamped.moment(x * m) / (kN * m) + propped.shear(x * m) / kN + integrated.deviation / mm + read / m +
           cross_check(answer).greatest() + M + V + T + A + W + R + y + z + c + d + h + s + u + v + xi + alpha + theta +
           size + value + number + joist + line + worst + check + left + right + result + limit + EI_ + span_ + n + i;
}
