// Takes what the engine offers for a reading that can be read in more than one way; draws a button for each.
// row.ts and site.ts come next.

import { make, show } from "./dom";
import type { Offer } from "./shapes";

export function drawOffers(place: Element, offers: readonly Offer[], take: (offer: Offer) => void): void {
  place.replaceChildren(
    ...offers.map((offer) => {
      const words = [offer.text, offer.unit, offer.reference].filter(Boolean).join(" ");
      const button = make("button", words, { type: "button" });
      button.addEventListener("click", () => take(offer));
      return button;
    }),
  );
  show(place, offers.length > 0);
}
