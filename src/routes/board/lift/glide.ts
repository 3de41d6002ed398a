const GLIDE_MS = 170;

/** A picture of the carried card, where it is now; it stays until it has glided. */
export function leaveBehind(card: HTMLElement | null): HTMLElement | null {
  if (!card?.firstElementChild || matchMedia('(prefers-reduced-motion: reduce)').matches)
    return null;
  const picture = card.cloneNode(true);
  if (!(picture instanceof HTMLElement)) return null;
  picture.dataset.glides = '';
  card.after(picture);
  return picture;
}

/** Lets that picture glide to where the batch stands now; it fades on the way. */
export function glide(picture: HTMLElement | null, batchId: string): void {
  const card = picture?.firstElementChild;
  if (!picture || !card) return;
  const place = document.querySelector(`[data-batch="${CSS.escape(batchId)}"]`);
  const to = place?.getBoundingClientRect();
  const from = card.getBoundingClientRect();
  const way = to ? `translate(${to.left - from.left}px, ${to.top - from.top}px) ` : '';
  const motion = picture.animate(
    { transform: `${way}${picture.style.transform}`, opacity: 0 },
    { duration: GLIDE_MS, easing: 'cubic-bezier(0.2, 0.8, 0.2, 1)', fill: 'forwards' },
  );
  const away = () => picture.remove();
  motion.finished.then(away, away);
}
