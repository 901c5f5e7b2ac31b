/** The desk's number: the only one a shipper is given. */
export function RingDesk({ name, telephone, hours }: { name: string; telephone: string; hours: string }) {
  return (
    <section aria-labelledby="ring">
      <h3 id="ring" className="text-sub">
        Ring
      </h3>
      <a
        href={`tel:${telephone.replace(/[^+\d]/g, '')}`}
        className="link fig touch inline-flex items-center text-section font-semibold"
      >
        {telephone}
      </a>
      <p>
        Desk, {name}, {hours}
      </p>
    </section>
  )
}
