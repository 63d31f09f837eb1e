import { setResponseHeader, setResponseHeaders } from 'h3'
import { defineNitroPlugin } from 'nitropack/runtime'
import { isInternal } from '../utils/address'
import { safeHeaders } from '../utils/headers'
import { requestId } from '../utils/request'

/** Before anything else happens to a request: the headers that every response carries, and its name. */
export default defineNitroPlugin((nitro) => {
  nitro.hooks.hook('request', (event) => {
    setResponseHeaders(event, safeHeaders)
    if (!isInternal(event)) setResponseHeader(event, 'X-Request-Id', requestId(event))
  })
})
