/** The signs, drawn on a 20 px square with a 1.5 px line. */
export const iconPaths = {
  plus: 'M10 4v12M4 10h12',
  minus: 'M4 10h12',
  close: 'M5 5l10 10M15 5L5 15',
  check: 'M4 10.5l4 4L16 5.5',
  alert: 'M10 3.2L18 16.8H2ZM10 8v4M10 14.2v.3',
  note: 'M10 2.8a7.2 7.2 0 1 1 0 14.4a7.2 7.2 0 1 1 0-14.4M10 9v5M10 6v.3',
  next: 'M3.5 10h13M11.5 5l5 5l-5 5',
  back: 'M16.5 10h-13M8.5 5l-5 5l5 5',
  up: 'M10 16.5v-13M5 8.5l5-5l5 5',
  down: 'M10 3.5v13M5 11.5l5 5l5-5',
  unfold: 'M7.5 5l5 5l-5 5',
  choose: 'M5 7.5l5 5l5-5',
  copy: 'M7.5 7.5h9v9h-9ZM12.5 7.5v-4h-9v9h4',
  print: 'M5.5 8V3h9v5M5.5 14.5h-2v-6.5h13v6.5h-2M5.5 12h9v5h-9Z',
  phone: 'M5.5 2.5h9v15h-9ZM8.5 15h3',
  key: 'M6.5 6.5a3.5 3.5 0 1 1 0 7a3.5 3.5 0 1 1 0-7M10 10h7.5v3M14.5 10v2.5',
  clock: 'M10 2.8a7.2 7.2 0 1 1 0 14.4a7.2 7.2 0 1 1 0-14.4M10 6v4.2l3 1.8',
  save: 'M10 3v9.5M6 8.8l4 4l4-4M3.5 16.5h13',
} as const

export type IconName = keyof typeof iconPaths
