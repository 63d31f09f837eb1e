import { defineNitroPlugin } from 'nitropack/runtime'
import { toProblem } from '../utils/errors'
import { sendProblem, showsPage } from '../utils/problem'

/** One translator for every error, the framework's own included; only a browser's page load gets the rendered error page. */
export default defineNitroPlugin((nitro) => {
  const render = nitro.h3App.options.onError
  nitro.h3App.options.onError = async (error, event) => {
    if (render && showsPage(event, toProblem(error).problem.statusCode)) return render(error, event)
    nitro.captureError(error, { event, tags: ['request'] })
    await sendProblem(event, error)
  }
})
