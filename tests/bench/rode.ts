// Catenary solves a second: grounded, clear of the bottom, and chain with rope.
import { solveRode } from '../../shared/rode/catenary'
import { median, printTable } from './table.mjs'

const cases = {
  'chain, part on the bottom': { heightM: 10, horizontalLoadN: 1000, chain: { lengthM: 60, weightNPerM: 11.9 } },
  'chain, clear of the bottom': { heightM: 10, horizontalLoadN: 5000, chain: { lengthM: 40, weightNPerM: 11.9 } },
  'chain and rope, clear of the bottom': { heightM: 12, horizontalLoadN: 3000, chain: { lengthM: 10, weightNPerM: 11.9 }, rope: { lengthM: 60, weightNPerM: 0.12 } },
}
const solves = 20_000

const rows = Object.entries(cases).map(([name, input]) => {
  const rounds = Array.from({ length: 7 }, (_, round) => {
    const began = performance.now()
    // The load changes a little every time, so that nothing can be remembered.
    for (let i = 0; i < solves; i++) solveRode({ ...input, horizontalLoadN: input.horizontalLoadN * (1 + (i + round) * 1e-7) })
    return (performance.now() - began) * 1000 / solves
  })
  const microseconds = median(rounds)
  return { 'rode': name, 'µs a solve': microseconds.toFixed(2), 'solves/s': Math.round(1e6 / microseconds) }
})
printTable('Catenary (aim: under 20 µs)', rows)
