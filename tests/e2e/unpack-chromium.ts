import { createReadStream, createWriteStream, existsSync } from 'node:fs'
import { chmod, mkdir, mkdtemp, readFile, rename, rm, writeFile } from 'node:fs/promises'
import { createRequire } from 'node:module'
import { dirname, join, resolve, sep } from 'node:path'
import { pipeline } from 'node:stream/promises'
import { fileURLToPath } from 'node:url'
import { promisify } from 'node:util'
import { brotliDecompress, createBrotliDecompress } from 'node:zlib'

/** A Chromium with the libraries and the font that a machine without a desktop lacks. */
export interface UnpackedChromium {
  readonly executable: string
  /** For the environment of the browser alone. */
  readonly environment: Readonly<Record<string, string>>
}

const BLOCK = 512
const decompress = promisify(brotliDecompress)

const text = (bytes: Buffer, start: number, length: number): string => {
  const field = bytes.subarray(start, start + length)
  const end = field.indexOf(0)
  return field.subarray(0, end === -1 ? length : end).toString('utf8')
}

export interface TarEntry {
  readonly name: string
  readonly mode: number
  readonly bytes: Buffer
}

/**
 * Regular files of a POSIX ustar archive. Directories are left out, since they come with their files.
 * @throws on a kind of entry that these archives do not have, such as a link
 */
export const readTar = (archive: Buffer): readonly TarEntry[] => {
  const entries: TarEntry[] = []
  for (let at = 0; at + BLOCK <= archive.length;) {
    const header = archive.subarray(at, at + BLOCK)
    const name = text(header, 0, 100)
    if (name === '') break
    const prefix = text(header, 257, 5) === 'ustar' ? text(header, 345, 155) : ''
    const size = Number.parseInt(text(header, 124, 12).trim(), 8)
    const mode = Number.parseInt(text(header, 100, 8).trim(), 8)
    const kind = text(header, 156, 1)
    const path = prefix === '' ? name : `${prefix}/${name}`
    if (kind === '' || kind === '0')
      entries.push({ name: path, mode, bytes: archive.subarray(at + BLOCK, at + BLOCK + size) })
    else if (kind !== '5') throw new Error(`tar entry ${path} is of kind ${kind}`)
    at += BLOCK + Math.ceil(size / BLOCK) * BLOCK
  }
  return entries
}

const extract = async (archive: string, folder: string): Promise<void> => {
  for (const { name, mode, bytes } of readTar(await decompress(await readFile(archive)))) {
    const target = resolve(folder, name)
    if (!target.startsWith(folder + sep)) throw new Error(`tar entry ${name} lies outside`)
    await mkdir(dirname(target), { recursive: true })
    await writeFile(target, bytes)
    await chmod(target, mode & 0o755)
  }
}

const parts = (): { readonly bin: string; readonly version: string } => {
  const entry = createRequire(import.meta.url).resolve('@sparticuz/chromium')
  const root = entry.slice(0, entry.lastIndexOf(`${sep}build${sep}`))
  const { version } = createRequire(import.meta.url)(join(root, 'package.json')) as { version: string }
  return { bin: join(root, 'bin'), version }
}

/** Where the browser is kept between runs. It is rebuilt when the folder is deleted. */
export const defaultCache = fileURLToPath(new URL('../../node_modules/.cache/coldfill', import.meta.url))

/** Unpacks the Chromium that comes through npm, once; a half-unpacked folder is never taken for a whole one. */
export const unpackChromium = async (cache = defaultCache): Promise<UnpackedChromium> => {
  if (process.platform !== 'linux' || process.arch !== 'x64')
    throw new Error(
      'The Chromium that comes through npm is for Linux on x64. Install a Chromium and set CHROMIUM_PATH.',
    )
  const { bin, version } = parts()
  const folder = join(cache, `chromium-${version}`)
  if (!existsSync(folder)) {
    await mkdir(cache, { recursive: true })
    const making = await mkdtemp(join(cache, 'making-'))
    const executable = join(making, 'chromium')
    await pipeline(createReadStream(join(bin, 'chromium.br')), createBrotliDecompress(), createWriteStream(executable))
    await chmod(executable, 0o755)
    await extract(join(bin, 'al2023.tar.br'), join(making, 'al2023'))
    await extract(join(bin, 'swiftshader.tar.br'), making)
    await extract(join(bin, 'fonts.tar.br'), making)
    const fonts = `<?xml version="1.0"?>
<!DOCTYPE fontconfig SYSTEM "fonts.dtd">
<fontconfig><dir>${join(folder, 'fonts')}</dir><cachedir>${join(folder, 'fonts-cache')}</cachedir></fontconfig>
`
    await writeFile(join(making, 'fonts.conf'), fonts)
    try {
      await rename(making, folder)
    } catch (error) {
      // Another run was first.
      await rm(making, { recursive: true, force: true })
      if (!existsSync(folder)) throw error
    }
  }
  return {
    executable: join(folder, 'chromium'),
    environment: {
      LD_LIBRARY_PATH: join(folder, 'al2023', 'lib'),
      FONTCONFIG_FILE: join(folder, 'fonts.conf'),
      FONTCONFIG_PATH: folder,
    },
  }
}
