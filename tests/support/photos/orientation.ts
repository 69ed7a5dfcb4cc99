/**
 * What the eight values of EXIF's Orientation mean: on which side of the scene
 * the stored picture's row 0 and column 0 lie.
 *
 * Source: CIPA DC-008, section 4.6.4, tag Orientation; from memory.
 */
export const ORIENTATIONS = [
  { value: 1, row0: 'top', column0: 'left' },
  { value: 2, row0: 'top', column0: 'right' },
  { value: 3, row0: 'bottom', column0: 'right' },
  { value: 4, row0: 'bottom', column0: 'left' },
  { value: 5, row0: 'left', column0: 'top' },
  { value: 6, row0: 'right', column0: 'top' },
  { value: 7, row0: 'right', column0: 'bottom' },
  { value: 8, row0: 'left', column0: 'bottom' },
] as const

type Side = (typeof ORIENTATIONS)[number]['row0' | 'column0']
type Colour = readonly [number, number, number]
export type Raster = { widthPx: number, heightPx: number, rgba: Uint8ClampedArray<ArrayBuffer> }

export const SCENE = { widthPx: 96, heightPx: 64 }
/** One colour a quarter, so that any turn or mirror shows. */
export const QUARTERS = {
  topLeft: [220, 30, 30],
  topRight: [30, 180, 30],
  bottomLeft: [30, 30, 220],
  bottomRight: [240, 240, 240],
} as const satisfies Record<string, Colour>

/** The scene as a camera held in that way stores it. */
export function storedScene({ row0, column0 }: { row0: Side, column0: Side }): Raster {
  const lying = row0 === 'left' || row0 === 'right'
  const [widthPx, heightPx] = lying ? [SCENE.heightPx, SCENE.widthPx] : [SCENE.widthPx, SCENE.heightPx]
  const rgba = new Uint8ClampedArray(widthPx * heightPx * 4)
  for (let row = 0; row < heightPx; row++) {
    for (let column = 0; column < widthPx; column++) {
      const { x, y } = { x: 0, y: 0, ...stepFrom(row0, row), ...stepFrom(column0, column) }
      rgba.set([...colourAt(x, y), 255], (row * widthPx + column) * 4)
    }
  }
  return { widthPx, heightPx, rgba }
}

/** Where in the scene one is, that many points away from one of its sides. */
function stepFrom(side: Side, steps: number): { x: number } | { y: number } {
  switch (side) {
    case 'left': return { x: steps }
    case 'right': return { x: SCENE.widthPx - 1 - steps }
    case 'top': return { y: steps }
    case 'bottom': return { y: SCENE.heightPx - 1 - steps }
  }
}

function colourAt(x: number, y: number): Colour {
  const left = x < SCENE.widthPx / 2
  if (y < SCENE.heightPx / 2) return left ? QUARTERS.topLeft : QUARTERS.topRight
  return left ? QUARTERS.bottomLeft : QUARTERS.bottomRight
}

/** The quarter whose colour a point of an upright picture shows, allowing for what JPEG changes. */
export function quarterOf([red, green, blue]: number[]): string | undefined {
  const near = (colour: Colour) => [red, green, blue].every((value, index) => Math.abs((value ?? -99) - (colour[index] ?? 0)) < 30)
  return Object.entries(QUARTERS).find(([, colour]) => near(colour))?.[0]
}
