import { buttonClass } from '@/components/ui/button-class';
import type { OwnWorkshop } from '@/lib/schemas/account';

/** One of the person's workshops, with the way into it. */
export function WorkshopRow({
  workshop: { id, name, role },
  isHere,
}: {
  workshop: OwnWorkshop;
  isHere: boolean;
}) {
  return (
    <form
      method="post"
      action="/api/account/workshop"
      className="flex flex-wrap items-center justify-between gap-x-4 gap-y-1"
    >
      <p>
        <span className="font-semibold">{name}</span>, {role}
        {isHere && <span className="text-ink-2">, where you are now</span>}
      </p>
      {!isHere && (
        <button name="workshop" value={id} className={buttonClass('plain')}>
          Change to {name}
        </button>
      )}
    </form>
  );
}
