export interface DesignName { slug: string, name: string }

/** Every design by name, for the choice of the reader's own; none while the catalogue cannot be read. */
export function useDesigns() {
  return useAsyncData('designs', async (): Promise<DesignName[]> => {
    try {
      return (await $fetch<{ designs: DesignName[] }>('/api/design-names')).designs
    }
    catch {
      return []
    }
  }, { default: () => [] })
}
