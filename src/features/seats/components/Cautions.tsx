/** What a listener should know before anything goes into an ear. Shown as text: nothing is asked and nothing stored. */
export function Cautions() {
  return (
    <ul className="rows">
      <li className="py-2">
        Loud listening harms hearing. Keep it moderate, and stop at once on pain, ringing, dizziness or a
        feeling of fullness.
      </li>
      <li className="py-2">You get new tips of your own. The nozzles are wiped between listeners.</li>
      <li className="py-2">Do not take part with an ear infection or soon after surgery on an ear.</li>
    </ul>
  )
}
