// Builds the program: `node .build/bundle.mjs [OUT-DIRECTORY [ENTRY…]]`, from src/bin.ts and src/index.ts into dist/.
import { cpSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { createRequire } from 'node:module'
import { dirname, join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { build } from 'esbuild'
import { mitLicence } from './mit-licence.mjs'

const root = fileURLToPath(new URL('..', import.meta.url))
const require = createRequire(import.meta.url)
const [out = join(root, 'dist'), ...entries] = process.argv.slice(2)

rmSync(out, { recursive: true, force: true })
mkdirSync(out, { recursive: true })
const { metafile } = await bundle(entries.length > 0 ? entries : ['src/bin.ts', 'src/index.ts'])
writeFileSync(join(out, 'LICENCES.txt'), licencesOf(metafile))
await writeSchema()
await copyFonts()

/** All chunks stand beside `fonts/`, which the program looks for next to itself. */
function bundle(entryPoints) {
  const { version } = JSON.parse(readFileSync(join(root, 'package.json'), 'utf8'))
  return build({
    absWorkingDir: root,
    entryPoints,
    entryNames: '[name]',
    chunkNames: '[name]-[hash]',
    outdir: out,
    bundle: true,
    splitting: true,
    format: 'esm',
    platform: 'node',
    target: 'node20',
    legalComments: 'eof',
    metafile: true,
    alias: { 'brotli/decompress.js': join(root, '.build/no-woff2.mjs') },
    define: { DATESTONE_VERSION: JSON.stringify(version) },
    // Some packages are CommonJS and call require for what Node brings along.
    banner: {
      js: "import { createRequire as createRequireOfBundle } from 'node:module'\nconst require = createRequireOfBundle(import.meta.url)",
    },
    logLevel: 'warning',
  })
}

/** The licence of each package whose code is in the bundle. */
function licencesOf({ inputs }) {
  const folders = Object.keys(inputs).map((path) => /^(.*node_modules\/(?:@[^/]+\/)?[^/]+)\//.exec(path)?.[1])
  const sections = [...new Set(folders)].filter(Boolean).sort().map(licenceOf)
  return `The program contains code of these packages.\n\n${sections.join('\n\n')}\n`
}

function licenceOf(folder) {
  const { name, version, license, author } = JSON.parse(
    readFileSync(join(root, folder, 'package.json'), 'utf8'),
  )
  const heading = `${name} ${version} (${license})`
  const text = ['LICENSE', 'LICENSE.md', 'license', 'LICENSE.txt', 'LICENCE']
    .map((file) => readOr(join(root, folder, file), ''))
    .find(Boolean)
  return `${heading}\n${'-'.repeat(heading.length)}\n${text ?? licenceWithoutFile({ name, license, author })}`
}

/** Some packages state MIT and their author in package.json, and bring no file; any other licence is for a person to see to. */
function licenceWithoutFile({ name, license, author }) {
  const holder = author?.name ?? author
  if (license !== 'MIT' || !holder) throw new Error(`${name} brings no licence text`)
  return mitLicence(holder)
}

function readOr(path, otherwise) {
  try {
    return readFileSync(path, 'utf8').trim()
  } catch {
    return otherwise
  }
}

/** The shape of a claim file, for editors. */
async function writeSchema() {
  const { CLAIM_SCHEMA } = await moduleOf('src/claim/claim-schema.ts')
  writeFileSync(join(out, 'claim.schema.json'), `${JSON.stringify(CLAIM_SCHEMA, null, 2)}\n`)
}

/** What a source file exports. */
async function moduleOf(path) {
  const options = { absWorkingDir: root, entryPoints: [path], bundle: true, format: 'esm', write: false }
  const { outputFiles } = await build(options)
  return import(`data:text/javascript,${encodeURIComponent(outputFiles[0].text)}`)
}

/** The faces that reports are set in, and their licences. */
async function copyFonts() {
  const { FONT_FACES } = await moduleOf('src/report/fonts/font-faces.ts')
  const fonts = join(out, 'fonts')
  mkdirSync(fonts)
  for (const { package: name, folder, file, licence } of Object.values(FONT_FACES)) {
    const from = dirname(require.resolve(`${name}/package.json`))
    cpSync(join(from, folder, file), join(fonts, file))
    cpSync(join(from, licence), join(fonts, `${name.split('/').at(-1)}-LICENCE.txt`))
  }
}
