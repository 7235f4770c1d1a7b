// Builds the program: `node .build/bundle.mjs [OUT-DIRECTORY [ENTRY…]]`, from src/bin.ts and src/index.ts into dist/.
import { cpSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { createRequire } from 'node:module'
import { dirname, join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { build, transformSync } from 'esbuild'

const root = fileURLToPath(new URL('..', import.meta.url))
const require = createRequire(import.meta.url)
const [out = join(root, 'dist'), ...entries] = process.argv.slice(2)

rmSync(out, { recursive: true, force: true })
mkdirSync(out, { recursive: true })
const { metafile } = await bundle(entries.length > 0 ? entries : ['src/bin.ts', 'src/index.ts'])
writeFileSync(join(out, 'LICENCES.txt'), licencesOf(metafile))
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
  const holder = author?.name ?? author ?? 'its authors'
  return `${heading}\n${'-'.repeat(heading.length)}\n${text ?? `Copyright ${holder}; the package brings no licence text.`}`
}

function readOr(path, otherwise) {
  try {
    return readFileSync(path, 'utf8').trim()
  } catch {
    return otherwise
  }
}

/** The faces that reports are set in, and their licences. */
async function copyFonts() {
  const source = readFileSync(join(root, 'src/report/fonts/font-faces.ts'), 'utf8')
  const { code } = transformSync(source, { loader: 'ts', format: 'esm' })
  const { FONT_FACES } = await import(`data:text/javascript,${encodeURIComponent(code)}`)
  const fonts = join(out, 'fonts')
  mkdirSync(fonts)
  for (const { package: name, folder, file, licence } of Object.values(FONT_FACES)) {
    const from = dirname(require.resolve(`${name}/package.json`))
    cpSync(join(from, folder, file), join(fonts, file))
    cpSync(join(from, licence), join(fonts, `${name.split('/').at(-1)}-LICENCE.txt`))
  }
}
