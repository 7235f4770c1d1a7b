/** Put in its place by the build, from package.json. */
declare const DATESTONE_VERSION: string | undefined

/** Version of the program; `source` where it runs unbuilt. */
export const VERSION: string = typeof DATESTONE_VERSION === 'string' ? DATESTONE_VERSION : 'source'
