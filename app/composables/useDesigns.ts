export interface DesignName { slug: string, name: string }

/** Every design by name, for the choice of the reader's own; none while the catalogue cannot be read. */
export function useDesigns() {
  return useAsyncData('designs', async (): Promise<DesignName[]> => {
    try {
      const { designs } = await $fetch<{ designs: DesignName[] }>('/api/designs')
      return designs.map(({ slug, name }) => ({ slug, name }))
    }
    catch {
      return []
    }
  }, { default: () => [] })
}
