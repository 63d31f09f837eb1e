/** Alive: says nothing about the database. */
export default defineEventHandler((event) => {
  setHeader(event, 'Cache-Control', 'no-store')
  return { alive: true }
})
