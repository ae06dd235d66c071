import { water } from '@coldfill/engine'
import { sizeSpec } from '@coldfill/sizing'
import { strFromU8, unzipSync } from 'fflate'
import { beforeAll, describe, expect, it } from 'vitest'
import { lineWidth } from '../docx/letter-widths.ts'
import { headerText, scheduleKinds, scheduleTable } from '@coldfill/presentation'
import { clinicProject, documentOptions, everyVessel, reviewedOptions, si } from '../testing/index.ts'
import { cautions } from '../words/cautions.ts'
import { writeSubmittal } from './write-submittal.ts'

const project = clinicProject(water.functions)

const partsOf = (bytes: Uint8Array): Map<string, string> =>
  new Map(Object.entries(unzipSync(bytes)).map(([name, part]) => [name, strFromU8(part)]))
const all = (xml: string, element: string): string[] =>
  xml.match(new RegExp(`<w:${element}[ >].*?</w:${element}>`, 'gs')) ?? []
const textOf = (xml: string): string =>
  [...xml.matchAll(/<w:t[^>]*>([^<]*)<\/w:t>/g)]
    .map(([, text]) => text)
    .join('')
    .replaceAll('&apos;', "'")
    .replaceAll('&quot;', '"')
    .replaceAll('&amp;', '&')
const paragraphs = (xml: string, style: string): string[] =>
  all(xml, 'p')
    .filter((paragraph) => paragraph.includes(`<w:pStyle w:val="${style}"/>`))
    .map(textOf)

describe('the submittal', () => {
  let bytes: Uint8Array
  let parts: Map<string, string>
  let document: string
  beforeAll(async () => {
    bytes = await writeSubmittal(project, documentOptions('US'))
    parts = partsOf(bytes)
    document = parts.get('word/document.xml') ?? ''
  })

  it('has its sections in order, as built-in headings', () => {
    expect(paragraphs(document, 'Heading1')).toEqual([
      'Summary',
      'Schedules',
      ...(project.systems.some((system) => system.pressures.length > 0) ? ['System pressures'] : []),
      'Calculations',
      'Assumptions',
      'Findings',
      'Sources',
      'Cautions',
    ])
    expect(paragraphs(document, 'Heading2')).toContain('ET-1  Expansion tank')
    expect(paragraphs(document, 'Title')).toEqual(['Fernhollow Community Clinic'])
  })

  it('lists its headings in a contents field that is complete, clean and asks for no update', () => {
    const listed = [...paragraphs(document, 'TOC1'), ...paragraphs(document, 'TOC2')].sort()
    expect(listed).toEqual([...paragraphs(document, 'Heading1'), ...paragraphs(document, 'Heading2')].sort())
    const captions = [...paragraphs(document, 'Caption'), ...paragraphs(document, 'FigureCaption')]
    expect(captions.filter((text) => text.startsWith('Figure ')).length).toBeGreaterThan(0)
    expect(paragraphs(document, 'TableofFigures')).toEqual(captions)
    for (const xml of parts.values()) {
      expect(xml).not.toContain('updateFields')
      expect(xml).not.toMatch(/w:dirty=/)
    }
    const anchors = [...document.matchAll(/w:anchor="([^"]+)"/g)].map(([, anchor]) => anchor)
    expect(anchors.length).toBe(listed.length + captions.length)
    for (const anchor of anchors) expect(document).toContain(`w:name="${anchor}"`)
    // Each field is begun, separated and ended.
    const marks = (type: string) => document.split(`w:fldCharType="${type}"`).length
    expect([marks('separate'), marks('end')]).toEqual([marks('begin'), marks('begin')])
  })

  it('has the caption of a table above it and that of a figure below, each kept with what it names', () => {
    const blocks = document.match(/<w:p>.*?<\/w:p>|<w:tbl>.*?<\/w:tbl>/gs) ?? []
    const is = (block: string | undefined, style: string) => block?.includes(`<w:pStyle w:val="${style}"/>`) === true
    const figures = blocks.flatMap((block, index) => (block.includes('<w:drawing>') ? [index] : []))
    expect(figures.length).toBe(paragraphs(document, 'FigureCaption').length)
    for (const index of figures) expect(is(blocks[index + 1], 'FigureCaption')).toBe(true)
    for (const [index, block] of blocks.entries())
      if (is(block, 'Caption')) expect(blocks[index + 1]).toMatch(/^<w:tbl>/)
    const styles = parts.get('word/styles.xml') ?? ''
    const style = (id: string) => all(styles, 'style').find((xml) => xml.includes(`w:styleId="${id}"`)) ?? ''
    for (const id of ['Figure', 'Caption']) expect(style(id)).toContain('<w:keepNext/>')
    expect(style('FigureCaption')).toContain('<w:keepNext w:val="0"/>')
  })

  it('says the answer of every vessel, also of one without a volume', async () => {
    const every = sizeSpec(everyVessel)
    const written = partsOf(await writeSubmittal(every, documentOptions('US'))).get('word/document.xml') ?? ''
    const answers = paragraphs(written, 'CalculationAnswer')
    expect(answers).toHaveLength(every.vessels.length)
    for (const { mark } of every.vessels)
      expect(answers.some((answer) => new RegExp(`^${mark}: [a-z].* \\d`).test(answer))).toBe(true)
    // ASHRAE practice of 10 ft/s: a flash tank has a diameter and no volume.
    expect(answers.find((answer) => answer.startsWith('FT-1: '))).toMatch(/least diameter [\d.]+ in/)
  })

  it('has no page numbers in its lists unless somebody says them', () => {
    expect(document).not.toMatch(/PAGEREF|page of/)
    expect(document).toContain('TOC \\o &quot;1-2&quot; \\h \\n &quot;1-2&quot;')
  })

  it('puts the page of every heading and caption behind its entry', async () => {
    const asked: Uint8Array[] = []
    const page = (name: string): number => Number(name.slice(-2)) + 3
    const written = partsOf(
      await writeSubmittal(project, documentOptions('US'), {
        findPages: (docx) => {
          asked.push(docx)
          const names =
            partsOf(docx)
              .get('word/document.xml')
              ?.matchAll(/w:name="(_Toc\d+)"/g) ?? []
          return Promise.resolve(new Map([...names].map(([, name = '']) => [name, page(name)])))
        },
      }),
    ).get('word/document.xml')
    expect(asked).toHaveLength(1)
    expect(written).not.toContain('page of')
    const entries = ['TOC1', 'TOC2', 'TableofFigures'].flatMap((style) =>
      all(written ?? '', 'p').filter((entry) => entry.includes(`<w:pStyle w:val="${style}"/>`)),
    )
    expect(entries.length).toBeGreaterThan(10)
    for (const entry of entries) {
      const [, anchor = ''] = /PAGEREF (_Toc\d+) /.exec(entry) ?? []
      expect(entry).toContain(`w:anchor="${anchor}"`)
      expect(textOf(entry)).toMatch(new RegExp(`\\D${page(anchor)}$`))
    }
  })

  it('leaves the numbers out where laying out fails or misses a place, and is else the same', async () => {
    const failing = () => Promise.reject(new Error('no layout'))
    for (const findPages of [failing, () => Promise.resolve(new Map([['_Toc100000', 2]]))]) {
      const written = await writeSubmittal(project, documentOptions('US'), { findPages })
      expect(Buffer.from(written).equals(Buffer.from(bytes))).toBe(true)
    }
  })

  it('refers to its tables by fields whose cached words are the number of the table', () => {
    const bookmarks = new Map(
      [...document.matchAll(/<w:bookmarkStart [^>]*w:name="(_Ref\d+)"\/>(.*?)<w:bookmarkEnd/gs)].map(
        ([, name, inside]) => [name, textOf(inside ?? '')],
      ),
    )
    const references = [
      ...document.matchAll(/REF (_Ref\d+) \\h <.*?w:fldCharType="separate"\/><\/w:r>(.*?)<w:r><w:fldChar/gs),
    ]
    expect(references.length).toBeGreaterThan(4)
    for (const [, name, cached] of references) expect(textOf(cached ?? '')).toBe(bookmarks.get(name))
  })

  it('repeats the head row of every table, keeps rows whole and merges nothing', () => {
    const tables = all(document, 'tbl')
    expect(tables.length).toBeGreaterThan(10)
    for (const table of tables) {
      const [head, ...rows] = all(table, 'tr')
      expect(head).toContain('<w:tblHeader/>')
      for (const row of rows) expect(row).not.toContain('<w:tblHeader/>')
      for (const row of [head, ...rows]) expect(row).toContain('<w:cantSplit/>')
      expect(table).not.toMatch(/w:gridSpan|w:vMerge|w:hMerge/)
      expect(table).toMatch(/<w:tblCaption w:val="[^"]+"\/><w:tblDescription w:val="[^"]+"\/>/)
    }
  })

  it('prints every cell of a schedule in a landscape section, in as many tables as its columns need, the mark in each', () => {
    const tables = all(document, 'tbl')
    for (const kind of scheduleKinds(project)) {
      const schedule = scheduleTable(project, kind, 'US')
      const parts = tables
        .filter((table) => table.includes(`<w:tblCaption w:val="${schedule.title} schedule`))
        .map((table) => all(table, 'tr').map((row) => all(row, 'tc').map(textOf)))
      expect(parts.length).toBeGreaterThan(0)
      for (const [head, ...rows] of parts) {
        expect(head?.[0]).toBe('Mark')
        expect(rows.map((row) => row[0])).toEqual(schedule.rows.map((row) => row.mark))
      }
      const whole = [schedule.columns.map(headerText)].concat(
        schedule.rows.map((row) => schedule.columns.map((column) => row.cells[column.key]?.text ?? '')),
      )
      expect(whole.map((row, index) => [row[0], ...parts.flatMap((part) => part[index]?.slice(1) ?? [])])).toEqual(
        whole,
      )
    }
    expect(document.match(/<w:pgSz [^>]*w:orient="landscape"/g)).toHaveLength(1)
  })

  it('gives each column of a table room for its longest word', () => {
    // Type of the styles in points; cells have 3.5 pt of margin on each side.
    const sizes = { TableText: 8.5, ScheduleText: 7.5, SmallScheduleText: 7 }
    const cramped: string[] = []
    for (const table of all(document, 'tbl')) {
      const [, size = 0] = Object.entries(sizes).find(([style]) => table.includes(`w:val="${style}"`)) ?? []
      const widths = [...table.matchAll(/<w:gridCol w:w="(\d+)"/g)].map(([, width]) => Number(width) / 20)
      for (const row of all(table, 'tr').slice(1)) {
        all(row, 'tc').forEach((cell, index) => {
          for (const word of textOf(cell).split(' ')) {
            if (word.length <= 22 && lineWidth(word) * size + 7 > (widths[index] ?? 0)) cramped.push(word)
          }
        })
      }
    }
    expect(cramped).toEqual([])
  })

  it('writes every step of a calculation twice as a native equation: in symbols and with its numbers', () => {
    const steps = project.vessels.flatMap((vessel) =>
      vessel.trace.flatMap((section) => section.entries.filter((entry) => entry.entry === 'step')),
    )
    expect(document.match(/<m:oMathPara>/g)).toHaveLength(2 * steps.length)
    expect(document.match(/<m:oMath>/g)).toHaveLength(document.match(/<\/m:oMath>/g)?.length ?? -1)
    // Words in an equation are normal text, or LibreOffice reads some of them as commands.
    const words = [...document.matchAll(/<m:r>.*?<\/m:r>/gs)].flatMap(([run]) =>
      /<m:t[^>]*>[^<&]*[a-z]{2,}/.test(run) ? [run] : [],
    )
    expect(words.length).toBeGreaterThan(10)
    for (const run of words) expect(run).toContain('<m:nor m:val="1"/>')
  })

  it('carries its looks in styles: no run and no paragraph is formatted by hand', () => {
    expect(document).not.toMatch(/<w:rFonts|<w:sz |<w:color |<w:b\/>|<w:i\/>|<w:jc /)
    const styles = parts.get('word/styles.xml') ?? ''
    for (const [, style] of document.matchAll(/<w:(?:pStyle|rStyle|tblStyle) w:val="([^"]+)"/g)) {
      expect(styles).toContain(`w:styleId="${style}"`)
    }
    expect(styles).toContain('<w:lang w:val="en-US"')
  })

  it('says project, revision, status, hash and page on each page, and that it is no construction issue', () => {
    const headers = [...parts].filter(([name]) => /word\/header\d+\.xml/.test(name)).map(([, xml]) => xml)
    const footers = [...parts].filter(([name]) => /word\/footer\d+\.xml/.test(name)).map(([, xml]) => xml)
    expect(headers.length).toBeGreaterThan(1)
    for (const xml of headers) expect(textOf(xml)).toContain('ISSUED FOR REVIEW – NOT FOR CONSTRUCTION')
    expect(headers.filter((xml) => textOf(xml).includes('Rev A'))).toHaveLength(headers.length - 1)
    for (const xml of footers) {
      expect(xml).toMatch(/PAGE.*NUMPAGES/s)
      expect(textOf(xml)).toContain('a3f5c0de9b7d41e2')
    }
  })

  it('drops the warning, and only then, where it is issued for construction', async () => {
    const issued = partsOf(await writeSubmittal(project, documentOptions('US', 'Issued for construction')))
    for (const xml of issued.values()) expect(xml).not.toContain('NOT FOR CONSTRUCTION')
    const working = partsOf(await writeSubmittal(project, documentOptions('US', 'Working copy')))
    expect(working.get('word/header1.xml')).toContain('WORKING COPY – NOT FOR CONSTRUCTION')
  })

  it('prints the assumptions with who changed them and why, accepted warnings with their reasons, and every caution', () => {
    const text = textOf(document)
    expect(text).toContain("Set in the spec: Owner's standard, section 5.2")
    expect(text).toContain('The regulator stands upstream of every fixture.')
    for (const sentence of cautions) expect(text).toContain(sentence)
  })

  it('says why a vessel has no size', () => {
    expect(paragraphs(document, 'CalculationAnswer').join('\n')).toMatch(/No vessel can do it\. .*\n.*\nNot sized\. /)
  })

  it('says how far each input may move before the chosen vessel is too small', async () => {
    const headroom = [
      {
        entry: 'TET-1/storage-temperature',
        symbol: 't_h',
        name: 'storage temperature',
        kind: 'temperature',
        value: si('140 °F', 'temperature'),
        sensitivity: 0.001,
        limit: si('167 °F', 'temperature'),
      },
    ] as const
    const vessels = project.vessels.map((vessel) => (vessel.mark === 'TET-1' ? { ...vessel, headroom } : vessel))
    const written = partsOf(await writeSubmittal({ ...project, vessels }, documentOptions('US'))).get(
      'word/document.xml',
    )
    const rows = all(written ?? '', 'tbl').find((table) =>
      table.includes('w:val="TET-1, headroom with the chosen vessel"'),
    )
    // By hand: 0.001 m3 a kelvin is 1 L / 1.8 = 0.5556 L a degree Fahrenheit, at 3.785411784 L a gallon 0.147 gal.
    expect(
      all(rows ?? '', 'tc')
        .map(textOf)
        .slice(5),
    ).toEqual(['th', 'Storage temperature', '140 °F', '+0.147 gal a °F', '167 °F'])
    expect(textOf(written ?? '')).toContain(
      'Chosen: Invented Vessel Works T 50, 50 gal each, rated 150 psig and 200 °F, stamped.',
    )
  })

  it('draws each charged vessel in the line, as an SVG and as dots, with words for who cannot see it', () => {
    const pictures = document.match(/<wp:inline.*?<\/wp:inline>/gs) ?? []
    expect(pictures).toHaveLength(project.vessels.filter((vessel) => vessel.status === 'sized').length)
    for (const picture of pictures) {
      expect(picture).toMatch(/<wp:docPr [^>]*descr="[^"]{40,}"/)
      expect(picture).toContain('svgBlip')
    }
    const ids = [...document.matchAll(/<wp:docPr [^>]*\bid="(\d+)"/g)].map(([, id]) => Number(id))
    expect(ids).toEqual(ids.map((_, index) => index + 1))
    const media = Object.entries(unzipSync(bytes)).filter(([name]) => name.startsWith('word/media/'))
    expect(media.filter(([name]) => name.endsWith('.svg'))).toHaveLength(pictures.length)
    const dots = media.filter(([name]) => name.endsWith('.png'))
    expect(dots).toHaveLength(pictures.length)
    for (const [, png] of dots) expect(Buffer.from(png.subarray(1, 4)).toString()).toBe('PNG')
    expect(document).not.toContain('wp:anchor')
  })

  it('carries what a review brought, each in its section, and no section where it is not given', async () => {
    for (const heading of ['Changes since', 'Redlines and answers', 'Verification']) {
      expect(paragraphs(document, 'Heading1').join()).not.toContain(heading)
    }
    const archive = await writeSubmittal(project, reviewedOptions('US'))
    const written = partsOf(archive).get('word/document.xml') ?? ''
    expect(paragraphs(written, 'Heading1')).toEqual(
      expect.arrayContaining(['Changes since the first issue', 'Redlines and answers', 'Verification']),
    )
    const rows = (title: string) =>
      all(all(written, 'tbl').find((table) => table.includes(`<w:tblCaption w:val="${title}"/>`)) ?? '', 'tr')
        .slice(1)
        .map((row) => all(row, 'tc').map(textOf))
    expect(rows('Disposition block')).toEqual([
      [
        'Revise and resubmit (on earlier content)',
        'B. Lark',
        '2026-11-20',
        'The precharge of ET-1 is below the static height.',
      ],
      ['Accepted as noted', 'B. Lark', '2026-11-30', 'See redline 2.'],
    ])
    expect(rows('Changes since the first issue')).toEqual([
      ['ET-1', 'HWS', 'Precharge', '12 psig', '15 psig', '+25 %'],
      ['TET-1', 'DHW', 'Status', 'Blocked', 'Sized', ''],
      ['TET-1', 'DHW', 'Precharge', '—', '60 psig', ''],
    ])
    expect(rows('Redlines and answers')[0]).toEqual([
      '1',
      'ET-1, Precharge',
      'B. Lark, 2026-11-20: Below the static height of the building. (On 12 psig, proposes 22.2 psig, must be answered.)',
      'A. Rowan, 2026-11-21: Raised to the fill pressure; charge it on site.',
      'Closed',
    ])
    expect(rows('Verification')).toHaveLength(reviewedOptions('US').verification?.length ?? -1)
    expect(textOf(written)).toContain(
      'Gates overridden. C. Heath issued this for construction on 2026-12-01 although a gate did not pass: The owner accepts ET-1 as it is.',
    )
    expect(written).toContain('descr="Logo of Tarn &amp; Vale Engineers"')
  })

  it('uses A4 for SI and Letter for US unless told otherwise', async () => {
    expect(document).toContain('w:w="12240" w:h="15840"')
    const metric = partsOf(await writeSubmittal(project, documentOptions('SI'))).get('word/document.xml')
    expect(metric).toContain('w:w="11906" w:h="16838"')
    const letter = await writeSubmittal(project, { ...documentOptions('SI'), paper: 'Letter' })
    expect(partsOf(letter).get('word/document.xml')).toContain('w:w="12240" w:h="15840"')
  })

  it('gives the same bytes for the same result, whenever it is written', async () => {
    expect(Buffer.from(await writeSubmittal(project, documentOptions('US'))).equals(Buffer.from(bytes))).toBe(true)
  })

  it('takes any text of a user as text', async () => {
    const odd = '<w:p/> & "x" \u0007\ud800 ]]>\r\nnext'
    const vessels = project.vessels.map((vessel) => ({ ...vessel, serves: odd, notes: [odd] }))
    const written = partsOf(
      await writeSubmittal({ ...project, vessels, project: { ...project.project, title: odd } }, documentOptions('US')),
    )
    expect(written.get('word/document.xml')).toContain('&lt;w:p/&gt; &amp; ')
    expect(written.get('word/document.xml')).not.toContain('\u0007')
  })

  it('takes what people wrote in a review as text too', async () => {
    const odd = '<w:p/> & "x" \u0007\ud800 ]]>'
    const reviewed = reviewedOptions('US')
    const written = partsOf(
      await writeSubmittal(project, {
        ...reviewed,
        titleBlock: { ...reviewed.titleBlock, office: odd },
        dispositions: [{ reviewer: odd, outcome: odd, reason: odd, date: '2026-11-20' }],
        redlines: (reviewed.redlines ?? []).map((redline) => ({
          ...redline,
          quoted: odd,
          anchor: { type: 'row', mark: odd } as const,
          messages: redline.messages.map((message) => ({ ...message, text: odd })),
        })),
        comparison: {
          revision: odd,
          changed: [{ system: odd, mark: odd, key: odd, name: odd, kind: odd, was: odd, now: null }],
        },
        override: { reason: odd, by: odd, date: '2026-12-01' },
      }),
    )
    const document = written.get('word/document.xml') ?? ''
    expect(document).not.toContain('\u0007')
    expect(document).not.toContain('<w:p/> &')
    expect(document.split('&lt;w:p/&gt; &amp; ').length).toBeGreaterThan(12)
  })

  it('writes a project without vessels', async () => {
    const empty = { ...project, vessels: [], systems: [], assumptions: [], findings: [], sources: {} }
    const written = partsOf(await writeSubmittal(empty, documentOptions('US'))).get('word/document.xml') ?? ''
    expect(paragraphs(written, 'Heading1')).toContain('Summary')
  })
})
