import type { UnitSystem } from '@coldfill/units'
import { useLayoutEffect, useRef, useState } from 'react'
import type { System } from '#lib/sized-project.ts'
import { type DrawnPoint, pressurePicture } from '../pressure-drawing.ts'

const halo = { paintOrder: 'stroke', strokeWidth: 4, strokeLinejoin: 'round' } as const
const MOST = 720

const line = (points: readonly DrawnPoint[], which: 'cold' | 'hot'): string =>
  points.map((point, at) => `${at === 0 ? 'M' : 'L'}${point[which].x} ${point.y}`).join('')

const Dot = ({ point, which }: { readonly point: DrawnPoint; readonly which: 'cold' | 'hot' }) => (
  <>
    <circle
      cx={point[which].x}
      cy={point.y}
      r="4"
      strokeWidth="2"
      className={which === 'hot' ? 'fill-ink stroke-ink' : 'fill-sheet stroke-ink'}
    />
    <text
      x={point[which].x + point[which].at.dx}
      y={point.y + point[which].at.dy}
      textAnchor={point[which].at.anchor}
      className="figures fill-ink stroke-sheet"
      {...halo}
    >
      {point[which].text}
    </text>
  </>
)

/**
 * Pressure against height in a system: gauge pressure to the right, height upwards, the cold and the hot line with what they read, the
 * relief valve and the line of the atmosphere.
 */
export const PressureDrawing = ({ system, units }: { readonly system: System; readonly units: UnitSystem }) => {
  const holder = useRef<HTMLDivElement>(null)
  const [width, setWidth] = useState(640)
  useLayoutEffect(() => {
    const element = holder.current
    if (!element) return undefined
    const measure = () => setWidth(Math.max(280, Math.min(MOST, element.clientWidth)))
    measure()
    const observer = new ResizeObserver(measure)
    observer.observe(element)
    return () => observer.disconnect()
  }, [])
  const picture = pressurePicture(system, units, width)
  const top = picture?.points.at(-1)
  return (
    <div ref={holder} className="w-full">
      {picture && top ? (
        <svg
          width={picture.width}
          height={picture.height}
          viewBox={`0 0 ${picture.width} ${picture.height}`}
          role="img"
          aria-label={picture.words}
          className="block max-w-full text-cell"
        >
          {picture.ticks.map((tick) => (
            <g key={tick.text}>
              <path
                d={`M${tick.x} ${picture.field.top}V${picture.field.bottom}`}
                className="stroke-hair"
                strokeWidth="1"
              />
              <text x={tick.x} y={picture.field.bottom + 16} textAnchor="middle" className="figures fill-pencil">
                {tick.text}
              </text>
            </g>
          ))}
          <path
            d={`M${picture.field.left} ${picture.field.bottom}H${picture.field.right}`}
            className="stroke-ink"
            strokeWidth="1.5"
          />
          <text
            x={picture.field.right}
            y={picture.field.bottom + 36}
            textAnchor="end"
            className="fill-pencil font-medium"
          >
            {picture.axis}
          </text>
          {picture.points.map((point) => (
            <g key={point.label}>
              <path
                d={`M${picture.field.left} ${point.y}H${picture.field.right}`}
                className="stroke-rule"
                strokeWidth="1"
                strokeDasharray="2 3"
              />
              <text x={picture.field.left - 10} y={point.y - 2} textAnchor="end" className="fill-ink font-semibold">
                {point.label}
              </text>
              <text x={picture.field.left - 10} y={point.y + 13} textAnchor="end" className="figures fill-pencil">
                {point.height}
              </text>
            </g>
          ))}
          <path
            d={`M${picture.atmosphere} ${picture.field.top}V${picture.field.bottom}`}
            className="stroke-pencil"
            strokeWidth="1.5"
            strokeDasharray="10 3 2 3"
          />
          <text
            x={picture.atmosphere}
            y={picture.field.top - 22}
            textAnchor={picture.atmosphere < picture.field.left + 30 ? 'start' : 'middle'}
            className="fill-pencil"
          >
            atmosphere
          </text>
          <path
            d={line(picture.points, 'cold')}
            className="fill-none stroke-ink"
            strokeWidth="2"
            strokeDasharray="7 4"
          />
          <path d={line(picture.points, 'hot')} className="fill-none stroke-ink" strokeWidth="3" />
          <text
            x={top.cold.x}
            y={picture.field.top - 4}
            textAnchor="middle"
            className="fill-ink stroke-sheet font-semibold"
            {...halo}
          >
            cold
          </text>
          <text
            x={top.hot.x}
            y={picture.field.top - 4}
            textAnchor="middle"
            className="fill-ink stroke-sheet font-semibold"
            {...halo}
          >
            hot
          </text>
          {picture.points.map((point) => (
            <g key={point.label}>
              <Dot point={point} which="cold" />
              <Dot point={point} which="hot" />
            </g>
          ))}
          {picture.relief ? (
            <g>
              <path
                d={`M${picture.relief.x} ${picture.field.top}V${picture.field.bottom}`}
                className="stroke-ink"
                strokeWidth="1.5"
                strokeDasharray="3 4"
              />
              <path
                d={`M${picture.relief.x - 7} ${picture.relief.y - 6}l14 12v-12l-14 12z`}
                className="fill-sheet stroke-ink"
                strokeWidth="2"
                strokeLinejoin="round"
              />
              <text
                x={picture.relief.named}
                y={picture.field.top - 22}
                textAnchor="middle"
                className="figures fill-ink font-semibold"
              >
                {picture.relief.text}
              </text>
            </g>
          ) : null}
        </svg>
      ) : null}
    </div>
  )
}
