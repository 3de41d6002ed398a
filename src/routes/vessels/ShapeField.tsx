import { useController } from 'react-hook-form';
import { VESSEL_SHAPES } from '#shared/api/vessel.ts';
import { SHAPE_WORDS } from '../../app/traitWords.ts';
import { Vessel } from '../../components/drawn/Vessel.tsx';

/** The silhouette in which its batches are drawn. */
export function ShapeField() {
  const { field } = useController({ name: 'shape' });
  return (
    <fieldset>
      <legend className="mb-1 font-semibold">Shape</legend>
      <div className="grid grid-cols-4 gap-2">
        {VESSEL_SHAPES.map((shape, index) => (
          <label
            key={shape}
            className="flex flex-col items-center gap-1.5 rounded-field border-[1.5px] border-edge bg-white px-1 pt-4 pb-2 text-small has-checked:border-bottle has-checked:bg-bottle-l has-checked:font-semibold has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-bottle"
          >
            <input
              type="radio"
              name="shape"
              className="sr-only"
              ref={index === 0 ? field.ref : undefined}
              checked={field.value === shape}
              onChange={() => field.onChange(shape)}
            />
            <Vessel shape={shape} srm={null} fill={0} cake={null} stage="racked" width={44} />
            {SHAPE_WORDS[shape]}
          </label>
        ))}
      </div>
    </fieldset>
  );
}
