import { describe, expectTypeOf, it } from 'vitest'
import type * as z from 'zod/mini'
import type { estimatesAnswer, seabedsAnswer } from '#shared/schemas/answers/catalogue'
import type { comparisonAnswer } from '#shared/schemas/answers/comparison'
import type { fitAnswer } from '#shared/schemas/answers/fit'
import type { loadAnswer } from '#shared/schemas/answers/load'
import type { referenceBoatsAnswer } from '#shared/schemas/answers/method'
import type { modificationAnswer, modificationsAnswer, modificationWorthAnswer } from '#shared/schemas/answers/modification'
import type { notationAnswer } from '#shared/schemas/answers/notation'
import type { rankingAnswer } from '#shared/schemas/answers/ranking'
import type { designAnswer, designsAnswer, questionAnswer, seabedAnswer, trialAnswer, trialPullsAnswer, trialsAnswer } from '#shared/schemas/answers/reading'
import type { rodeAnswer } from '#shared/schemas/answers/rode'
import type { comparisonRequest } from '#shared/schemas/comparison'
import type { fitRequest } from '#shared/schemas/fit'
import type { loadRequest } from '#shared/schemas/load'
import type { modificationWorthRequest } from '#shared/schemas/modification'
import type { rankingRequest } from '#shared/schemas/ranking'
import type { rodeRequest } from '#shared/schemas/rode'
import type { readChartNotation } from '#shared/seabed/notation'
import type { EstimatesAnswer, SeabedsAnswer } from '#shared/types/catalogue'
import type { ComparisonAnswer, ComparisonRequest } from '#shared/types/comparison'
import type { FitAnswer, FitRequest } from '#shared/types/fit'
import type { LoadAnswer, LoadRequest } from '#shared/types/load'
import type { ReferenceBoatsAnswer } from '#shared/types/method'
import type { ModificationAnswer, ModificationsAnswer, ModificationWorthAnswer, ModificationWorthRequest } from '#shared/types/modification'
import type { RankingAnswer, RankingRequest } from '#shared/types/ranking'
import type { DesignAnswer, DesignsPage, PullQuestionAnswer, SeabedAnswer, TrialAnswer, TrialPullsAnswer, TrialsAnswer } from '#shared/types/reading'
import type { RodeAnswer, RodeRequest } from '#shared/types/rode'

// Checked by the compiler, not at run time: `npm run typecheck` fails where a schema and its type drift apart.
describe('schemas and types say the same', () => {
  it('of what is asked', () => {
    expectTypeOf<z.output<typeof loadRequest>>().toEqualTypeOf<LoadRequest>()
    expectTypeOf<z.output<typeof rodeRequest>>().toEqualTypeOf<RodeRequest>()
    expectTypeOf<z.output<typeof rankingRequest>>().toEqualTypeOf<RankingRequest>()
    expectTypeOf<z.output<typeof fitRequest>>().toEqualTypeOf<FitRequest>()
    expectTypeOf<z.output<typeof comparisonRequest>>().toEqualTypeOf<ComparisonRequest>()
    expectTypeOf<z.output<typeof modificationWorthRequest>>().toEqualTypeOf<ModificationWorthRequest>()
  })

  it('of what is answered', () => {
    expectTypeOf<z.output<typeof loadAnswer>>().toEqualTypeOf<LoadAnswer>()
    expectTypeOf<z.output<typeof rodeAnswer>>().toEqualTypeOf<RodeAnswer>()
    expectTypeOf<z.output<typeof rankingAnswer>>().toEqualTypeOf<RankingAnswer>()
    expectTypeOf<z.output<typeof fitAnswer>>().toEqualTypeOf<FitAnswer>()
    expectTypeOf<z.output<typeof comparisonAnswer>>().toEqualTypeOf<ComparisonAnswer>()
    expectTypeOf<z.output<typeof modificationsAnswer>>().toEqualTypeOf<ModificationsAnswer>()
    expectTypeOf<z.output<typeof modificationAnswer>>().toEqualTypeOf<ModificationAnswer>()
    expectTypeOf<z.output<typeof modificationWorthAnswer>>().toEqualTypeOf<ModificationWorthAnswer>()
    expectTypeOf<z.output<typeof notationAnswer>>().toEqualTypeOf<ReturnType<typeof readChartNotation>>()
    expectTypeOf<z.output<typeof designsAnswer>>().toEqualTypeOf<DesignsPage>()
    expectTypeOf<z.output<typeof designAnswer>>().toEqualTypeOf<DesignAnswer>()
    expectTypeOf<z.output<typeof seabedAnswer>>().toEqualTypeOf<SeabedAnswer>()
    expectTypeOf<z.output<typeof trialsAnswer>>().toEqualTypeOf<TrialsAnswer>()
    expectTypeOf<z.output<typeof trialAnswer>>().toEqualTypeOf<TrialAnswer>()
    expectTypeOf<z.output<typeof trialPullsAnswer>>().toEqualTypeOf<TrialPullsAnswer>()
    expectTypeOf<z.output<typeof questionAnswer>>().toEqualTypeOf<PullQuestionAnswer>()
    expectTypeOf<z.output<typeof seabedsAnswer>>().toEqualTypeOf<SeabedsAnswer>()
    expectTypeOf<z.output<typeof referenceBoatsAnswer>>().toEqualTypeOf<ReferenceBoatsAnswer>()
    expectTypeOf<z.output<typeof estimatesAnswer>>().toEqualTypeOf<EstimatesAnswer>()
  })
})
