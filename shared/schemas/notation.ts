import { fieldsOf, shortText } from './fields'

/** GET /api/chart-notation?text=fS.M.Sh */
export const notationQuery = fieldsOf({
  text: shortText(60, 'Seabed as the chart prints it, such as fS.M.Sh'),
}, 'A seabed in chart notation')
