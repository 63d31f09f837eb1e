import { getRouterParam, type H3Event } from 'h3'
import { notFound } from './problem'

/**
 * The name in an address such as /api/modifications/{slug}.
 *
 * @throws ApiError 404 where it has not the form of a name: nothing can be called that
 */
export function slugOf(event: H3Event): string {
  const slug = getRouterParam(event, 'slug') ?? ''
  if (slug.length > 80 || !/^[a-z0-9]+(?:-[a-z0-9]+)*$/.test(slug)) throw notFound()
  return slug
}
