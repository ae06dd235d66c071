import type { Vocabulary as SpecVocabulary } from '@coldfill/spec'
import { z } from 'zod'

/** Names the spec language links to; the editor completes and checks with it. */
export const Vocabulary = z.custom<SpecVocabulary>(
  (value) => typeof value === 'object' && value !== null && 'pipes' in value && 'methods' in value,
)
export type Vocabulary = SpecVocabulary

const citation = z.object({ source: z.string(), locator: z.string(), fromMemory: z.literal(true).optional() })

export const FindingCode = z.object({
  title: z.string(),
  severity: z.enum(['error', 'warning', 'note']),
  layer: z.string(),
  what: z.string(),
  why: z.string(),
  fix: z.string(),
  /** Where the rule comes from, for engineering findings. */
  source: z.string().optional(),
})
export type FindingCode = z.infer<typeof FindingCode>

/** GET /api/reference: what the program knows, for the help pages and the editor. */
export const Reference = z.object({
  engine: z.string(),
  vocabulary: Vocabulary,
  findingCodes: z.record(z.string(), FindingCode),
  sources: z.record(
    z.string(),
    z.object({
      id: z.string(),
      title: z.string(),
      publisher: z.string(),
      edition: z.string(),
      year: z.number().nullable(),
    }),
  ),
  assumptions: z.record(
    z.string(),
    z.object({
      id: z.string(),
      name: z.string(),
      kind: z.string(),
      value: z.string(),
      source: citation,
      because: z.string(),
      overriddenBy: z.string(),
    }),
  ),
  methods: z.record(
    z.string(),
    z.object({
      id: z.string(),
      revision: z.number(),
      title: z.string(),
      /** What the method does and what it leaves out. */
      basis: z.string(),
      /** Vessel kind and method name as in a spec; null for a section that several methods share. */
      vessel: z.object({ kind: z.string(), method: z.string() }).nullable(),
      inputs: z.array(z.object({ symbol: z.string(), kind: z.string(), name: z.string() })),
      steps: z.array(
        z.object({
          symbol: z.string(),
          kind: z.string(),
          name: z.string(),
          formula: z.string(),
          source: citation,
        }),
      ),
      checks: z.array(z.object({ condition: z.string(), code: z.string(), message: z.string() })),
    }),
  ),
})
export type Reference = z.infer<typeof Reference>
