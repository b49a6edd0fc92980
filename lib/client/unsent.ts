import { deviceId } from "./person";
import { PhoneStore } from "./store/phone-store";

/** How many entries and photos of a person wait on this device for the server, over all their fleets. */
export async function countUnsent(userId: string, fleetIds: readonly string[]): Promise<number> {
  const counts = await Promise.all(
    fleetIds.map(async (fleetId) => {
      const store = new PhoneStore(userId, fleetId, deviceId());
      const [events, photos] = await Promise.all([store.unsentEvents(), store.unsentPhotos()]);
      return events.length + photos.length;
    }),
  );
  return counts.reduce((sum, count) => sum + count, 0);
}
