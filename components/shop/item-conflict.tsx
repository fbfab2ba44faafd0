import { Button } from '@/components/ui/button';
import { LocalTime } from '@/components/ui/local-time';
import type { SaveShopItem } from '@/components/api/shop';
import type { ShopItem, ShopKind } from '@/lib/schemas/shop';
import { shopKinds, writtenValue } from './kinds';

/** Somebody saved the same machine or sheet meanwhile: theirs beside yours, to choose from. */
export function ItemConflict({
  kind,
  mine,
  theirs,
  isDisabled,
  onTake,
  onOverwrite,
}: {
  kind: ShopKind;
  mine: Pick<SaveShopItem, 'name' | 'values'>;
  theirs: ShopItem;
  isDisabled: boolean;
  onTake: () => void;
  onOverwrite: () => void;
}) {
  const { parameters } = shopKinds[kind];
  const rows = Object.entries(parameters)
    .filter(([key]) => mine.values[key] !== theirs.values[key])
    .map(([key, parameter]) => ({
      label: parameter.label,
      mine: writtenValue(parameter, mine.values[key]!),
      theirs: writtenValue(parameter, theirs.values[key]!),
    }));
  if (mine.name !== theirs.name) {
    rows.unshift({ label: 'Name', mine: mine.name, theirs: theirs.name });
  }
  return (
    <section
      role="alert"
      aria-label="Changed meanwhile"
      className="flex flex-col gap-3 border-l-4 border-warn bg-warn-tint px-3 py-2"
    >
      <p>
        {theirs.updatedBy.name} has changed it since you opened it, at{' '}
        <LocalTime iso={theirs.updatedAt} />. Nothing is saved of yours yet.
      </p>
      <table className="dense w-full text-left">
        <thead>
          <tr className="border-b border-line text-small text-ink-2">
            <th scope="col" className="py-1 pr-3 font-semibold">
              Differs in
            </th>
            <th scope="col" className="py-1 pr-3 font-semibold">
              Yours
            </th>
            <th scope="col" className="py-1 font-semibold">
              {theirs.updatedBy.name}
            </th>
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={row.label} className="border-b border-line">
              <th scope="row" className="py-1 pr-3 font-normal">
                {row.label}
              </th>
              <td className="py-1 pr-3">{row.mine}</td>
              <td className="py-1">{row.theirs}</td>
            </tr>
          ))}
          {rows.length === 0 && (
            <tr>
              <td colSpan={3} className="py-2">
                Nothing: both hold the same values.
              </td>
            </tr>
          )}
        </tbody>
      </table>
      <div className="flex flex-wrap justify-end gap-2">
        <Button isDisabled={isDisabled} onPress={onTake}>
          Take theirs
        </Button>
        <Button look="danger" isDisabled={isDisabled} onPress={onOverwrite}>
          Save mine over it
        </Button>
      </div>
    </section>
  );
}
