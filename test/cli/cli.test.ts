import { execFileSync } from 'node:child_process'
import { appendFile, chmod, mkdir, readFile, symlink, truncate, writeFile } from 'node:fs/promises'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { describe, expect, test } from 'vitest'
import { claimText } from '../audit/audit-of.ts'
import { filesIn, newFolder, run } from './run.ts'

const SAMPLE = fileURLToPath(new URL('../../samples/thornmere.yaml', import.meta.url))

async function claimIn(folder: string, text = claimText(), name = 'court.yaml'): Promise<string> {
  const path = join(folder, name)
  await writeFile(path, text)
  return path
}

describe('the command line', () => {
  test('--help shows an example and the exit statuses', async () => {
    const { status, stdout, stderr } = await run('--help')
    expect(status).toBe(0)
    expect(stdout).toMatch(/datestone audit court\.yaml --as pdf,md,json --out audits/)
    expect(stdout).toMatch(/Exit status: 0 done/)
    expect(stderr).toBe('')
  })

  test.each([
    [[], /say what to do/],
    [['audti', 'a.yaml'], /no command `audti`; did you mean `audit`\?/],
    [['audit'], /needs a claim file/],
    [['check'], /needs a claim file/],
    [['new'], /takes one file/],
    [['audit', 'a.yaml', '--az', 'pdf'], /no option `--az`; did you mean `--as`\?/],
    [['audit', 'a.yaml', '--as', 'pdf,docx'], /`docx` is not a format; write pdf, md or json/],
    [['check', 'a.yaml', '--out', 'x'], /`--out` goes with `audit`/],
    [['audit', '-'], /`-` is not read as the standard input/],
    [['check', '-'], /`-` is not read as the standard input/],
    [['audit', '/dev/stdin'], /`\/dev\/stdin` has no place beside it for the audit/],
    [['audit', 'a.yaml', '--out', 'x', '--out', 'y'], /`--out` stands there more than once/],
    [['audit', 'a.yaml', '--as', 'pdf', '--as', 'docx'], /`docx` is not a format/],
    [['audit', 'a/x.yaml', 'b/x.yaml', '--out', 'o'], /would overwrite/],
  ])('%j is refused with status 2', async (argv, message) => {
    const { status, stdout, stderr } = await run(...(argv as string[]))
    expect(status).toBe(2)
    expect(stdout).toBe('')
    expect(stderr).toMatch(message)
  })
})

describe('audit', () => {
  test('writes PDF and Markdown with its figures beside the claim file, and tells their paths', async () => {
    const folder = await newFolder()
    const path = await claimIn(folder)
    const { status, stdout, stderr } = await run('audit', path)
    expect(stderr).toBe('')
    expect(status).toBe(0)
    expect(stdout.trim().split('\n')).toEqual([
      join(folder, 'court.audit.pdf'),
      join(folder, 'court.audit.md'),
    ])
    expect(await filesIn(folder)).toEqual([
      'court.audit-horizon.svg',
      'court.audit-plan.svg',
      'court.audit-premise.svg',
      'court.audit-track.svg',
      'court.audit.md',
      'court.audit.pdf',
      'court.yaml',
    ])
    const markdown = await readFile(join(folder, 'court.audit.md'), 'utf8')
    expect(markdown).toContain('](court.audit-premise.svg)')
    expect((await readFile(join(folder, 'court.audit.pdf'))).subarray(0, 5).toString()).toBe('%PDF-')
  })

  test('--as json --out writes that alone, into a folder it makes', async () => {
    const folder = await newFolder()
    const out = join(folder, 'a', 'b')
    const { status } = await run('audit', SAMPLE, '--as', 'json', '--out', out)
    expect(status).toBe(0)
    expect(await filesIn(out)).toEqual(['thornmere.audit.json'])
    const audit = JSON.parse(await readFile(join(out, 'thornmere.audit.json'), 'utf8'))
    expect(audit.file).toBe('thornmere.yaml')
    expect(audit.input_sha256).toMatch(/^[0-9a-f]{64}$/)
  })

  test('the same file gives the same bytes', async () => {
    const folder = await newFolder()
    const path = await claimIn(folder)
    const formats = ['--as', 'pdf,md,json', '--out']
    await run('audit', path, ...formats, join(folder, 'one'))
    await run('audit', path, ...formats, join(folder, 'two'))
    const names = await filesIn(join(folder, 'one'))
    expect(names.length).toBeGreaterThan(3)
    for (const name of names) {
      expect(
        (await readFile(join(folder, 'one', name))).equals(await readFile(join(folder, 'two', name))),
        name,
      ).toBe(true)
    }
  })

  test('a claim with errors writes nothing, and tells each at its line', async () => {
    const folder = await newFolder()
    const path = await claimIn(
      folder,
      claimText({ asserted_date: '-9600', sightlines: '{one: {azimuth: 50° ± 1}}' }),
    )
    const { status, stdout, stderr } = await run('audit', path, '--as', 'pdf,md,json')
    expect(status).toBe(1)
    expect(stdout).toBe('')
    expect(stderr).toContain(`${path}:3:`)
    expect(stderr).toContain(`${path}:5:16: error: `)
    expect(await filesIn(folder)).toEqual(['court.yaml'])
  })

  test('of two claims the sound one is audited, and the status is that of the other', async () => {
    const folder = await newFolder()
    const sound = await claimIn(folder)
    const broken = await claimIn(folder, 'claim: alone\n', 'broken.yaml')
    const { status, stdout } = await run('audit', broken, sound, '--as', 'json')
    expect(status).toBe(1)
    expect(stdout).toBe(`${join(folder, 'court.audit.json')}\n`)
  })

  test('a file that is not there is status 3', async () => {
    const { status, stderr } = await run('audit', join(await newFolder(), 'none.yaml'))
    expect(status).toBe(3)
    expect(stderr).toMatch(/cannot read .*none\.yaml: there is no such file/)
  })

  test('a pipe, a device and what is far too long are not read, and status 3', async () => {
    const folder = await newFolder()
    const pipe = join(folder, 'pipe.yaml')
    execFileSync('mkfifo', [pipe])
    const long = await claimIn(folder, '', 'long.yaml')
    await truncate(long, 20_000_001)
    const { status, stderr } = await run('check', pipe, '/dev/zero', long)
    expect(status).toBe(3)
    expect(stderr.split('\n')).toEqual([
      `datestone: cannot read ${pipe}: it is not a plain file`,
      'datestone: cannot read /dev/zero: it is not a plain file',
      `datestone: cannot read ${long}: it is 20000001 bytes long, too long for a claim file`,
      '',
    ])
  })

  test('a link round in a circle, a name too long and one with a NUL are told in plain words', async () => {
    const folder = await newFolder()
    const round = join(folder, 'round.yaml')
    await symlink(round, round)
    const { status, stderr } = await run('check', round, join(folder, 'x'.repeat(300)), 'a\0b.yaml')
    expect(status).toBe(3)
    expect(stderr.replaceAll(/cannot read .*?: (?=[a-z])/g, '').split('\n')).toEqual([
      'datestone: its links lead round in a circle',
      'datestone: its name is too long',
      'datestone: no file can have such a name',
      '',
    ])
  })

  test('a place that cannot be written is status 3, and leaves nothing behind', async () => {
    const folder = await newFolder()
    const path = await claimIn(folder)
    // A folder stands where the Markdown belongs, which is written after the PDF.
    const place = join(folder, 'out', 'court.audit.md')
    await mkdir(place, { recursive: true })
    const { status, stdout, stderr } = await run('audit', path, '--out', join(folder, 'out'))
    expect(status).toBe(3)
    expect(stdout).toBe('')
    expect(stderr).toBe(`datestone: cannot write ${place}: it is a folder\n`)
    expect(await filesIn(join(folder, 'out'))).toEqual(['court.audit.md'])
  })

  test('a file in the place of the output folder is told as such', async () => {
    const folder = await newFolder()
    const path = await claimIn(folder)
    const { status, stderr } = await run('audit', path, '--out', path, '--as', 'json')
    expect(status).toBe(3)
    expect(stderr).toMatch(/court\.audit\.json: a part of its path is not a folder/)
  })

  test('--as given twice asks for both', async () => {
    const folder = await newFolder()
    const path = await claimIn(folder)
    expect((await run('audit', path, '--as', 'pdf', '--as', 'json')).status).toBe(0)
    expect(await filesIn(folder)).toEqual(['court.audit.json', 'court.audit.pdf', 'court.yaml'])
  })

  test('a claim file may name its schema for an editor', async () => {
    const folder = await newFolder()
    const named = `# yaml-language-server: $schema=dist/claim.schema.json\n${claimText()}`
    const { status, stderr } = await run('check', await claimIn(folder, named))
    expect({ status, stderr }).toEqual({ status: 0, stderr: '' })
  })

  test('an own template is used; one with errors is told at its line, and nothing is written', async () => {
    const folder = await newFolder()
    const path = await claimIn(folder)
    const template = join(folder, 'short.md')
    await writeFile(template, '# Short\n\n::part{of="finding"}\n')
    expect((await run('audit', path, '--as', 'md', '--template', template)).status).toBe(0)
    expect(await readFile(join(folder, 'court.audit.md'), 'utf8')).toMatch(/^# Short\n/)
    await writeFile(template, '# Short\n\n::part{of="findnig"}\n')
    const { status, stderr } = await run(
      'audit',
      path,
      '--as',
      'md',
      '--template',
      template,
      '--out',
      join(folder, 'o'),
    )
    expect(status).toBe(1)
    expect(stderr).toContain(`${template}:3:`)
    expect(stderr).toMatch(/finding/)
    expect(await filesIn(folder)).not.toContain('o')
  })

  test('a template that is not there is status 3', async () => {
    const { status, stderr } = await run('audit', SAMPLE, '--template', 'nowhere.md')
    expect(status).toBe(3)
    expect(stderr).toMatch(/cannot read nowhere\.md/)
    expect(stderr).not.toMatch(/did you mean/)
  })

  test('a misspelt built-in template is told with the right name', async () => {
    const { status, stderr } = await run('audit', SAMPLE, '--template', 'audti')
    expect(status).toBe(3)
    expect(stderr).toMatch(/cannot read audti: .*; did you mean the built-in template `audit`\?\n$/)
  })

  test('bytes that are not UTF-8 are an error with a place', async () => {
    const folder = await newFolder()
    const path = join(folder, 'latin.yaml')
    await writeFile(path, Buffer.from([...Buffer.from('claim: caf'), 0xe9, 0x0a]))
    const { status, stderr } = await run('check', path)
    expect(status).toBe(1)
    expect(stderr).toContain(`${path}:1:11: error: `)
  })

  test('a byte order mark does no harm', async () => {
    const folder = await newFolder()
    expect((await run('check', await claimIn(folder, `\uFEFF${claimText()}`))).status).toBe(0)
  })

  test('warnings of the claim file go to stderr and into the audit', async () => {
    const folder = await newFolder()
    const path = await claimIn(folder, claimText({ asserted_date: '3200 BP' }))
    const { status, stderr } = await run('audit', path, '--as', 'json')
    expect(status).toBe(0)
    expect(stderr).toMatch(/warning: .*BP/)
    const audit = JSON.parse(await readFile(join(folder, 'court.audit.json'), 'utf8'))
    expect(audit.warnings.join()).toMatch(/BP/)
  })

  test('works through a linked folder', async () => {
    const folder = await newFolder()
    await mkdir(join(folder, 'real'))
    await symlink(join(folder, 'real'), join(folder, 'linked'))
    const path = await claimIn(join(folder, 'linked'))
    expect((await run('audit', path, '--as', 'json')).status).toBe(0)
    await chmod(path, 0o644)
  })
})

describe('check', () => {
  test('says so where there is nothing wrong', async () => {
    const { status, stdout, stderr } = await run('check', SAMPLE)
    expect({ status, stdout, stderr }).toEqual({ status: 0, stdout: `${SAMPLE}: no errors\n`, stderr: '' })
  })
})

describe('files beside a claim file', () => {
  const NAMING = claimText({
    points: 'survey.csv',
    sightlines: '{one: {from: a, to: b, horizon: {profile: data/skyline.csv}}}',
  })
  const SOUND = {
    'survey.csv': 'name,east,north\na,0,0\nb,60,50\n',
    'skyline.csv': 'azimuth,altitude\n40,1\n60,1.5\n',
  }

  async function folderWith(files: Partial<Record<keyof typeof SOUND, string | Buffer>>): Promise<string> {
    const folder = await newFolder()
    await mkdir(join(folder, 'data'))
    const { 'survey.csv': survey, 'skyline.csv': skyline } = files
    if (survey !== undefined) await writeFile(join(folder, 'survey.csv'), survey)
    if (skyline !== undefined) await writeFile(join(folder, 'data', 'skyline.csv'), skyline)
    return claimIn(folder, NAMING)
  }

  test('are read from its folder, wherever one stands', async () => {
    const { status, stderr } = await run('check', await folderWith(SOUND))
    expect({ status, stderr }).toEqual({ status: 0, stderr: '' })
  })

  test('are told of by name, line and column', async () => {
    const path = await folderWith({ ...SOUND, 'survey.csv': 'name,east,north\na,0,0\nb,6o,50\n' })
    const { status, stderr } = await run('check', path)
    expect(status).toBe(1)
    expect(stderr).toContain(`${path.replace('court.yaml', 'survey.csv')}:3:3: error: \`6o\` `)
  })

  test('that are not there are an error of the claim file, in plain words', async () => {
    const path = await folderWith({ 'survey.csv': SOUND['survey.csv'] })
    const { status, stderr } = await run('check', path)
    expect(status).toBe(1)
    expect(stderr).toMatch(
      /court\.yaml:\d+:\d+: error: `data\/skyline\.csv` cannot be read: there is no such file/,
    )
  })

  test('that are folders, or not UTF-8, are told so', async () => {
    const path = await folderWith({
      ...SOUND,
      'skyline.csv': Buffer.from([...Buffer.from('azimuth,h'), 0xf6, 0x0a]),
    })
    expect((await run('check', path)).stderr).toContain('skyline.csv:1:10: error: this is not UTF-8 text')
    const folder = await newFolder()
    await mkdir(join(folder, 'survey.csv'))
    expect((await run('check', await claimIn(folder, NAMING))).stderr).toContain(
      '`survey.csv` cannot be read: it is a folder',
    )
  })

  test('that are far too long are told so by their size', async () => {
    const path = await folderWith(SOUND)
    const survey = path.replace('court.yaml', 'survey.csv')
    await truncate(survey, 6_000_004)
    expect((await run('check', path)).stderr).toContain(
      '`survey.csv` cannot be read: it is 6000004 bytes long, and a table has at most 2000000 characters',
    )
    // Larger than any memory; it takes up no room on the disk.
    await truncate(survey, 2 ** 40)
    expect((await run('check', path)).stderr).toContain(
      '`survey.csv` cannot be read: it is 1099511627776 bytes',
    )
  })

  test('may have as many characters as are read, each of three bytes', async () => {
    const head = 'name,east,north\na,0,0\nb,60,50\n# '
    const path = await folderWith({ ...SOUND, 'survey.csv': head + '†'.repeat(2_000_000 - head.length) })
    expect(await run('check', path)).toMatchObject({ status: 0, stderr: '' })
    await appendFile(path.replace('court.yaml', 'survey.csv'), 'x')
    expect((await run('check', path)).stderr).toContain('`survey.csv` is 2000001 characters long')
  })
})

describe('new', () => {
  test('writes a claim file that passes the check, and never over another', async () => {
    const folder = await newFolder()
    const path = join(folder, 'mine.yaml')
    expect((await run('new', path)).status).toBe(0)
    expect((await run('check', path)).status).toBe(0)
    await writeFile(path, 'my own words')
    const again = await run('new', path)
    expect(again.status).toBe(3)
    expect(again.stderr).toMatch(/exists already, and is left alone/)
    expect(await readFile(path, 'utf8')).toBe('my own words')
  })
})

describe('the samples', () => {
  test.each([
    'thornmere',
    'averholt',
    'corvane',
    'ostrel',
    'keldane',
    'orrin',
    'ilmarra',
    'tavesh',
    'brackwater',
    'syrane',
    'hathmere',
    'velahar',
    'eskamoor',
    'marrusk',
    'hestrun',
    'dorrowick',
    'ossavar',
  ])('%s has no problems', async (name) => {
    const { status, stderr } = await run('check', SAMPLE.replace('thornmere', name))
    expect({ status, stderr }).toEqual({ status: 0, stderr: '' })
  })
})
