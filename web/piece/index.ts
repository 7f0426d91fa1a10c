export { Piece } from './Piece.tsx';
