// Made by `npm run generate` from the JSON Schema of the same name. Not to be edited.
/**
 * display: up to 8192 pixels wide; 4096 and 2048: up to that width; thumb: up to 512
 */
export type PlateVersionName = 'display' | '4096' | '2048' | 'thumb';

/**
 * Bodies of the plate routes, one member each
 */
export interface PlateBodies {
  plate?: Plate;
  platePicture?: PlatePicture;
  plateList?: PlateList;
}
/**
 * A still of the shot’s panorama
 */
export interface Plate {
  /**
   * The plate: a UUID
   */
  id: string;
  /**
   * Its shot: a UUID
   */
  shotId: string;
  /**
   * The source frame at which it stands
   */
  frame: number;
  /**
   * The name of the file that was brought
   */
  fileName: string;
  /**
   * Width of the picture that was brought, pixels
   */
  width: number;
  /**
   * Height of the picture that was brought, pixels
   */
  height: number;
  /**
   * Size of the file that was brought, bytes
   */
  bytes: number;
  /**
   * Whether the file says that it is a whole equirectangular panorama, or its 2:1 shape is all that tells
   */
  projection: 'stated' | 'assumed';
  versions: PlateVersion[];
  /**
   * When it was added: an instant, ISO 8601 in UTC
   */
  createdAt: string;
}
/**
 * The plate at one size, never larger than what was brought
 */
export interface PlateVersion {
  name: PlateVersionName;
  /**
   * Width in pixels
   */
  width: number;
  /**
   * Height in pixels
   */
  height: number;
  /**
   * Where it is served, to members of the crew
   */
  url: string;
}
/**
 * A plate as a small picture
 */
export interface PlatePicture {
  /**
   * The plate: a UUID
   */
  plateId: string;
  /**
   * Up to 512 pixels wide
   */
  thumbUrl: string;
  /**
   * Up to 2048 pixels wide
   */
  url2048: string;
}
/**
 * A shot’s plates, by frame
 */
export interface PlateList {
  items: Plate[];
}
