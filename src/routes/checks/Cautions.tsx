const CAUTIONS = [
  'Hot wort burns and shatters cold glass. Carry a full glass carboy in a crate, never in wet hands.',
  'Fermentation gives off carbon dioxide, which lies low: open the door of a cellar, closet or chest freezer before leaning in. 5000 ppm over eight hours is the common workplace limit. A gas burner indoors gives carbon monoxide.',
  'Never seal what may still ferment. Lid on, blow-off tube of 25 mm or more over a large or hoppy cake, never a blocked airlock. Jars: lid loose, open them cold, eyes covered. Release the pressure of a vessel before opening it.',
  'A hopped, infected, diastatic or enzyme-treated cake can make the packaged beer over-carbonate and burst.',
  'Cleaners: cover eyes and hands, never mix them (bleach with acid makes chlorine), air the room. Oxygen: no oil, no flame. Wet hands: a residual-current device on the circuit.',
  'An allergen of any earlier beer of the chain is in this one, whatever the dilution.',
  'Spent hops and dumped cake are dangerous to dogs.',
  "The maker's instructions and local codes go first. Where a licence is needed to brew or sell, the licensed brewer decides.",
];

export function Cautions() {
  return (
    <section aria-labelledby="cautions" className="mt-12">
      <h2 id="cautions" className="text-[1.75rem] leading-tight">
        Cautions
      </h2>
      <ul className="mt-4 max-w-3xl list-disc space-y-2 pl-5 text-touch">
        {CAUTIONS.map((caution) => (
          <li key={caution}>{caution}</li>
        ))}
      </ul>
    </section>
  );
}
