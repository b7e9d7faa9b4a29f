"use client";

import type { AnchorHTMLAttributes, MouseEvent } from "react";

/** A link within the sets: the page stays, since all of them are one; with a key held or without script it is a link like any other. */
export function SetLink({ href, onClick, ...rest }: AnchorHTMLAttributes<HTMLAnchorElement> & { href: string }) {
  const follow = (event: MouseEvent<HTMLAnchorElement>) => {
    onClick?.(event);
    if (event.defaultPrevented || event.button !== 0 || event.metaKey || event.ctrlKey || event.shiftKey || event.altKey) return;
    event.preventDefault();
    goTo(href);
  };
  return <a href={href} onClick={follow} {...rest} />;
}

/** Another place of the sets, with the focus on its beginning as after a page load. */
export function goTo(address: string): void {
  window.history.pushState(null, "", address);
  window.scrollTo(0, 0);
  document.getElementById("main")?.focus({ preventScroll: true });
}

/** The same by a choice on the page, which keeps the focus, so that arrow keys can go on. */
export function goByChoice(address: string): void {
  window.history.pushState(null, "", address);
}
