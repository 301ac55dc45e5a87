// The product's line icons: 24 px, drawn in the current colour. Always beside words, so always hidden from screen readers.
const paths = {
  search: 'M10.5 4a6.5 6.5 0 1 1 0 13 6.5 6.5 0 0 1 0-13Zm5 11.5L21 21',
  ask: 'M4 4h16v16H4ZM9 9.2c.2-1.5 1.4-2.4 3-2.4 1.7 0 3 1 3 2.5 0 2-2.6 2.2-2.8 4.2M12.1 16.6v.4',
  lesson: 'M4 4h16v16H4ZM8 8.5h8M8 12h8M8 15.5h4.5',
  desk: 'M3 4.5h18M12 4.5V9M8.5 8.5h7L18 11v9H6v-9ZM9.5 14.5h5',
  account: 'M12 4a3.5 3.5 0 1 1 0 7 3.5 3.5 0 0 1 0-7ZM5 20c.4-3.6 3-6 7-6s6.6 2.4 7 6Z',
  kits: 'M12 3v18M3 12.5l9-3.5 9 3.5M8.5 20.5 12 18.5l3.5 2',
  plans: 'M4 4h16v16H4ZM4 15.5h16M14.5 15.5V20',
  shop: 'M4 5h16v14H4ZM4 9.5h16M4 14h16M10 5v14',
  attention: 'M4 4h16v16H4ZM12 7.5v5.5M12 16v.6',
} as const

export type IconName = keyof typeof paths

/** `name` picks the drawing; `size` is in CSS pixels. */
export function Icon({ name, size = 24 }: { name: IconName, size?: number }) {
  return (
    <svg className="icon" viewBox="0 0 24 24" width={size} height={size} fill="none" stroke="currentColor" strokeWidth="2" strokeLinejoin="round" strokeLinecap="square" aria-hidden="true" focusable="false">
      <path d={paths[name]} />
    </svg>
  )
}
