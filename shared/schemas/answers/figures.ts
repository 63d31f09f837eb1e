import * as z from 'zod/mini'
import { fieldsOf } from '../fields'

/** A figure of an answer, its unit ('' for none) in the description. */
export const figure = (unit: string, description: string) => z.number().check(z.describe(unit ? `${description} (${unit})` : description))
export const count = (description: string) => z.int().check(z.minimum(0), z.describe(description))
export const words = (description: string) => z.string().check(z.describe(description))
export const list = <T extends z.core.SomeType>(element: T, description: string) => z.array(element).check(z.describe(description))
export const flag = (description: string) => z.boolean().check(z.describe(description))

export const share = fieldsOf({
  mean: figure('', 'Mean'),
  low90: figure('', 'Lower end of the 90 % interval'),
  high90: figure('', 'Upper end of the 90 % interval'),
  n: count('Count behind it'),
}, 'A share from counts, beta-binomial')

export const interval = fieldsOf({
  median: figure('N', 'Median'),
  low90: figure('N', 'Lower end of the 90 % interval'),
  high90: figure('N', 'Upper end of the 90 % interval'),
}, 'Holding of a flat pull')
