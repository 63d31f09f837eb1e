import { readQuery, writeQuery } from '~/utils/plan/typed'
import type { Query } from '~/utils/plan/typed'
import { choiceKeys, quantityKeys, windageKeyList } from '~/utils/plan/words'

const planKeys: ReadonlySet<string> = new Set<string>([...quantityKeys, ...choiceKeys, ...windageKeyList, ...windageKeyList.map(key => `${key}cd`), 'bed', 'share', 'own'])

/** True where an address says anything of a plan: any word of it is enough, the rest says what it says at first. */
export const carriesPlan = (query: Query): boolean => Object.keys(query).some(key => planKeys.has(key))

/** The plan of an address as `/plan` writes it, nothing else of the address; empty where it carries none. */
export const carriedPlan = (query: Query): Record<string, string | string[]> => carriesPlan(query) ? writeQuery(readQuery(query)) : {}
