import { readdirSync, readFileSync } from 'node:fs'
import { dirname, join, relative, resolve, sep } from 'node:path'
import { fileURLToPath } from 'node:url'
import { describe, expect, it } from 'vitest'

const root = fileURLToPath(new URL('..', import.meta.url))

/** What each package may import: the layer table of DEVELOPERS.md. */
const mayImport: Readonly<Record<string, readonly string[]>> = {
  'packages/units': [],
  'packages/formula': ['units'],
  'packages/engine': ['units', 'formula'],
  'packages/spec': ['units'],
  'packages/sizing': ['units', 'formula', 'engine', 'spec'],
  'packages/presentation': ['units', 'sizing'],
  'packages/documents': ['units', 'formula', 'engine', 'spec', 'sizing', 'presentation'],
  'packages/contract': ['units', 'spec', 'sizing'],
  'apps/cli': ['units', 'formula', 'engine', 'spec', 'sizing', 'documents'],
  'apps/server': ['units', 'formula', 'engine', 'spec', 'sizing', 'documents', 'contract'],
  'apps/web': ['units', 'formula', 'spec', 'contract', 'presentation'],
}
const pure = [
  'packages/units',
  'packages/formula',
  'packages/engine',
  'packages/spec',
  'packages/sizing',
  'packages/presentation',
]

interface Import {
  readonly file: string
  readonly target: string
  /** True where only types cross, so that nothing is left of it at run time. */
  readonly typesOnly: boolean
}

const sources = (folder: string): string[] =>
  readdirSync(join(root, folder, 'src'), { recursive: true, encoding: 'utf8' })
    .filter((path) => /\.tsx?$/u.test(path))
    .map((path) => `${folder}/src/${path.split(sep).join('/')}`)
    .sort()

const read = (file: string): string => readFileSync(join(root, file), 'utf8')

const IMPORT = /^\s*(?:import|export)\s+(type\s)?(?:[^'"`;]*?\sfrom\s+)?['"]([^'"]+)['"]/gmu
const DYNAMIC = /\bimport\(\s*['"]([^'"]+)['"]\s*\)/gu

const importsOf = (file: string): Import[] => {
  const text = read(file)
  return [
    ...[...text.matchAll(IMPORT)].map((m) => ({ file, target: m[2] ?? '', typesOnly: m[1] !== undefined })),
    ...[...text.matchAll(DYNAMIC)].map((m) => ({ file, target: m[1] ?? '', typesOnly: false })),
  ]
}

/** Path inside the app's src of what an import names, or undefined where it is a package. */
const within = (app: string, { file, target }: Import): string | undefined => {
  const src = `${app}/src`
  if (target.startsWith('#')) return target.slice(1).replace(/^\//u, '')
  if (!target.startsWith('.')) return undefined
  return relative(join(root, src), resolve(root, dirname(file), target))
    .split(sep)
    .join('/')
}

const isTest = (file: string): boolean => /\.test\.tsx?$/u.test(file) || file.includes('/src/testing/')

const said = (found: readonly Import[]): string[] => found.map(({ file, target }) => `${file} imports ${target}`)

describe('the arrows between packages', () => {
  it('are the arrows of every package.json', () => {
    for (const [folder, allowed] of Object.entries(mayImport)) {
      const { dependencies = {}, devDependencies = {} } = JSON.parse(read(`${folder}/package.json`)) as Record<
        string,
        Record<string, string>
      >
      const named = Object.keys({ ...dependencies, ...devDependencies }).filter((name) => name.startsWith('@coldfill/'))
      expect({ folder, wrong: named.filter((name) => !allowed.includes(name.slice('@coldfill/'.length))) }).toEqual({
        folder,
        wrong: [],
      })
    }
  })

  it('name every package and app that there is', () => {
    const there = ['packages', 'apps'].flatMap((place) =>
      readdirSync(join(root, place)).map((name) => `${place}/${name}`),
    )
    expect(there.sort()).toEqual(Object.keys(mayImport).sort())
  })

  it.each(Object.entries(mayImport))('%s imports what stands left of it', (folder, allowed) => {
    const found = sources(folder).flatMap(importsOf)
    expect(found.length).toBeGreaterThan(0)
    const wrong = found.filter(({ target }) => {
      const name = /^@coldfill\/([a-z]+)/u.exec(target)?.[1]
      return name !== undefined && !allowed.includes(name) && `packages/${name}` !== folder && `apps/${name}` !== folder
    })
    expect(said(wrong)).toEqual([])
  })

  it('no package reaches into another by path, and nothing imports tests or examples', () => {
    const wrong = Object.keys(mayImport).flatMap((folder) =>
      sources(folder)
        .flatMap(importsOf)
        .filter(
          ({ file, target }) =>
            target.startsWith('.') && !resolve(root, dirname(file), target).startsWith(join(root, folder)),
        ),
    )
    expect(said(wrong)).toEqual([])
  })

  it.each(['packages/contract', 'packages/presentation'])('%s takes nothing but types from sizing', (folder) => {
    const found = sources(folder)
      .flatMap(importsOf)
      .filter(({ target }) => target.startsWith('@coldfill/sizing'))
    expect(found.length).toBeGreaterThan(0)
    expect(said(found.filter(({ typesOnly }) => !typesOnly))).toEqual([])
  })
})

describe('purity', () => {
  const code = pure.flatMap((folder) =>
    sources(folder).filter((file) => !isTest(file) && !file.endsWith('/src/testing.ts')),
  )

  it('packages of the core import nothing of Node or of a browser', () => {
    const wrong = code
      .flatMap(importsOf)
      .filter(({ target }) => target.startsWith('node:') || /^(fs|path|os|crypto|react|express)(\/|$)/u.test(target))
    expect(code.length).toBeGreaterThan(50)
    expect(said(wrong)).toEqual([])
  })

  it('packages of the core have no clock, no chance, no input or output', () => {
    const impure =
      /\b(Date\.now|new Date|Math\.random|performance\.now|setTimeout|setInterval|process\.|console\.|globalThis\.|fetch\(|document\.(body|cookie|create|querySelector)|window\.|localStorage)/u
    const wrong = code.flatMap((file) =>
      read(file)
        .split('\n')
        .flatMap((line, index) => {
          const bare = line
            .replace(/\/\/.*$/u, '')
            .replace(/^\s*\*.*$/u, '')
            .replace(/'[^']*'|"[^"]*"|`[^`]*`/gu, "''")
          return impure.test(bare) ? [`${file}:${index + 1} ${line.trim()}`] : []
        }),
    )
    expect(wrong).toEqual([])
  })

  it('packages of the core are compiled without a browser and without Node', () => {
    const base = JSON.parse(read('tsconfig.base.json')) as { compilerOptions: { lib: string[]; types: string[] } }
    expect(base.compilerOptions.lib).toEqual(['ES2023'])
    expect(base.compilerOptions.types).toEqual([])
    expect(pure.filter((folder) => /"(lib|types)"/u.test(read(`${folder}/tsconfig.json`)))).toEqual([])
  })
})

describe('the arrows inside the client', () => {
  const files = sources('apps/web').filter((file) => !isTest(file))
  const layer = (path: string): string => path.split('/')[0] ?? ''
  const feature = (path: string): string | undefined => /^features\/([^/]+)/u.exec(path)?.[1]
  const crossings = files.flatMap(importsOf).flatMap((found) => {
    const to = within('apps/web', found)
    return to === undefined ? [] : [{ ...found, from: relative('apps/web/src', found.file).split(sep).join('/'), to }]
  })

  it('components, hooks, lib and config know no feature and no app', () => {
    const wrong = crossings.filter(
      ({ from, to }) =>
        ['components', 'hooks', 'lib', 'config'].includes(layer(from)) && ['features', 'app'].includes(layer(to)),
    )
    expect(crossings.length).toBeGreaterThan(50)
    expect(said(wrong)).toEqual([])
  })

  it('features know no app', () => {
    expect(said(crossings.filter(({ from, to }) => layer(from) === 'features' && layer(to) === 'app'))).toEqual([])
  })

  it('no feature knows another', () => {
    const wrong = crossings.filter(
      ({ from, to }) => feature(from) !== undefined && feature(to) !== undefined && feature(from) !== feature(to),
    )
    expect(said(wrong)).toEqual([])
  })
})

describe('the arrows inside the server', () => {
  const crossings = sources('apps/server')
    .filter((file) => !isTest(file))
    .flatMap(importsOf)
    .flatMap((found) => {
      const to = within('apps/server', found)
      return to === undefined
        ? []
        : [{ ...found, from: relative('apps/server/src', found.file).split(sep).join('/'), to }]
    })
  const resource = (path: string): string | undefined => /^routes\/([^/]+)\//u.exec(path)?.[1]

  it('the database knows no route and no command', () => {
    const wrong = crossings.filter(({ from, to }) => from.startsWith('db/') && /^(routes|commands)\//u.test(to))
    expect(crossings.length).toBeGreaterThan(50)
    expect(said(wrong)).toEqual([])
  })

  it('commands know no router', () => {
    expect(said(crossings.filter(({ from, to }) => from.startsWith('commands/') && to.endsWith('.router.ts')))).toEqual(
      [],
    )
  })

  it('a router touches the queries of its own resource only', () => {
    const wrong = crossings.filter(
      ({ from, to }) => from.endsWith('.router.ts') && to.endsWith('.queries.ts') && resource(from) !== resource(to),
    )
    expect(said(wrong)).toEqual([])
  })
})
