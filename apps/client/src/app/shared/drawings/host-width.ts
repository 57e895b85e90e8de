import {
  afterNextRender,
  DestroyRef,
  ElementRef,
  inject,
  type Signal,
  signal,
} from '@angular/core';

const NARROWEST = 240;

/** Width of the component's own element, so that a drawing can be made for the room it has and keeps its lettering readable. */
export function hostWidth(fallback = 720): Signal<number> {
  const host = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
  const destroyed = inject(DestroyRef);
  const width = signal(fallback);
  afterNextRender(() => {
    if (typeof ResizeObserver === 'undefined') return;
    const observer = new ResizeObserver(([entry]) => {
      const room = Math.round(entry?.contentRect.width ?? 0);
      // a hidden drawing has no room and keeps its shape
      if (room > 0) width.set(Math.max(NARROWEST, room));
    });
    observer.observe(host);
    destroyed.onDestroy(() => observer.disconnect());
  });
  return width.asReadonly();
}
