/** Largest coordinate or size, mm: 1 km. */
export const MAX_LENGTH_MM = 1e6;

/** Smallest size, mm: 1 µm. */
export const MIN_SIZE_MM = 1e-3;
