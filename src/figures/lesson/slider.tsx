import { useId } from 'react';

/** A labeled range input with its value in words beside. */
export function Slider(props: {
  label: string;
  value: number;
  min: number;
  max: number;
  step: number;
  text: string;
  onChange: (value: number) => void;
}) {
  const id = useId();
  const { label, value, min, max, step, text, onChange } = props;
  return (
    <div className="mb-3">
      <label htmlFor={id} className="flex justify-between gap-4 font-semibold">
        <span>{label}</span>
        <span className="tabular-nums">{text}</span>
      </label>
      <input
        id={id}
        type="range"
        className="h-8 w-full accent-dye"
        min={min}
        max={max}
        step={step}
        value={value}
        aria-valuetext={text}
        onChange={(event) => onChange(event.target.valueAsNumber)}
      />
    </div>
  );
}
