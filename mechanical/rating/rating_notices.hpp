#pragma once

#include "mechanical/rating/rating.hpp"

namespace ringward::mechanical {

/// What the reader of a rating must know beside the number: what the tube did and when, how much of
/// the cold strength was confinement, reserves that are not counted, and what the models leave out.
/// @param rating everything but its notices
[[nodiscard]] Notices rating_notices(const Column& column, const thermal::FireExposure& fire,
                                     const Rating& rating);

}  // namespace ringward::mechanical
