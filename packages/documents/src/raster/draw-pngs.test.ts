import { expect, it } from 'vitest'
import { drawPngs } from './draw-pngs.ts'

const svg = (n: number) =>
  `<svg xmlns="http://www.w3.org/2000/svg" width="60" height="20" font-family="Inter"><rect width="60" height="20" fill="#fff"/><text x="4" y="15">${n}</text></svg>`

it('draws the same bytes in a thread of its own as here, in order', async () => {
  const svgs = Array.from({ length: 45 }, (_, n) => svg(n))
  const many = await drawPngs({ svgs, width: 60 })
  expect(many).toHaveLength(45)
  for (const n of [0, 17, 44]) {
    const [alone] = await drawPngs({ svgs: [svg(n)], width: 60 })
    expect(Buffer.from(alone ?? []).equals(Buffer.from(many[n] ?? []))).toBe(true)
  }
})

it('fails where a drawing cannot be drawn, wherever it is drawn', async () => {
  for (const count of [1, 45]) {
    const drawn = drawPngs({ svgs: Array.from({ length: count }, () => '<svg'), width: 60 })
    const outcome = await drawn.then(
      () => 'drawn',
      (error: unknown) => String(error),
    )
    expect(outcome).toMatch(/svg|xml|pars/i)
  }
})
