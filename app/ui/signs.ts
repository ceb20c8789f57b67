/*
 * The signs: own drawings on a 24-unit grid, stroke 2, one colour. A sign never stands without its word.
 */
export const SIGNS = {
  level:
    '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M12 2v5"/><path fill="currentColor" stroke="none" d="M8.6 7h6.8l.6 3.2-4 6.6-4-6.6z"/><path d="M4 18.2h5.2M14.8 18.2H20M12 18.6V22"/></g>',
  "not-level":
    '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M7 2v5"/><path fill="currentColor" stroke="none" d="M3.6 7h6.8l.6 3.2-4 6.6-4-6.6z"/><path d="M12.5 18.2H22M17.2 13.6v9"/></g>',
  void: '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M2 15h6.2l2.6-6.5M22 9h-6.2l-2.6 6.5"/></g>',
  hold: '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><circle cx="9.2" cy="11.6" r="6.6"/><circle cx="9.2" cy="11.6" r="1.5" fill="currentColor" stroke="none"/><path fill="currentColor" stroke="none" d="M13.2 20.2c3.2-1.4 4.2-4.2 4.2-8h2.4c.8 0 1.2.5 1.2 1.2v6.8z"/><path d="M2 21h20"/></g>',
  drop: '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M12 2v1.6M12 7v1.6M2.5 16h19M16.4 11.4l-8.8 9.2"/></g>',
  "control-mark":
    '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><circle cx="12" cy="12" r="6.5"/><path d="M12 1.5v7M12 15.5v7M1.5 12h7M15.5 12h7"/></g>',
  "tape-tie":
    '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><circle cx="4.5" cy="19.5" r="2.3"/><circle cx="19.5" cy="19.5" r="2.3"/><path d="M5.6 17.2L11 7.4M18.4 17.2L13 7.4M8.4 5h7.2M12 1.4v7.2"/></g>',
  tacked:
    '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M3 8.4V4h18v4.4M3 15.6V20h18v-4.4M3 12h18" stroke-width="1.6"/><path stroke-width="5.4" d="M7 12h.8M16.2 12h.8"/></g>',
  welded:
    '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M3 6.4V3h18v3.4M3 17.6V21h18v-3.4" stroke-width="1.6"/><path d="M4.2 8.8c2.4 1.6 2.4 4.8 0 6.4M8.4 8.8c2.4 1.6 2.4 4.8 0 6.4M12.6 8.8c2.4 1.6 2.4 4.8 0 6.4M16.8 8.8c2.4 1.6 2.4 4.8 0 6.4"/></g>',
  torque:
    '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M12 8.2l3.9 2.25v4.5L12 17.2l-3.9-2.25v-4.5z"/><path d="M4.4 17.8A9.6 9.6 0 1 1 20.6 16"/><path d="M22.6 12.2l-1.9 4.2-4.2-1.8"/></g>',
  "scan-tag":
    '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M8.5 2h7L20 6.5V22H4V6.5z"/><circle cx="12" cy="5.6" r="1.2" fill="currentColor" stroke="none"/><path fill="currentColor" stroke="none" d="M7 10h4v4H7zM13 10h4v4h-4zM7 16h4v4H7zM13 16h1.7v1.7H13zM15.3 18.3H17V20h-1.7z"/></g>',
  person:
    '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><circle cx="12" cy="14" r="8.500"/><circle cx="12" cy="3" r="1.900" stroke-width="1.800"/><circle cx="12" cy="11.600" r="2.300" fill="currentColor" stroke="none"/><path d="M7.800 18.400c.4-2.300 1.900-3.200 4.200-3.200s3.800.9 4.200 3.200"/></g>',
  "person-on-it":
    '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M2 2.200h20" stroke-width="3"/><path d="M12 3v4"/><circle cx="12" cy="14.600" r="7.600"/><circle cx="12" cy="12.600" r="2.100" fill="currentColor" stroke="none"/><path d="M8.400 18.400c.4-2 1.600-2.700 3.600-2.700s3.200.7 3.600 2.700"/></g>',
  yard: '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M2 9V4h6M22 9V4h-6"/><path d="M8 2v4M16 2v4"/><path d="M4 13.500h.01M9.300 13.500h.01M14.700 13.500h.01M20 13.500h.01M6.600 18h.01M12 18h.01M17.400 18h.01" stroke-width="2.600"/><path d="M2 22h20"/></g>',
  bay: '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M4 22V3h16v19" stroke-width="2.600"/><path d="M9.500 16h5M9.500 20h5" stroke-width="1.600"/></g>',
  vehicle:
    '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M8.400 2h7.200c1.300 0 1.900.8 1.900 2v16.500c0 .9-.6 1.500-1.500 1.500H8c-.9 0-1.500-.6-1.500-1.500V4c0-1.200.6-2 1.900-2z"/><path d="M8.500 10l1-2.200h5l1 2.200M8.500 13.800h7"/><path d="M4 5v4M20 5v4M4 15.500v4M20 15.500v4"/></g>',
  "spring-flat":
    '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><circle cx="3.500" cy="8.700" r="2" stroke-width="1.800"/><circle cx="20.500" cy="8.700" r="2" stroke-width="1.800"/><path d="M3.500 10.700h17M5.500 13.700h13M8.500 16.700h7"/></g>',
  "spring-arched":
    '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><circle cx="3.500" cy="6.500" r="2" stroke-width="1.800"/><circle cx="20.500" cy="6.500" r="2" stroke-width="1.800"/><path d="M3.500 8.500c4.600 6 12.400 6 17 0M5.700 13.200c3.700 4 8.900 4 12.600 0M8.800 17.800c2 1.400 4.400 1.400 6.400 0"/></g>',
  shackle:
    '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M2 2h12"/><circle cx="8" cy="6" r="1.300" fill="currentColor" stroke="none"/><circle cx="15.500" cy="17.500" r="1.300" fill="currentColor" stroke="none"/><path d="M4.800 8.200a3.900 3.900 0 0 1 6.400-4.400l7.500 11.500a3.900 3.900 0 0 1-6.400 4.400z"/><path d="M2 22c4 0 7-.6 10-2" stroke-width="1.800"/></g>',
  photo:
    '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M3 6.500h18V21H3z"/><path d="M8.500 3.200h7v5h-7z" fill="currentColor" stroke-width="1"/><path d="M5.500 17.500l4.300-4.300 3.200 3.200 2.200-2.200 3.300 3.300" stroke-width="1.800"/></g>',
  "call-foreman":
    '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M6.500 21.500c0-4 2-5.500 5.500-5.500s5.500 1.500 5.500 5.500z"/><circle cx="12" cy="11.600" r="2.700" fill="currentColor" stroke="none"/><path d="M6.900 15.400a6.300 6.300 0 0 1 0-7.600M17.100 15.400a6.300 6.300 0 0 0 0-7.600M3.700 17.600a10.600 10.600 0 0 1 0-12M20.300 17.600a10.600 10.600 0 0 0 0-12"/></g>',
  unsent:
    '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M3 4h5.500M15.500 4H21"/><path d="M12 21.500V10M7.500 14L12 9.500l4.500 4.500"/><path d="M10.300 2.500l3.400 3M13.700 2.500l-3.400 3" stroke-width="1.700"/></g>',
  sent: '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M3 4h18"/><path d="M12 21.500V8.500M7.500 12.700L12 8.200l4.500 4.500"/></g>',
  live: '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M12 2v6"/><path fill="currentColor" stroke="none" d="M8.6 8h6.8l.6 3.2-4 6.6-4-6.6z"/><path d="M5.200 12.500c-.6 2.300-.3 4.600 1 6.700M18.800 12.500c.6 2.300.3 4.600-1 6.700" stroke-width="1.800"/></g>',
  stale:
    '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M8 2v3M8 8.200v.9"/><path fill="currentColor" stroke="none" transform="translate(11.500 16.600) rotate(-76)" d="M-4 -6.500h8l.7 3.800L0 6.500l-4.700-9.200z"/><path d="M2 21.800h20"/></g>',
  approve:
    '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M3 15.500C5.200 9.500 8 4 9.700 4c2 0-2.500 11.500-.7 11.500 1.500 0 2.200-5 3.700-5s-.6 4.700 1 4.700c1.200 0 1.600-2.400 2.700-2.400s.6 2.200 4.600 1.500"/><path d="M3 20.500h18"/></g>',
  question:
    '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M7 7.800C7 4.600 9 2.500 12.200 2.500S17.500 4.500 17.500 7.300c0 3.700-5.300 4.200-5.300 8.200"/><path stroke-width="3" d="M12.200 20.600v.01"/></g>',
  undo: '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M8 3.500L3.500 8 8 12.500"/><path d="M4 8h9.500a6.200 6.200 0 0 1 0 12.500H7"/></g>',
  move: '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M3 4v16M21 4v16"/><path d="M6.500 12h10M12.800 8l4 4-4 4"/></g>',
  split:
    '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M9 7H2.500v10H9M15 7h6.500v10H15"/><path d="M12 2.500v3.200M12 10.400v3.200M12 18.300v3.200"/></g>',
  lock: '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M4 11h16v10.500H4z"/><path d="M7.500 11V7a4.500 4.500 0 0 1 9 0v4"/><path d="M12 15v2.500"/></g>',
  promise:
    '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M5 3l7 14.500L19 3" /><path d="M3 21h18"/></g>',
  plan: '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path stroke-width="3.600" d="M4 5.500h6M8 12h8M14 18.500h6"/><path d="M12 1.500v1.500M12 21v1.500M4 18.500h4M16 5.500h4" stroke-width="1.600"/></g>',
  stand:
    '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M9 3h6M12 3v7M10 10h4l4.500 11h-13zM7.600 16h8.800"/></g>',
  up: '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M12 20V5M6 11l6-6 6 6M5 22.500h14"/></g>',
  leave:
    '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M5 9h14M5 15h14"/></g>',
  kept: '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M4 5h16v14H4zM8 5v5h8V5M9 15h6"/></g>',
  wipe: '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M9 5h12v14H9l-6-7zM12.500 9l5 6M17.500 9l-5 6"/></g>',
  pin: '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M12 13v9M7 13h10l-2-4V3H9v6z"/></g>',
  caution:
    '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M12 3l10 18H2zM12 10v5M12 18v.2"/></g>',
  same: '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M3 9c3-3 6-3 9 0s6 3 9 0M3 16c3-3 6-3 9 0s6 3 9 0"/></g>',
  holes:
    '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M2 4h20"/><circle cx="5" cy="14" r="2.5"/><circle cx="12" cy="14" r="2.5"/><circle cx="19" cy="14" r="2.5" fill="currentColor" stroke="none"/></g>',
  turn: '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M4 9h14l-3-4M20 15H6l3 4"/></g>',
  start:
    '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M7 4l12 8-12 8z"/></g>',
  pause:
    '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M8 4v16M16 4v16"/></g>',
  finish:
    '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M4 13l5 6L20 5"/></g>',
  off: '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M4 12h6M14 12h6M12 4v6M12 14v6"/><path d="M17 4l3-2M18.500 7.500l3.500.5"/></g>',
  todo: '<g fill="none" stroke="currentColor" stroke-width="2" stroke-linecap="round" stroke-linejoin="round"><path d="M7 12h10M12 7v10" stroke-dasharray="2 3"/></g>',
} as const;
export type SignName = keyof typeof SIGNS;
