export { drawOnFilm } from './drawOnFilm';
export { FilmPen, letterHeight, type FilmContext } from './FilmPen';
export { drawingsLayout, wrapWords } from './layout';
