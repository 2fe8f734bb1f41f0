import { useQuery } from '@tanstack/react-query'
import { Button } from '@/components/ui/button'
import { Section } from '@/components/ui/screen'
import { Failed, Waiting } from '@/components/ui/states'
import { Text } from '@/components/ui/text'
import { failureOf } from '@/lib/failure'
import { useTRPC } from '@/lib/trpc'
import { useJobDraft } from '../editing/job-draft'

/** Who is on the job, in a line. */
export function PeopleSection() {
  const { jobId } = useJobDraft()
  const about = useQuery(useTRPC().job.byId.queryOptions({ jobId }))
  return (
    <Section title="People" actions={<Button label="People of the job" href={`/jobs/${jobId}/people`} />}>
      {about.data ? (
        <Text>
          {about.data.members.map(({ name, roles }) => `${name} (${roles.join(', ') || 'no role'})`).join('; ')}
        </Text>
      ) : about.error ? (
        <Failed what="The people could not be fetched." advice={failureOf(about.error).sentence} />
      ) : (
        <Waiting what="the people" />
      )}
    </Section>
  )
}
