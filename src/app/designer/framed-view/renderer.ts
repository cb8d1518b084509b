import {
  BufferAttribute,
  BufferGeometry,
  ClampToEdgeWrapping,
  GLSL3,
  LinearFilter,
  LinearMipmapLinearFilter,
  LinearSRGBColorSpace,
  Mesh,
  NoColorSpace,
  OrthographicCamera,
  RepeatWrapping,
  Scene,
  ShaderMaterial,
  Texture,
  Vector2,
  Vector4,
  WebGLRenderer,
} from 'three';

import { radiusAtAngle } from '#shared/projection/general-perspective';
import { type View } from '#shared/render/picture';
import { type Drawer } from './drawer';
import { FRAGMENT, VERTEX } from './shader';

/**
 * Draws the framed picture by WebGL. It takes values and keeps none of the application's: a plate, a view.
 *
 * Colours pass through as bytes: the texture is not decoded, the output not encoded, so the file's tones are kept.
 */
export class FramedRenderer implements Drawer {
  readonly #renderer: WebGLRenderer;
  readonly #scene = new Scene();
  readonly #camera = new OrthographicCamera();
  readonly #texture = new Texture();
  readonly #material: ShaderMaterial;
  readonly #orientation = new Vector4(0, 0, 0, 1);
  readonly #halfSize = new Vector2(1, 1);

  /** @throws Error where the browser gives no WebGL2 context */
  constructor(canvas: HTMLCanvasElement) {
    this.#renderer = new WebGLRenderer({
      canvas,
      antialias: false,
      alpha: false,
      powerPreference: 'high-performance',
    });
    this.#renderer.outputColorSpace = LinearSRGBColorSpace;
    const texture = this.#texture;
    texture.colorSpace = NoColorSpace;
    texture.flipY = false;
    texture.wrapS = RepeatWrapping;
    texture.wrapT = ClampToEdgeWrapping;
    texture.magFilter = LinearFilter;
    texture.minFilter = LinearMipmapLinearFilter;
    this.#material = new ShaderMaterial({
      glslVersion: GLSL3,
      vertexShader: VERTEX,
      fragmentShader: FRAGMENT,
      depthTest: false,
      toneMapped: false,
      uniforms: {
        plate: { value: texture },
        orientation: { value: this.#orientation },
        halfSize: { value: this.#halfSize },
        eye: { value: 0 },
        texelsPerRadian: { value: 1 },
      },
    });
    const triangle = new BufferGeometry();
    triangle.setAttribute(
      'position',
      new BufferAttribute(new Float32Array([-1, -1, 0, 3, -1, 0, -1, 3, 0]), 3),
    );
    const mesh = new Mesh(triangle, this.#material);
    mesh.frustumCulled = false;
    this.#scene.add(mesh);
  }

  get largestPicture(): number {
    return this.#renderer.capabilities.maxTextureSize;
  }

  async setPlate(picture: ImageBitmap): Promise<void> {
    this.#texture.dispose();
    this.#texture.image = picture;
    this.#texture.needsUpdate = true;
    this.#material.uniforms['texelsPerRadian'].value = picture.width / (2 * Math.PI);
  }

  draw({ orientation, fovRad, eye, width, height }: View): void {
    this.#renderer.setSize(width, height, false);
    this.#orientation.fromArray(orientation);
    const halfWidth = radiusAtAngle(fovRad / 2, eye);
    this.#halfSize.set(halfWidth, (halfWidth * height) / width);
    this.#material.uniforms['eye'].value = eye;
    this.#renderer.render(this.#scene, this.#camera);
  }

  dispose(): void {
    this.#texture.dispose();
    this.#material.dispose();
    this.#renderer.dispose();
  }
}
