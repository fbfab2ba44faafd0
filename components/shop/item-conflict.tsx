import { Button } from '@/components/ui/button';
import { DifferenceTable } from '@/components/ui/difference-table';
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
      <DifferenceTable rows={rows} theirName={theirs.updatedBy.name} />
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
