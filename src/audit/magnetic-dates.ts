/**
 * The first and the last moment that the editions of the World Magnetic Model in `site` cover between them, for
 * readers of claim files. Written out, since the models themselves take longer to load than a claim to check.
 */
export const MAGNETIC_DATES = { from: '2014-12-15T07:00:00.000Z', to: '2029-11-13T03:00:00.000Z' } as const
