import '#lib/zod-without-eval.ts'
import { StrictMode } from 'react'
import { createRoot } from 'react-dom/client'
import { Providers } from '#app/providers.tsx'
import { startUnits } from '#lib/search-params.ts'
import { startTheme } from '#lib/theme.ts'
import './index.css'

startTheme()
startUnits()

const root = document.getElementById('root')
if (!root) throw new Error('index.html has no #root')
createRoot(root).render(
  <StrictMode>
    <Providers />
  </StrictMode>,
)
