'use client';

import { type RefObject, useLayoutEffect, useState } from 'react';

const normalTextSize = 16;

/**
 * The width of an element in drawing units, sixteenths of a rem, so that drawings grow with the text:
 * CSS pixels at normal text size. Null until it has been measured.
 */
export function useWidth(element: RefObject<HTMLElement | null>): number | null {
  const [width, setWidth] = useState<number | null>(null);
  useLayoutEffect(() => {
    const node = element.current;
    if (!node) return;
    const measure = () => {
      const textSize = Number.parseFloat(getComputedStyle(document.documentElement).fontSize);
      setWidth(Math.max(1, Math.round((node.clientWidth * normalTextSize) / textSize)));
    };
    measure();
    const observer = new ResizeObserver(measure);
    observer.observe(node);
    return () => observer.disconnect();
  }, [element]);
  return width;
}

/** A length in drawing units as CSS. */
export const inRem = (units: number): string => `${units / normalTextSize}rem`;
