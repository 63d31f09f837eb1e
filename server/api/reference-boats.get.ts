import { referenceBoats } from '../services/referenceBoats'
import { apiHandler } from '../utils/handler'

/** Three reference boats, what the wind asks of them and the smallest sizes that serve: the table on /method. */
export default apiHandler(() => referenceBoats())
