import type { PropsWithChildren } from 'react';
import { createPortal } from 'react-dom';
import { usePhoneActions } from './project-context';

/** A page's own action in the phone's bar, beside the dots; nothing from 700 on, where the page's head has it. */
export function PhoneActions({ children }: PropsWithChildren) {
  const place = usePhoneActions();
  return place ? createPortal(children, place) : null;
}
