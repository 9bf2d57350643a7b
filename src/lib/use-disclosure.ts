import { useEffect, useRef, useState } from 'react';

/** A panel that a button opens. Escape and a press outside close it; Escape gives the focus back to the button. */
export function useDisclosure() {
  const [isOpen, setIsOpen] = useState(false);
  const frame = useRef<HTMLDivElement>(null);
  const button = useRef<HTMLButtonElement>(null);
  useEffect(() => {
    if (!isOpen) return;
    const onKey = (event: KeyboardEvent) => {
      if (event.key !== 'Escape') return;
      setIsOpen(false);
      button.current?.focus();
    };
    const onPress = (event: PointerEvent) => {
      if (event.target instanceof Node && !frame.current?.contains(event.target)) setIsOpen(false);
    };
    document.addEventListener('keydown', onKey);
    document.addEventListener('pointerdown', onPress);
    return () => {
      document.removeEventListener('keydown', onKey);
      document.removeEventListener('pointerdown', onPress);
    };
  }, [isOpen]);
  return { isOpen, frame, button, toggle: () => setIsOpen((was) => !was), close: () => setIsOpen(false) };
}
