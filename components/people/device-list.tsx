import { Moment } from "@/components/log/moment";
import { Chip } from "@/components/ui/chip";
import { ButtonForm } from "./account-forms";
import type { FormAction } from "./form-action";

type Device = { id: string; device: string; createdAt: string; lastSeenAt: string; current: boolean };

/** Where a person is signed in, and the way to end that. */
export function DeviceList({ devices, end, endOthers }: { devices: readonly Device[]; end: FormAction; endOthers: FormAction }) {
  return (
    <>
      <ul className="divide-y divide-rule">
        {devices.map((device) => (
          <li key={device.id} className="flex flex-wrap items-center justify-between gap-x-4 gap-y-2 py-2">
            <span>
              {device.device} {device.current && <Chip tone="sound">This one</Chip>}
              <span className="block text-sm text-ink-2">
                Signed in <Moment at={device.createdAt} />, last used <Moment at={device.lastSeenAt} />
              </span>
            </span>
            {!device.current && <ButtonForm action={end} hidden={{ sessionId: device.id }} submit="Sign it out" />}
          </li>
        ))}
      </ul>
      {devices.length > 1 && (
        <div className="mt-3">
          <ButtonForm action={endOthers} submit="Sign out all but this one" />
        </div>
      )}
    </>
  );
}
