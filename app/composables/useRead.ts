/**
 * Reads an answer of the API for a page, rendered with it. What the API refuses becomes the error page with the same status.
 *
 * @param path address with its query
 */
export async function useRead<Answer>(path: string) {
  const { data, error } = await useAsyncData(`read:${path}`, () => $fetch<Answer>(path, { retry: 0 }) as Promise<Answer>, { deep: false })
  if (error.value || data.value === undefined || data.value === null) {
    const status = (error.value as { statusCode?: number } | undefined)?.statusCode
    throw createError({ statusCode: status && status >= 400 ? status : 500, fatal: true })
  }
  return data.value as Answer
}
