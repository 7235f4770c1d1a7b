/** Where in its daily circle a star is sighted. */
export const STAR_MOMENTS = ['rising', 'setting', 'upper culmination', 'lower culmination'] as const
