import { StrictMode } from 'react'
import { createRoot } from 'react-dom/client'
import { z } from 'zod'
import { Providers } from '#app/providers.tsx'
import { startUnits } from '#lib/search-params.ts'
import { startTheme } from '#lib/theme.ts'
import './index.css'

// The content policy allows no compiled code, so zod interprets its schemas.
z.config({ jitless: true })
startTheme()
startUnits()

const root = document.getElementById('root')
if (!root) throw new Error('index.html has no #root')
createRoot(root).render(
  <StrictMode>
    <Providers />
  </StrictMode>,
)
