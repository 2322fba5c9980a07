// Words in the picture: FRONT, LEFT, RIGHT and the name of the hardpoint that is meant. Painted in the shipped fonts.

import { CanvasTexture, Group, LinearFilter, Sprite, SpriteMaterial, SRGBColorSpace } from "three";
import { dyedSteel, font } from "../../../ui/theme/tokens.ts";
import { labelIsShown } from "../labelPlaces.ts";
import { LABEL, MARK } from "../markLook.ts";
import type { Label } from "../parts.ts";
import { PAINT } from "../tones.ts";
import type { Vec3 } from "../vectors.ts";
import type { ViewBasis } from "../viewpoint.ts";
import type { Layer } from "./layer.ts";
import { MARK_ORDER } from "./marks.ts";

/** Texels a pixel: sharp on the densest phones. */
const SHARPNESS = 3;
const PAD = 4;

export interface Naming {
  readonly name: string;
  readonly point: Vec3;
}

export interface LabelsLayer extends Layer {
  readonly name: (naming: Naming | null) => void;
}

interface PaintedText {
  readonly sprite: Sprite;
  readonly widthPx: number;
  readonly heightPx: number;
}

export function createLabels(): LabelsLayer {
  const object = new Group();
  const signs = new Map<Label["text"], PaintedText>();
  let named: (PaintedText & { readonly text: string }) | null = null;
  let labels: readonly Label[] = [];
  let last: { basis: ViewBasis; pxPerMm: number } | null = null;

  const see = (basis: ViewBasis, pxPerMm: number) => {
    last = { basis, pxPerMm };
    for (const label of labels) {
      const sign = signs.get(label.text);
      if (!sign) continue;
      sign.sprite.visible = labelIsShown(label, basis.towards);
      sizeSprite(sign, pxPerMm);
    }
    if (named) sizeSprite(named, pxPerMm);
  };
  const seeAgain = () => last && see(last.basis, last.pxPerMm);

  return {
    object,
    draw: (model) => {
      labels = model.labels;
      for (const sign of signs.values()) sign.sprite.visible = false;
      for (const label of labels) {
        const sign = signs.get(label.text) ?? addSign(object, signs, label);
        sign.sprite.position.set(...label.point);
      }
      seeAgain();
    },
    name: (naming) => {
      if (named && named.text !== naming?.name) {
        object.remove(named.sprite);
        disposeSprite(named.sprite);
        named = null;
      }
      if (naming === null) return;
      if (named === null) {
        named = { ...paintName(naming.name), text: naming.name };
        object.add(named.sprite);
      }
      named.sprite.position.set(...naming.point);
      seeAgain();
    },
    see,
    dispose: () => {
      for (const { sprite } of signs.values()) disposeSprite(sprite);
      if (named) disposeSprite(named.sprite);
    },
  };
}

function addSign(parent: Group, signs: Map<Label["text"], PaintedText>, label: Label): PaintedText {
  const sign = paintText(label.text, {
    font: `600 ${LABEL.sizePx}px ${font.head}`,
    ink: PAINT[label.tone],
    halo: true,
  });
  // The words hang below their place.
  sign.sprite.center.set(0.5, 0.5 + LABEL.belowPx / sign.heightPx);
  signs.set(label.text, sign);
  parent.add(sign.sprite);
  return sign;
}

function paintName(name: string): PaintedText {
  const text = paintText(name, {
    font: `600 ${LABEL.sizePx}px ${font.text}`,
    ink: dyedSteel.ink,
    panel: dyedSteel.panel,
  });
  // Above the mark, clear of it.
  text.sprite.center.set(0.5, -(MARK.chosenDiameter / 2 + 2) / text.heightPx);
  text.sprite.renderOrder = MARK_ORDER + 2;
  return text;
}

interface TextStyle {
  readonly font: string;
  readonly ink: string;
  readonly halo?: boolean;
  readonly panel?: string;
}

function paintText(text: string, style: TextStyle): PaintedText {
  const canvas = document.createElement("canvas");
  const context = canvas.getContext("2d");
  if (!context) return { sprite: new Sprite(), widthPx: 1, heightPx: 1 };
  context.font = style.font;
  const widthPx = Math.ceil(context.measureText(text).width) + 4 * PAD;
  const heightPx = Math.ceil(LABEL.sizePx * 1.2) + 2 * PAD;
  canvas.width = widthPx * SHARPNESS;
  canvas.height = heightPx * SHARPNESS;
  context.scale(SHARPNESS, SHARPNESS);
  // Setting a canvas's size forgets its font.
  context.font = style.font;
  context.textAlign = "center";
  context.textBaseline = "middle";
  if (style.panel) {
    context.fillStyle = style.panel;
    context.fillRect(0, 0, widthPx, heightPx);
    context.strokeStyle = dyedSteel.edge;
    context.strokeRect(0.5, 0.5, widthPx - 1, heightPx - 1);
  }
  if (style.halo) {
    context.lineJoin = "round";
    context.lineWidth = 4;
    context.strokeStyle = dyedSteel.ground;
    context.strokeText(text, widthPx / 2, heightPx / 2 + 1);
  }
  context.fillStyle = style.ink;
  context.fillText(text, widthPx / 2, heightPx / 2 + 1);
  return { sprite: spriteOf(canvas), widthPx, heightPx };
}

function spriteOf(canvas: HTMLCanvasElement): Sprite {
  const texture = new CanvasTexture(canvas);
  texture.colorSpace = SRGBColorSpace;
  texture.minFilter = LinearFilter;
  texture.generateMipmaps = false;
  const material = new SpriteMaterial({
    map: texture,
    transparent: true,
    depthTest: false,
    depthWrite: false,
    fog: false,
  });
  const sprite = new Sprite(material);
  sprite.renderOrder = MARK_ORDER + 1;
  return sprite;
}

function sizeSprite({ sprite, widthPx, heightPx }: PaintedText, pxPerMm: number): void {
  sprite.scale.set(widthPx / pxPerMm, heightPx / pxPerMm, 1);
}

function disposeSprite(sprite: Sprite): void {
  sprite.material.map?.dispose();
  sprite.material.dispose();
}
