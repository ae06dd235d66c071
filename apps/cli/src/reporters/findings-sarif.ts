import { findingCodes, type Finding } from '@coldfill/spec'
import { engineeringCodes, engineVersion } from '@coldfill/sizing'

const titles: Readonly<Record<string, { readonly title: string; readonly why: string }>> = {
  ...findingCodes,
  ...engineeringCodes,
}

/** Findings as a SARIF 2.1.0 log (OASIS), columns in UTF-16 units. */
export const findingsSarif = (file: string, findings: readonly Finding[]): string => {
  const codes = [...new Set(findings.map(({ code }) => code))].sort()
  return JSON.stringify(
    {
      $schema: 'https://docs.oasis-open.org/sarif/sarif/v2.1.0/errata01/os/schemas/sarif-schema-2.1.0.json',
      version: '2.1.0',
      runs: [
        {
          tool: {
            driver: {
              name: 'coldfill',
              version: engineVersion,
              rules: codes.map((id) => ({
                id,
                shortDescription: { text: titles[id]?.title ?? id },
                fullDescription: { text: titles[id]?.why ?? titles[id]?.title ?? id },
              })),
            },
          },
          columnKind: 'utf16CodeUnits',
          results: findings.map((finding) => ({
            ruleId: finding.code,
            ruleIndex: codes.indexOf(finding.code),
            level: finding.severity,
            message: { text: finding.hint ? `${finding.message} ${finding.hint}` : finding.message },
            locations: [
              {
                physicalLocation: {
                  artifactLocation: { uri: file },
                  region: {
                    startLine: finding.range.start.line + 1,
                    startColumn: finding.range.start.character + 1,
                    endLine: finding.range.end.line + 1,
                    endColumn: finding.range.end.character + 1,
                  },
                },
                logicalLocations: [{ fullyQualifiedName: finding.path }],
              },
            ],
            ...(finding.accepted === undefined
              ? {}
              : { suppressions: [{ kind: 'inSource', justification: finding.accepted }] }),
          })),
        },
      ],
    },
    null,
    2,
  )
}
