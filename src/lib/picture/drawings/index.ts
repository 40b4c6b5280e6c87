export { drawOnFilm } from './drawOnFilm';
export { FilmPen, letterHeight, type FilmContext } from './FilmPen';
export { layOutDrawings, fieldInSafeBand, overlap, type Field, type PlacedWords } from './layout';
export { wrapWords } from './wrapWords';
