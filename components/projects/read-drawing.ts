import type { ReadDrawing } from './drawing';

/** How drawing files are read; null while nothing reads them, and then beginning from a file is not offered. */
export const readDrawing: ReadDrawing | null = null;
