import type { OfficeCatalogue } from '@coldfill/contract'
import { catalogueColumns } from '@coldfill/sizing'
import type { catalogueContent, officeCatalogues } from './catalogue.queries.ts'

type Listed = Awaited<ReturnType<typeof officeCatalogues>>[number]
type Content = Awaited<ReturnType<typeof catalogueContent>>
type Shown = NonNullable<OfficeCatalogue['catalogue']>

const presentUpload = ({ fileName, uploadedAt, uploadedBy, hash }: Listed) => ({
  fileName,
  uploadedAt: uploadedAt.toISOString(),
  uploadedBy,
  hash,
})

export const presentCatalogue = (
  listed: readonly Listed[],
  current: { readonly listed: Listed; readonly content: Content } | null,
): OfficeCatalogue => ({
  catalogue: current && {
    ...presentUpload(current.listed),
    rows: JSON.parse(current.content.rowsJson) as Shown['rows'],
    problems: JSON.parse(current.content.problemsJson) as Shown['problems'],
  },
  earlier: listed.flatMap((row) =>
    row.endedAt ? [{ ...presentUpload(row), rowCount: row.rowCount, endedAt: row.endedAt.toISOString() }] : [],
  ),
  columns: catalogueColumns.map(({ heading, doc, required }) => ({ heading, doc, required })),
})
