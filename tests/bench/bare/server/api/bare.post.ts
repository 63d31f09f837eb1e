import { defineEventHandler, readBody } from 'h3'

// Reads a JSON body and sends one of as many bytes as BARE_BYTES says.
const filler = JSON.parse(`{"text":"${'x'.repeat(Math.max(0, Number(process.env.BARE_BYTES ?? 1000) - 11))}"}`) as { text: string }

export default defineEventHandler(async (event) => {
  await readBody(event)
  return filler
})
