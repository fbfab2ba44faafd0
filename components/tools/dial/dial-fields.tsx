import { SelectField } from '@/components/ui/select-field';
import { TextField } from '@/components/ui/text-field';
import { dialBounds, type DialSettings } from '@/geometry/dial/settings';
import { NumberField } from '../number-field';

const choices = {
  quantity: [
    { value: 'frequency', label: 'frequency' },
    { value: 'wavelength', label: 'wavelength' },
    { value: 'capacitance', label: 'capacitance' },
  ],
  form: [
    { value: 'round', label: 'round' },
    { value: 'straight', label: 'straight, by a cord' },
  ],
  moves: [
    { value: 'pointer', label: 'a pointer over the scale' },
    { value: 'scale', label: 'the scale under a fixed line' },
  ],
  turning: [
    { value: 'clockwise', label: 'clockwise' },
    { value: 'anticlockwise', label: 'anticlockwise' },
  ],
  sliding: [
    { value: 'clockwise', label: 'to the right' },
    { value: 'anticlockwise', label: 'to the left' },
  ],
  place: [
    { value: 'upper', label: 'the upper half' },
    { value: 'lower', label: 'the lower half' },
    { value: 'open', label: 'from a bearing of the open stop' },
  ],
} as const;

const DEGREE = Math.PI / 180;

/** What is asked of a dial. */
export function DialFields({
  settings,
  onChange,
}: {
  settings: DialSettings;
  onChange: (change: Partial<DialSettings>) => void;
}) {
  const number = (key: keyof typeof dialBounds, label: string) => (
    <NumberField
      label={label}
      value={settings[key]}
      min={dialBounds[key][0]}
      max={dialBounds[key][1]}
      onChange={(value) => onChange({ [key]: value })}
    />
  );
  const round = settings.form === 'round';
  return (
    <div className="grid grid-cols-1 gap-3 min-[26rem]:grid-cols-2">
      <SelectField
        label="Marks"
        value={settings.quantity}
        options={choices.quantity}
        onChange={(quantity) => onChange({ quantity })}
      />
      <SelectField
        label="Scale"
        value={settings.form}
        options={choices.form}
        onChange={(form) => onChange({ form })}
      />
      <SelectField
        label="What moves"
        value={settings.moves}
        options={choices.moves}
        onChange={(moves) => onChange({ moves })}
      />
      <SelectField
        label={round ? 'It turns, meshing' : 'It goes, meshing'}
        value={settings.sense}
        options={round ? choices.turning : choices.sliding}
        onChange={(sense) => onChange({ sense })}
      />
      {number('ratio', 'Turns for one of the shaft')}
      {round ? (
        <>
          {number('radius', 'Outer radius, mm')}
          {number('hole', 'Hole for the shaft, mm')}
          <SelectField
            label="The scale lies in"
            value={settings.place}
            options={choices.place}
            onChange={(place) => onChange({ place })}
          />
          {settings.place === 'open' && (
            <NumberField
              label="Open stop, ° clockwise from the top"
              value={settings.open / DEGREE}
              min={0}
              max={360}
              onChange={(degrees) => onChange({ open: degrees * DEGREE })}
            />
          )}
        </>
      ) : (
        number('drum', 'Drum, mm round')
      )}
      <TextField
        label="Lettering"
        value={settings.title}
        maxLength={40}
        autoComplete="off"
        onChange={(title) => onChange({ title })}
      />
    </div>
  );
}
