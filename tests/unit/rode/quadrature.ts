/** Height and span of a hanging part by Gauss-Legendre quadrature on graded panels: shares no formula with the solver. */

/** Nodes and weights on [-1, 1], by Newton on the Legendre polynomial. */
function gaussLegendre(count: number): { node: number, weight: number }[] {
  return Array.from({ length: count }, (_, index) => {
    let node = Math.cos(Math.PI * (index + 0.75) / (count + 0.5))
    let slope = 1
    for (let round = 0; round < 50; round += 1) {
      let previous = 1
      let value = node
      for (let degree = 2; degree <= count; degree += 1) {
        const next = ((2 * degree - 1) * node * value - (degree - 1) * previous) / degree
        previous = value
        value = next
      }
      slope = count * (node * value - previous) / (node * node - 1)
      node -= value / slope
    }
    return { node, weight: 2 / ((1 - node * node) * slope * slope) }
  })
}

const rule = gaussLegendre(20)

/**
 * Integrals of sine and cosine of the line's angle along a part whose vertical force grows from footN by weight x length.
 * Panels double in vertical force, so that the bend near the foot is resolved however light the load.
 */
export function integratePart(lengthM: number, weightNPerM: number, footN: number, horizontalN: number) {
  let riseM = 0
  let spanM = 0
  let fromM = 0
  while (fromM < lengthM) {
    const stepM = weightNPerM > 0 ? 0.7 * (horizontalN + footN + weightNPerM * fromM) / weightNPerM : lengthM
    const toM = Math.min(lengthM, fromM + stepM)
    for (const { node, weight } of rule) {
      const verticalN = footN + weightNPerM * (fromM + (toM - fromM) * (1 + node) / 2)
      const tensionN = Math.hypot(horizontalN, verticalN)
      riseM += weight * (toM - fromM) / 2 * verticalN / tensionN
      spanM += weight * (toM - fromM) / 2 * horizontalN / tensionN
    }
    fromM = toM
  }
  return { riseM, spanM }
}
