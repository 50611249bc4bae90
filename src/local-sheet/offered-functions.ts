import type { IDescriptionService } from "@univerjs/preset-sheets-core";

/** A list that is not cut: the engine's editor takes `slice(0, 10)` of what it offers. */
class UncutList<Item> extends Array<Item> {
  override slice(): Item[] {
    return Array.from(this);
  }
}

/** Offers every function of ours under a half-typed name, where the engine would stop after ten. */
export function offerAllFunctions(service: IDescriptionService, namespace: string): void {
  const search = service.getSearchListByNameFirstLetter.bind(service);
  service.getSearchListByNameFirstLetter = (text) => {
    const found = search(text);
    return text.trim().toUpperCase().startsWith(`${namespace}.`) ? UncutList.from(found) : found;
  };
}
