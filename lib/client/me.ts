import { api } from "@/lib/client/api";
import type { Me } from "@/lib/schemas/session";
import type { DisplaySettings } from "@/lib/units/settings";

/**
 * Keeps a person's units and decimal mark. The newest version is read first: the settings belong to one person, and the last
 * choice counts.
 */
export async function saveDisplay(settings: DisplaySettings): Promise<void> {
  const me = await api.get<Me>("/me");
  await api.patch<Me>("/me", {
    ifMatch: me.etag,
    body: {
      units: settings.system === "metric" ? "mm" : "in",
      decimal: settings.decimal === "." ? "point" : "comma",
    },
  });
}
