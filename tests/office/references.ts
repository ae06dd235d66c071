import { strFromU8, unzipSync } from 'fflate'

/**
 * What the schemas cannot say of a file: every name, number and address in it leads to something. Each finding is a
 * sentence; none means that everything does.
 */
export const brokenReferences = (bytes: Uint8Array): string[] => {
  const parts = new Map(
    Object.entries(unzipSync(bytes))
      .filter(([name]) => !name.endsWith('/'))
      .map(([name, part]) => [name, /\.(xml|rels)$/.test(name) ? strFromU8(part) : '']),
  )
  return [
    ...contentTypes(parts),
    ...relationships(parts),
    ...(parts.has('word/document.xml') ? inDocument(parts) : inWorkbook(parts)),
  ]
}

type Parts = ReadonlyMap<string, string>

const all = (xml: string, pattern: RegExp): string[] => [...xml.matchAll(pattern)].map(([, found = '']) => found)
const repeated = (names: readonly string[]): string[] => [
  ...new Set(names.filter((name, index) => names.indexOf(name) !== index)),
]

const contentTypes = (parts: Parts): string[] => {
  const xml = parts.get('[Content_Types].xml') ?? ''
  const endings = new Set(all(xml, /<Default[^>]* Extension="([^"]+)"/g).map((ending) => ending.toLowerCase()))
  const overrides = all(xml, /<Override[^>]* PartName="\/([^"]+)"/g)
  const named = new Set(overrides)
  return [
    ...overrides
      .filter((name) => !parts.has(name))
      .map((name) => `a content type is given for ${name}, which is not there`),
    ...[...parts.keys()]
      .filter((name) => name !== '[Content_Types].xml')
      .filter((name) => !named.has(name) && !endings.has(name.slice(name.lastIndexOf('.') + 1).toLowerCase()))
      .map((name) => `${name} has no content type`),
  ]
}

/** The part that a target names, seen from the part that has the relationship. */
const resolved = (from: string, target: string): string => {
  if (target.startsWith('/')) return target.slice(1)
  const path = from.split('/').slice(0, -1)
  for (const step of target.split('/')) {
    if (step === '..') path.pop()
    else if (step !== '.') path.push(step)
  }
  return path.join('/')
}

const relationships = (parts: Parts): string[] =>
  [...parts].flatMap(([name, xml]) => {
    if (!name.endsWith('.rels')) return []
    const owner = name.replace(/_rels\/([^/]*)\.rels$/, '$1')
    const found = xml.match(/<Relationship [^>]*>/g) ?? []
    const ids = found.map((one) => / Id="([^"]*)"/.exec(one)?.[1] ?? '')
    const used = all(parts.get(owner) ?? '', / r:(?:id|embed|link|pict)="([^"]+)"/g)
    return [
      ...repeated(ids).map((id) => `${name} has two relationships ${id}`),
      ...found
        .filter((one) => !one.includes('TargetMode="External"'))
        .map((one) => resolved(owner, / Target="([^"]*)"/.exec(one)?.[1] ?? ''))
        .filter((target) => !parts.has(target))
        .map((target) => `${name} leads to ${target}, which is not there`),
      ...used
        .filter((id) => !ids.includes(id))
        .map((id) => `${owner} uses the relationship ${id}, which it does not have`),
    ]
  })

const inDocument = (parts: Parts): string[] => {
  const styles = new Set(all(parts.get('word/styles.xml') ?? '', / w:styleId="([^"]+)"/g))
  const numbering = new Set(all(parts.get('word/numbering.xml') ?? '', /<w:num [^>]*w:numId="(\d+)"/g))
  const document = parts.get('word/document.xml') ?? ''
  const bookmarks = all(document, /<w:bookmarkStart [^>]*w:name="([^"]+)"/g)
  const anchors = [
    ...all(document, / w:anchor="([^"]+)"/g),
    ...all(document, /<w:instrText[^>]*> ?(?:REF|PAGEREF) ([^ <]+)/g),
  ]
  const texts = [...parts].filter(([name]) => /^word\/[^/]*\.xml$/.test(name) && name !== 'word/numbering.xml')
  return [
    ...texts.flatMap(([name, xml]) => [
      ...all(xml, /<w:(?:p|r|tbl)Style w:val="([^"]+)"/g)
        .filter((style) => !styles.has(style))
        .map((style) => `${name} uses the style ${style}, which is not there`),
      ...all(xml, /<w:numId w:val="([1-9]\d*)"/g)
        .filter((id) => !numbering.has(id))
        .map((id) => `${name} uses the numbering ${id}, which is not there`),
    ]),
    ...all(parts.get('word/styles.xml') ?? '', /<w:(?:basedOn|next|link) w:val="([^"]+)"/g)
      .filter((style) => !styles.has(style))
      .map((style) => `a style leads to ${style}, which is not there`),
    ...repeated(bookmarks).map((name) => `there are two bookmarks ${name}`),
    ...repeated(all(document, /<w:bookmarkStart [^>]*w:id="([^"]+)"/g)).map((id) => `two bookmarks have the id ${id}`),
    ...repeated(all(document, /<wp:docPr [^>]*?\bid="([^"]+)"/g)).map((id) => `two drawings have the id ${id}`),
    ...[...new Set(anchors)]
      .filter((name) => !bookmarks.includes(name))
      .map((name) => `something refers to the bookmark ${name}, which is not there`),
  ]
}

const columnNumber = (letters: string): number =>
  letters.split('').reduce((sum, letter) => sum * 26 + letter.charCodeAt(0) - 64, 0)

const unescaped = (text: string): string =>
  text
    .replaceAll('&lt;', '<')
    .replaceAll('&gt;', '>')
    .replaceAll('&quot;', '"')
    .replaceAll('&apos;', "'")
    .replaceAll('&amp;', '&')

const inWorkbook = (parts: Parts): string[] => {
  const strings = (parts.get('xl/sharedStrings.xml') ?? '').match(/<si>.*?<\/si>|<si\/>/gs) ?? []
  const stringAt = (index: number) => all(strings[index] ?? '', /<t[^>]*>([^<]*)<\/t>/g).join('')
  const looks =
    /<cellXfs[^>]*>(.*?)<\/cellXfs>/s.exec(parts.get('xl/styles.xml') ?? '')?.[1]?.match(/<xf /g)?.length ?? 0
  const workbook = parts.get('xl/workbook.xml') ?? ''
  const sheets = new Set(all(workbook, /<sheet [^>]*?name="([^"]+)"/g).map(unescaped))
  const names = all(workbook, /<definedName [^>]*?name="([^"]+)"(?![^>]*localSheetId)/g)
  const missing = (formula: string): string[] =>
    all(unescaped(formula).replace(/"[^"]*"/g, ''), /'([^']+)'!/g).filter((sheet) => !sheets.has(sheet))
  const found: string[] = []
  for (const text of all(workbook, /<definedName [^>]*>([^<]*)<\/definedName>/g)) {
    if (text.includes('#REF!')) found.push(`a name leads to ${text}`)
    for (const sheet of missing(text)) found.push(`a name leads to the sheet ${sheet}, which is not there`)
  }
  for (const name of repeated(names.map((one) => one.toLowerCase()))) found.push(`there are two names ${name}`)
  const tables = new Map<string, string[]>()
  for (const [name, xml] of parts) {
    if (!/^xl\/worksheets\/[^/]*\.xml$/.test(name)) continue
    const rules = /<dataValidations count="(\d+)"/.exec(xml)?.[1]
    if (rules !== undefined && Number(rules) !== (xml.match(/<dataValidation /g) ?? []).length)
      found.push(`${name} counts ${rules} rules for entries and has another number of them`)
    for (const index of all(xml, /<(?:c|row|col) [^>]*?\b(?:s|style)="(\d+)"/g))
      if (Number(index) >= looks) found.push(`${name} uses the look ${index} of ${looks}`)
    for (const index of all(xml, /<c [^>]*t="s"[^>]*><v>(\d+)<\/v>/g))
      if (Number(index) >= strings.length) found.push(`${name} uses the text ${index} of ${strings.length}`)
    for (const formula of all(xml, /<f[^>]*>([^<]*)<\/f>/g))
      for (const sheet of missing(formula))
        found.push(`a formula of ${name} leads to the sheet ${sheet}, which is not there`)
    const links = parts.get(name.replace(/([^/]*)$/, '_rels/$1.rels')) ?? ''
    tables.set(
      name,
      all(links, / Target="([^"]*tables\/[^"]*)"/g).map((target) => resolved(name, target)),
    )
  }
  for (const [sheet, of] of tables)
    for (const part of of) found.push(...inTable(part, parts.get(part) ?? '', sheet, parts.get(sheet) ?? '', stringAt))
  return found
}

/** A table whose head cells do not say the names of its columns makes a spreadsheet repair the file. */
const inTable = (
  part: string,
  xml: string,
  sheetName: string,
  sheet: string,
  stringAt: (index: number) => string,
): string[] => {
  const [, first = '', row = '', last = ''] = / ref="([A-Z]+)(\d+):([A-Z]+)\d+"/.exec(xml) ?? []
  const columns = all(xml, /<tableColumn [^>]*?name="([^"]*)"/g)
  if (columns.length !== columnNumber(last) - columnNumber(first) + 1)
    return [`${part} has ${columns.length} columns on ${first} to ${last}`]
  const heads = new Map(
    [...sheet.matchAll(/<c r="([A-Z]+)(\d+)"[^>]*t="s"[^>]*><v>(\d+)<\/v>/g)]
      .filter(([, , at]) => at === row)
      .map(([, column = '', , index]) => [columnNumber(column), stringAt(Number(index))]),
  )
  return [
    ...repeated(columns.map((name) => name.toLowerCase())).map((name) => `${part} has two columns ${name}`),
    ...columns.flatMap((name, index) => {
      const head = heads.get(columnNumber(first) + index)
      return head === name ? [] : [`${part}: the column ${name} has the head ${String(head)} on ${sheetName}`]
    }),
  ]
}
