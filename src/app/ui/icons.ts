import { type MatIconRegistry } from '@angular/material/icon';
import { type DomSanitizer } from '@angular/platform-browser';
import {
  mdiAccountCircleOutline,
  mdiAlertOutline,
  mdiArrowLeft,
  mdiArrowExpandHorizontal,
  mdiCheck,
  mdiChevronDown,
  mdiClose,
  mdiContentSaveOutline,
  mdiDeleteOutline,
  mdiDownloadOutline,
  mdiEyeOutline,
  mdiFileUploadOutline,
  mdiFitToPageOutline,
  mdiFlagOutline,
  mdiFlagPlusOutline,
  mdiGrid,
  mdiImageOutline,
  mdiImagePlusOutline,
  mdiKeyboardOutline,
  mdiLogout,
  mdiMagnifyMinusOutline,
  mdiMagnifyPlusOutline,
  mdiMapOutline,
  mdiPause,
  mdiPencilOutline,
  mdiPlay,
  mdiPlus,
  mdiRedo,
  mdiSkipBackward,
  mdiSkipForward,
  mdiStepBackward,
  mdiStepForward,
  mdiUndo,
} from '@mdi/js';

/** The pictures that buttons use, by the name that `<mat-icon svgIcon="…">` takes. */
const ICONS: Readonly<Record<string, string>> = {
  account: mdiAccountCircleOutline,
  add: mdiPlus,
  alert: mdiAlertOutline,
  back: mdiArrowLeft,
  chart: mdiMapOutline,
  check: mdiCheck,
  close: mdiClose,
  delete: mdiDeleteOutline,
  down: mdiChevronDown,
  download: mdiDownloadOutline,
  edit: mdiPencilOutline,
  fit: mdiFitToPageOutline,
  flag: mdiFlagOutline,
  grid: mdiGrid,
  key: mdiFlagPlusOutline,
  keyboard: mdiKeyboardOutline,
  'let-go': mdiClose,
  look: mdiEyeOutline,
  open: mdiFileUploadOutline,
  pause: mdiPause,
  picture: mdiImageOutline,
  'picture-add': mdiImagePlusOutline,
  play: mdiPlay,
  redo: mdiRedo,
  save: mdiContentSaveOutline,
  'sign-out': mdiLogout,
  'skip-back': mdiSkipBackward,
  'skip-forward': mdiSkipForward,
  'step-back': mdiStepBackward,
  'step-forward': mdiStepForward,
  undo: mdiUndo,
  widen: mdiArrowExpandHorizontal,
  'zoom-in': mdiMagnifyPlusOutline,
  'zoom-out': mdiMagnifyMinusOutline,
};

/** Icons are literals, not requests: no flash, no font, and they pass the content security policy. */
export function registerIcons(registry: MatIconRegistry, sanitizer: DomSanitizer): void {
  for (const [name, path] of Object.entries(ICONS)) {
    const svg = `<svg viewBox="0 0 24 24"><path d="${path}"/></svg>`;
    registry.addSvgIconLiteral(name, sanitizer.bypassSecurityTrustHtml(svg));
  }
}
