import { SheetPart } from './SheetPart.tsx';

/** What can hurt somebody on a brew day, each in one sentence. */
const CAUTIONS = [
  'Hot wort burns and shatters cold glass; carry a full carboy in a crate, never in wet hands.',
  'Fermentation gives off carbon dioxide, which lies low: open the door before leaning in; a gas burner indoors gives carbon monoxide.',
  'Never seal what may still ferment: blow-off tube of 25 mm or more over a large or hoppy cake, jars with the lid loose, opened cold and with eyes covered.',
  'A hopped, infected, diastatic or enzyme-treated cake can make the packaged beer over-carbonate and burst.',
  'Cover eyes and hands from cleaners and never mix them; keep oxygen from oil and flame; with wet hands, a residual-current device on the circuit.',
  "The makers' instructions and local codes go first; where a licence is needed, the licensed brewer decides.",
];

export function SheetCautions() {
  return (
    <SheetPart title="Cautions">
      <ul className="list-disc pl-[1.2em] text-[0.94em] leading-[1.25]">
        {CAUTIONS.map((caution) => (
          <li key={caution}>{caution}</li>
        ))}
      </ul>
    </SheetPart>
  );
}
