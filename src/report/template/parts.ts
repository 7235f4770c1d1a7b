import type { BlockContent } from 'mdast'
import type { Audit } from '../../audit/audit.ts'
import { approachPart } from '../parts/approach.ts'
import { arithmeticPart } from '../parts/arithmetic.ts'
import { budgetCheckPart } from '../parts/budget-check.ts'
import { claimPart } from '../parts/claim.ts'
import { findingPart } from '../parts/finding.ts'
import { findingsPart } from '../parts/findings.ts'
import { notesPart } from '../parts/notes.ts'
import { premisePart } from '../parts/premise.ts'
import { provenancePart } from '../parts/provenance.ts'
import { referencesPart } from '../parts/references.ts'
import { secondWindowPart } from '../parts/second-window.ts'
import { surveyPart } from '../parts/survey.ts'
import { todayPart } from '../parts/today.ts'
import { tracksPart } from '../parts/tracks.ts'
import { warningsPart } from '../parts/warnings.ts'

/** What `::part{of="…"}` may name. To add one, write a file in ../parts/ and a row here. */
export const PARTS: Readonly<Record<string, (audit: Audit) => BlockContent[]>> = {
  approach: approachPart,
  arithmetic: arithmeticPart,
  budget_check: budgetCheckPart,
  claim: claimPart,
  finding: findingPart,
  findings: findingsPart,
  notes: notesPart,
  premise: premisePart,
  provenance: provenancePart,
  references: referencesPart,
  second_window: secondWindowPart,
  survey: surveyPart,
  today: todayPart,
  tracks: tracksPart,
  warnings: warningsPart,
}
