type Fields = Record<string, string | number | boolean | null | undefined>

function write(level: 'info' | 'warn' | 'error', message: string, fields: Fields) {
  const line = JSON.stringify({ at: new Date().toISOString(), level, message, ...fields })
  if (level === 'info') console.log(line)
  else console.error(line)
}

/** One JSON object a line. Never hand it a secret, a body or an address of a database. */
export const log = {
  info: (message: string, fields: Fields = {}) => write('info', message, fields),
  warn: (message: string, fields: Fields = {}) => write('warn', message, fields),
  error: (message: string, fields: Fields = {}) => write('error', message, fields),
}
