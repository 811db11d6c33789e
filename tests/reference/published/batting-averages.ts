/** Batting averages of eighteen players after 45 times at bat in 1970, as in Efron and Morris 1977 (from memory). */
export const battingAverages = [
  0.4, 0.378, 0.356, 0.333, 0.311, 0.311, 0.289, 0.267, 0.244, 0.244, 0.222, 0.222, 0.222, 0.222, 0.222, 0.2, 0.178,
  0.156,
];

/** The same players over the rest of the season. */
export const restOfSeason = [
  0.346, 0.298, 0.276, 0.222, 0.273, 0.27, 0.263, 0.21, 0.269, 0.23, 0.264, 0.256, 0.303, 0.264, 0.226, 0.285, 0.316,
  0.2,
];
