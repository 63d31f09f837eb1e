import type { RankingRequest } from '#shared/types/ranking'
import { meanAndGust } from '#shared/load/gust'
import type { ElevationLabels } from '~/utils/drawing/labels'
import type { PlanFigures } from '~/utils/plan/answer'
import { describeRode } from '~/utils/drawing/describe'
import { layElevation, narrowSheet, wideSheet } from '~/utils/drawing/elevation'
import type { ElevationInput } from '~/utils/drawing/elevation'
import { useShow } from '~/composables/useShow'

/** The drawing of a plan: laid out for wide and narrow paper, with its labels, its sentence and its table. */
export function useElevation(figures: () => PlanFigures, request: () => RankingRequest) {
  const show = useShow()
  const rode = computed(() => figures().plan.rode)

  const input = computed<ElevationInput | null>(() => {
    const { plan } = figures()
    const { rode: wanted, seabeds } = request()
    return rode.value && {
      curve: rode.value.curve,
      heightM: plan.heightM,
      waterM: plan.heightM - plan.boat.bowHeightM,
      chainM: wanted.chain.lengthM,
      ropeM: wanted.rope?.lengthM ?? 0,
      snubberM: wanted.snubber?.lengthM ?? 0,
      groundedM: rode.value.groundedChainM + rode.value.groundedRopeM,
      shankAngleDeg: rode.value.shankAngleDeg,
      boat: plan.boat,
      seabeds,
    }
  })

  const wind = computed(() => {
    const { meanMs, gustMs } = meanAndGust(request().wind)
    return `${show.speed(gustMs)} of gusts (mean ${show.speed(meanMs)})`
  })

  const labels = computed<ElevationLabels | null>(() => {
    const { plan } = figures()
    const answer = rode.value
    if (!answer) return null
    const { meanMs, gustMs } = meanAndGust(request().wind)
    const lyingM = answer.groundedChainM + answer.groundedRopeM
    return {
      load: show.force(plan.load.survey.totalN ?? 0),
      wind: `mean ${show.speed(meanMs)}, gusting ${show.speed(gustMs)}`,
      depth: `${show.length(plan.heightM - plan.boat.bowHeightM)}`,
      onBottom: `${show.length(lyingM, 0)} on the bottom`,
      span: `${show.length(answer.spanM, 0)} from anchor to bow`,
      shank: lyingM > 0 || answer.shankAngleDeg < 0.05 ? 'Shank flat' : `Shank lifted ${show.degrees(answer.shankAngleDeg)}`,
      keeps: `keeps ${answer.upliftFactor > 0.995 ? 'all' : show.percent(answer.upliftFactor)} of its holding`,
    }
  })

  return {
    show, rode, labels,
    wide: computed(() => input.value && layElevation(input.value, wideSheet)),
    narrow: computed(() => input.value && layElevation(input.value, narrowSheet)),
    sentence: computed(() => rode.value && describeRode(rode.value, wind.value, show)),
  }
}
