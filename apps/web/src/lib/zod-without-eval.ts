import { z } from 'zod'

// The content policy allows no compiled code, so zod interprets its schemas. It looks when a schema is made: this comes first.
z.config({ jitless: true })
