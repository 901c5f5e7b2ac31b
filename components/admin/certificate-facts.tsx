import { BoxedFacts, Fact } from '@/components/ui/boxed-facts'
import { Attention } from '@/components/ui/notice'
import { dayDateYear, localTimeWithOffset } from '@/lib/views/format'
import type { CertificateView } from '@/lib/views/administration'
import type { Moment } from '@/lib/views/sheet'

/** The certificate that seals papers, and in words what its kind of issuer means to a reader. */
export function CertificateFacts({ view }: { view: CertificateView }) {
  return (
    <>
      <BoxedFacts columns="2fr 2fr 1fr">
        <Fact caption="Subject" whole>
          {view.subject}
        </Fact>
        <Fact caption="Issued by" whole>
          {view.issuer}
        </Fact>
        <Fact caption="State">
          {view.state === 'in-force' && 'In force'}
          {view.state === 'ended' && <Attention>Ended: no paper can be sealed</Attention>}
          {view.state === 'not-yet' && <Attention>Not in force yet</Attention>}
        </Fact>
        <Fact caption="Valid from">{time(view.validFrom)}</Fact>
        <Fact caption="Valid to">{time(view.validTo)}</Fact>
        <Fact caption="Serial" whole>
          <span className="fig break-all">{view.serial}</span>
        </Fact>
      </BoxedFacts>
      <p className="mt-3 max-w-[70ch] text-long">
        {view.selfIssued
          ? 'This installation issued its certificate to itself, from a root it made at its first start. A PDF reader says that the file is unaltered, and that it does not know who signed it until that root is added to its trusted ones. Compare the serial by telephone before trusting it.'
          : 'Somebody else vouches for this certificate. A PDF reader that trusts the issuer says so by itself.'}
      </p>
      <p className="mt-2 max-w-[70ch] text-mute">
        It seals the file. It is not a vet’s signature: the approval stands in the paper as content, with the
        signer’s name, registration and time.
      </p>
    </>
  )
}

function time({ ms, zone }: Moment): string {
  return `${dayDateYear(ms, zone)}, ${localTimeWithOffset(ms, zone)}`
}
