import { describe, expect, it } from 'vitest'
import { entersOutline } from './enters-outline.js'

const at = (pairs: readonly (readonly [number, number])[]) =>
  pairs.map(([eastFt, northFt]) => ({ eastFt, northFt }))
const square = at([
  [0, 0],
  [100, 0],
  [100, 100],
  [0, 100],
])

describe('entersOutline', () => {
  it.each([
    [
      'a run beside the water',
      [
        [-10, -10],
        [110, -10],
      ],
      false,
    ],
    [
      'a run with a point in the water',
      [
        [50, -10],
        [50, 1],
      ],
      true,
    ],
    [
      'a run across the water with both ends on land',
      [
        [-10, 50],
        [110, 50],
      ],
      true,
    ],
    [
      'a run that cuts a corner of the water',
      [
        [-5, 10],
        [10, -5],
      ],
      true,
    ],
    [
      'a run that passes a corner',
      [
        [-15, 10],
        [10, -15],
      ],
      false,
    ],
  ] as const)('%s: %s', (_, pairs, expected) => {
    expect(entersOutline({ points: at(pairs), outline: square })).toBe(expected)
  })

  it.each([
    ['south', [50, -10], [50, 0], [50, 1]],
    ['north', [50, 110], [50, 100], [50, 99]],
    ['west', [-10, 50], [0, 50], [1, 50]],
    ['east', [110, 50], [100, 50], [99, 50]],
  ] as const)(
    'lets a run from the %s end at the edge of the water, and not a foot past it',
    (_, land, edge, wet) => {
      expect(entersOutline({ points: at([land, edge]), outline: square })).toBe(false)
      expect(entersOutline({ points: at([land, wet]), outline: square })).toBe(true)
    },
  )

  it('minds the bay of an outline that is not convex', () => {
    const bay = at([
      [0, 0],
      [100, 0],
      [100, 100],
      [50, 20],
      [0, 100],
    ])
    expect(
      entersOutline({
        points: at([
          [50, 100],
          [50, 30],
        ]),
        outline: bay,
      }),
    ).toBe(false)
    expect(
      entersOutline({
        points: at([
          [50, 100],
          [50, 10],
        ]),
        outline: bay,
      }),
    ).toBe(true)
  })
})
