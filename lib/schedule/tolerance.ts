/**
 * Times closer than this are one and the same (working days; less than a thirtieth of a second). Sums of
 * fractions carry noise, and a float that is all noise must not make an activity look free.
 */
export const TOLERANCE = 1e-6;
