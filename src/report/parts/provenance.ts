import type { BlockContent, PhrasingContent } from 'mdast'
import type { Audit } from '../../audit/audit.ts'
import { paragraph } from '../nodes.ts'

/** What made this report, when, and from which file. */
export function provenancePart(audit: Audit): BlockContent[] {
  return [
    paragraph(
      `Made on ${audit.made_on.slice(0, 10)} by Datestone ${audit.datestone} from the claim file `,
      { type: 'inlineCode', value: audit.file },
      ', SHA-256 ',
      { type: 'inlineCode', value: audit.input_sha256 },
      ...audit.attachments.flatMap(besides),
      '. The audit’s JSON form holds every figure unrounded.',
    ),
  ]
}

function besides({ path, sha256 }: Audit['attachments'][number]): (PhrasingContent | string)[] {
  return [
    '; beside it ',
    { type: 'inlineCode', value: path },
    ', SHA-256 ',
    { type: 'inlineCode', value: sha256 },
  ]
}
