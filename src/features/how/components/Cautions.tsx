/** The cautions that the product shows. */
export function Cautions() {
  return (
    <>
      <h2 className="heading">Before you put anything in your ears</h2>
      <div className="reading mt-3">
        <p>
          Loud listening harms hearing. Stop on pain, ringing, dizziness or a feeling of fullness, and tell
          the steward; nobody needs a reason to stop.
        </p>
        <p>
          Take new tips for each listener and wipe the nozzles between. Do not take part with an ear infection
          or after recent ear surgery. Scrim asks nobody about it and stores nothing about it.
        </p>
        <p>Scrim tests no hearing and claims nothing about anyone’s hearing.</p>
        <p>
          Rules on disclosure, on paid listeners and on data protection differ by place. Scrim keeps the
          record; local law and qualified advice decide what you must publish, pay or keep.
        </p>
      </div>
    </>
  )
}
