// Made by `npm run generate` from the JSON Schema of the same name. Not to be edited.
// @ts-nocheck: machine-made code; its type is stated at the end.
import { type SchemaValidator } from '../schema-validator';
import { type ShotBodies } from './shots';

var __getOwnPropNames = Object.getOwnPropertyNames;
var __commonJS = (cb, mod) => function() {
  try {
    return mod || (0, cb[__getOwnPropNames(cb)[0]])((mod = { exports: {} }).exports, mod), mod.exports;
  } catch (e) {
    throw mod = 0, e;
  }
};

// node_modules/ajv/dist/runtime/ucs2length.js
var require_ucs2length = __commonJS({
  "node_modules/ajv/dist/runtime/ucs2length.js"(exports) {
    "use strict";
    Object.defineProperty(exports, "__esModule", { value: !0 });
    function ucs2length(str) {
      let len = str.length, length = 0, pos = 0, value;
      for (; pos < len; )
        length++, value = str.charCodeAt(pos++), value >= 55296 && value <= 56319 && pos < len && (value = str.charCodeAt(pos), (value & 64512) === 56320 && pos++);
      return length;
    }
    exports.default = ucs2length;
    ucs2length.code = 'require("ajv/dist/runtime/ucs2length").default';
  }
});

// <stdin>
var machineMade = validate20;
var schema40 = { type: "object", description: "A shot to be made; what is left out: the whole shot at its own speed, levelled, no seam", additionalProperties: !1, required: ["title", "rate", "frames", "source"], properties: { title: { type: "string", maxLength: 200, pattern: "\\S", description: "One line, not blank; 1 to 200 signs" }, rate: { type: "object", description: "Frame rate as a fraction, frames a second; at most 1,000", additionalProperties: !1, required: ["num", "den"], properties: { num: { type: "integer", minimum: 1, maximum: 1e6, description: "Numerator, frames" }, den: { type: "integer", minimum: 1, maximum: 1e6, description: "Denominator, seconds" } } }, frames: { type: "integer", minimum: 1, maximum: 1e7, description: "Length in source frames, 1 to 10,000,000" }, speed: { type: "number", minimum: 0.01, maximum: 1e4, description: "How many times faster it is delivered (6 = six times), 0.01 to 10,000" }, from: { type: "integer", minimum: 0, description: "First delivered source frame" }, to: { type: "integer", minimum: 0, description: "Last delivered source frame, included" }, start: { type: "string", maxLength: 11, description: "SMPTE timecode of source frame 0, hh:mm:ss:ff, or hh:mm:ss;ff where frames are dropped" }, dropFrame: { type: "boolean", description: "Whether the timecode drops frame numbers; only at 30000/1001 and 60000/1001" }, source: { type: "object", description: "Size of the panorama", additionalProperties: !1, required: ["width", "height"], properties: { width: { type: "integer", minimum: 16, maximum: 16384, description: "Width in pixels, 16 to 16,384" }, height: { type: "integer", minimum: 16, maximum: 16384, description: "Height in pixels, 16 to 16,384" } } }, level: { type: "array", items: { type: "number", minimum: -1, maximum: 1 }, minItems: 4, maxItems: 4, description: "Rotation from the source to the levelled world: unit quaternion x, y, z, w" }, seamYaw: { anyOf: [{ type: "number", minimum: -36e3, maximum: 36e3 }, { type: "null" }], description: "Yaw of the stitch seam in degrees, in source directions; null where it is not known" }, loops: { type: "boolean", description: "Whether the last frame leads into the first" }, exposure: { anyOf: [{ type: "number", exclusiveMinimum: 0, maximum: 86400, description: "Exposure time of a frame in seconds, over 0, to 86,400" }, { type: "null" }], description: "Exposure time of a source frame in seconds; null where it is not known" }, interval: { anyOf: [{ type: "number", exclusiveMinimum: 0, maximum: 86400, description: "Interval in seconds, over 0, to 86,400" }, { type: "null" }], description: "Real seconds from one source frame to the next; null for the frame rate\u2019s own" }, notes: { type: "string", maxLength: 2e4, description: "Free text; up to 20,000 signs" } } }, schema41 = { type: "object", description: "What to change of a shot; what is left out stays", additionalProperties: !1, required: [], properties: { title: { type: "string", maxLength: 200, pattern: "\\S", description: "One line, not blank; 1 to 200 signs" }, rate: { type: "object", description: "Frame rate as a fraction, frames a second; at most 1,000", additionalProperties: !1, required: ["num", "den"], properties: { num: { type: "integer", minimum: 1, maximum: 1e6, description: "Numerator, frames" }, den: { type: "integer", minimum: 1, maximum: 1e6, description: "Denominator, seconds" } } }, frames: { type: "integer", minimum: 1, maximum: 1e7, description: "Length in source frames, 1 to 10,000,000" }, speed: { type: "number", minimum: 0.01, maximum: 1e4, description: "How many times faster it is delivered (6 = six times), 0.01 to 10,000" }, from: { type: "integer", minimum: 0, description: "First delivered source frame" }, to: { type: "integer", minimum: 0, description: "Last delivered source frame, included" }, start: { type: "string", maxLength: 11, description: "SMPTE timecode of source frame 0, hh:mm:ss:ff, or hh:mm:ss;ff where frames are dropped" }, dropFrame: { type: "boolean", description: "Whether the timecode drops frame numbers; only at 30000/1001 and 60000/1001" }, source: { type: "object", description: "Size of the panorama", additionalProperties: !1, required: ["width", "height"], properties: { width: { type: "integer", minimum: 16, maximum: 16384, description: "Width in pixels, 16 to 16,384" }, height: { type: "integer", minimum: 16, maximum: 16384, description: "Height in pixels, 16 to 16,384" } } }, level: { type: "array", items: { type: "number", minimum: -1, maximum: 1 }, minItems: 4, maxItems: 4, description: "Rotation from the source to the levelled world: unit quaternion x, y, z, w" }, seamYaw: { anyOf: [{ type: "number", minimum: -36e3, maximum: 36e3 }, { type: "null" }], description: "Yaw of the stitch seam in degrees, in source directions; null where it is not known" }, loops: { type: "boolean", description: "Whether the last frame leads into the first" }, exposure: { anyOf: [{ type: "number", exclusiveMinimum: 0, maximum: 86400, description: "Exposure time of a frame in seconds, over 0, to 86,400" }, { type: "null" }], description: "Exposure time of a source frame in seconds; null where it is not known" }, interval: { anyOf: [{ type: "number", exclusiveMinimum: 0, maximum: 86400, description: "Interval in seconds, over 0, to 86,400" }, { type: "null" }], description: "Real seconds from one source frame to the next; null for the frame rate\u2019s own" }, notes: { type: "string", maxLength: 2e4, description: "Free text; up to 20,000 signs" } }, minProperties: 1 }, schema32 = { type: "object", description: "A shot of a shoot", additionalProperties: !1, required: ["id", "shootId", "title", "rate", "frames", "speed", "from", "to", "start", "dropFrame", "source", "level", "seamYaw", "loops", "exposure", "interval", "notes", "plateCount", "moveCount", "cover", "revision", "createdAt", "updatedAt"], properties: { id: { type: "string", description: "The shot: a UUID" }, shootId: { type: "string", description: "Its shoot: a UUID" }, title: { type: "string", maxLength: 200, pattern: "\\S", description: "One line, not blank; 1 to 200 signs" }, rate: { type: "object", description: "Frame rate as a fraction, frames a second; at most 1,000", additionalProperties: !1, required: ["num", "den"], properties: { num: { type: "integer", minimum: 1, maximum: 1e6, description: "Numerator, frames" }, den: { type: "integer", minimum: 1, maximum: 1e6, description: "Denominator, seconds" } } }, frames: { type: "integer", minimum: 1, maximum: 1e7, description: "Length in source frames, 1 to 10,000,000" }, speed: { type: "number", minimum: 0.01, maximum: 1e4, description: "How many times faster it is delivered (6 = six times), 0.01 to 10,000" }, from: { type: "integer", minimum: 0, description: "First delivered source frame" }, to: { type: "integer", minimum: 0, description: "Last delivered source frame, included" }, start: { type: "string", maxLength: 11, description: "SMPTE timecode of source frame 0, hh:mm:ss:ff, or hh:mm:ss;ff where frames are dropped" }, dropFrame: { type: "boolean", description: "Whether the timecode drops frame numbers; only at 30000/1001 and 60000/1001" }, source: { type: "object", description: "Size of the panorama", additionalProperties: !1, required: ["width", "height"], properties: { width: { type: "integer", minimum: 16, maximum: 16384, description: "Width in pixels, 16 to 16,384" }, height: { type: "integer", minimum: 16, maximum: 16384, description: "Height in pixels, 16 to 16,384" } } }, level: { type: "array", items: { type: "number", minimum: -1, maximum: 1 }, minItems: 4, maxItems: 4, description: "Rotation from the source to the levelled world: unit quaternion x, y, z, w" }, seamYaw: { anyOf: [{ type: "number", minimum: -36e3, maximum: 36e3 }, { type: "null" }], description: "Yaw of the stitch seam in degrees, in source directions; null where it is not known" }, loops: { type: "boolean", description: "Whether the last frame leads into the first" }, exposure: { anyOf: [{ type: "number", exclusiveMinimum: 0, maximum: 86400, description: "Exposure time of a frame in seconds, over 0, to 86,400" }, { type: "null" }], description: "Exposure time of a source frame in seconds; null where it is not known" }, interval: { anyOf: [{ type: "number", exclusiveMinimum: 0, maximum: 86400, description: "Interval in seconds, over 0, to 86,400" }, { type: "null" }], description: "Real seconds from one source frame to the next; null for the frame rate\u2019s own" }, notes: { type: "string", maxLength: 2e4, description: "Free text; up to 20,000 signs" }, plateCount: { type: "integer", minimum: 0, description: "Its plates: a count" }, moveCount: { type: "integer", minimum: 0, description: "Its moves: a count" }, cover: { anyOf: [{ $ref: "plates.schema.json#/$defs/PlatePicture" }, { type: "null" }], description: "A picture of it; null while there is no plate" }, revision: { type: "integer", minimum: 1, description: "A count, one more after every change; it is also the ETag" }, createdAt: { type: "string", description: "When it was made: an instant, ISO 8601 in UTC" }, updatedAt: { type: "string", description: "When it was last changed: an instant, ISO 8601 in UTC" } } };
var func1 = Object.prototype.hasOwnProperty, func2 = require_ucs2length().default, pattern4 = new RegExp("\\S", "u");
function validate21(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null, errors = 0, evaluated0 = validate21.evaluated;
  if (evaluated0.dynamicProps && (evaluated0.props = void 0), evaluated0.dynamicItems && (evaluated0.items = void 0), data && typeof data == "object" && !Array.isArray(data)) {
    if (data.id === void 0) {
      let err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "id" }, message: "must have required property 'id'" };
      vErrors === null ? vErrors = [err0] : vErrors.push(err0), errors++;
    }
    if (data.shootId === void 0) {
      let err1 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "shootId" }, message: "must have required property 'shootId'" };
      vErrors === null ? vErrors = [err1] : vErrors.push(err1), errors++;
    }
    if (data.title === void 0) {
      let err2 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "title" }, message: "must have required property 'title'" };
      vErrors === null ? vErrors = [err2] : vErrors.push(err2), errors++;
    }
    if (data.rate === void 0) {
      let err3 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "rate" }, message: "must have required property 'rate'" };
      vErrors === null ? vErrors = [err3] : vErrors.push(err3), errors++;
    }
    if (data.frames === void 0) {
      let err4 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "frames" }, message: "must have required property 'frames'" };
      vErrors === null ? vErrors = [err4] : vErrors.push(err4), errors++;
    }
    if (data.speed === void 0) {
      let err5 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "speed" }, message: "must have required property 'speed'" };
      vErrors === null ? vErrors = [err5] : vErrors.push(err5), errors++;
    }
    if (data.from === void 0) {
      let err6 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "from" }, message: "must have required property 'from'" };
      vErrors === null ? vErrors = [err6] : vErrors.push(err6), errors++;
    }
    if (data.to === void 0) {
      let err7 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "to" }, message: "must have required property 'to'" };
      vErrors === null ? vErrors = [err7] : vErrors.push(err7), errors++;
    }
    if (data.start === void 0) {
      let err8 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "start" }, message: "must have required property 'start'" };
      vErrors === null ? vErrors = [err8] : vErrors.push(err8), errors++;
    }
    if (data.dropFrame === void 0) {
      let err9 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "dropFrame" }, message: "must have required property 'dropFrame'" };
      vErrors === null ? vErrors = [err9] : vErrors.push(err9), errors++;
    }
    if (data.source === void 0) {
      let err10 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "source" }, message: "must have required property 'source'" };
      vErrors === null ? vErrors = [err10] : vErrors.push(err10), errors++;
    }
    if (data.level === void 0) {
      let err11 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "level" }, message: "must have required property 'level'" };
      vErrors === null ? vErrors = [err11] : vErrors.push(err11), errors++;
    }
    if (data.seamYaw === void 0) {
      let err12 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "seamYaw" }, message: "must have required property 'seamYaw'" };
      vErrors === null ? vErrors = [err12] : vErrors.push(err12), errors++;
    }
    if (data.loops === void 0) {
      let err13 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "loops" }, message: "must have required property 'loops'" };
      vErrors === null ? vErrors = [err13] : vErrors.push(err13), errors++;
    }
    if (data.exposure === void 0) {
      let err14 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "exposure" }, message: "must have required property 'exposure'" };
      vErrors === null ? vErrors = [err14] : vErrors.push(err14), errors++;
    }
    if (data.interval === void 0) {
      let err15 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "interval" }, message: "must have required property 'interval'" };
      vErrors === null ? vErrors = [err15] : vErrors.push(err15), errors++;
    }
    if (data.notes === void 0) {
      let err16 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "notes" }, message: "must have required property 'notes'" };
      vErrors === null ? vErrors = [err16] : vErrors.push(err16), errors++;
    }
    if (data.plateCount === void 0) {
      let err17 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "plateCount" }, message: "must have required property 'plateCount'" };
      vErrors === null ? vErrors = [err17] : vErrors.push(err17), errors++;
    }
    if (data.moveCount === void 0) {
      let err18 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "moveCount" }, message: "must have required property 'moveCount'" };
      vErrors === null ? vErrors = [err18] : vErrors.push(err18), errors++;
    }
    if (data.cover === void 0) {
      let err19 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "cover" }, message: "must have required property 'cover'" };
      vErrors === null ? vErrors = [err19] : vErrors.push(err19), errors++;
    }
    if (data.revision === void 0) {
      let err20 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "revision" }, message: "must have required property 'revision'" };
      vErrors === null ? vErrors = [err20] : vErrors.push(err20), errors++;
    }
    if (data.createdAt === void 0) {
      let err21 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "createdAt" }, message: "must have required property 'createdAt'" };
      vErrors === null ? vErrors = [err21] : vErrors.push(err21), errors++;
    }
    if (data.updatedAt === void 0) {
      let err22 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "updatedAt" }, message: "must have required property 'updatedAt'" };
      vErrors === null ? vErrors = [err22] : vErrors.push(err22), errors++;
    }
    for (let key0 in data)
      if (!func1.call(schema32.properties, key0)) {
        let err23 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        vErrors === null ? vErrors = [err23] : vErrors.push(err23), errors++;
      }
    if (data.id !== void 0 && typeof data.id != "string") {
      let err24 = { instancePath: instancePath + "/id", schemaPath: "#/properties/id/type", keyword: "type", params: { type: "string" }, message: "must be string" };
      vErrors === null ? vErrors = [err24] : vErrors.push(err24), errors++;
    }
    if (data.shootId !== void 0 && typeof data.shootId != "string") {
      let err25 = { instancePath: instancePath + "/shootId", schemaPath: "#/properties/shootId/type", keyword: "type", params: { type: "string" }, message: "must be string" };
      vErrors === null ? vErrors = [err25] : vErrors.push(err25), errors++;
    }
    if (data.title !== void 0) {
      let data2 = data.title;
      if (typeof data2 == "string") {
        if (func2(data2) > 200) {
          let err26 = { instancePath: instancePath + "/title", schemaPath: "#/properties/title/maxLength", keyword: "maxLength", params: { limit: 200 }, message: "must NOT have more than 200 characters" };
          vErrors === null ? vErrors = [err26] : vErrors.push(err26), errors++;
        }
        if (!pattern4.test(data2)) {
          let err27 = { instancePath: instancePath + "/title", schemaPath: "#/properties/title/pattern", keyword: "pattern", params: { pattern: "\\S" }, message: 'must match pattern "\\S"' };
          vErrors === null ? vErrors = [err27] : vErrors.push(err27), errors++;
        }
      } else {
        let err28 = { instancePath: instancePath + "/title", schemaPath: "#/properties/title/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        vErrors === null ? vErrors = [err28] : vErrors.push(err28), errors++;
      }
    }
    if (data.rate !== void 0) {
      let data3 = data.rate;
      if (data3 && typeof data3 == "object" && !Array.isArray(data3)) {
        if (data3.num === void 0) {
          let err29 = { instancePath: instancePath + "/rate", schemaPath: "#/properties/rate/required", keyword: "required", params: { missingProperty: "num" }, message: "must have required property 'num'" };
          vErrors === null ? vErrors = [err29] : vErrors.push(err29), errors++;
        }
        if (data3.den === void 0) {
          let err30 = { instancePath: instancePath + "/rate", schemaPath: "#/properties/rate/required", keyword: "required", params: { missingProperty: "den" }, message: "must have required property 'den'" };
          vErrors === null ? vErrors = [err30] : vErrors.push(err30), errors++;
        }
        for (let key1 in data3)
          if (!(key1 === "num" || key1 === "den")) {
            let err31 = { instancePath: instancePath + "/rate", schemaPath: "#/properties/rate/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key1 }, message: "must NOT have additional properties" };
            vErrors === null ? vErrors = [err31] : vErrors.push(err31), errors++;
          }
        if (data3.num !== void 0) {
          let data4 = data3.num;
          if (!(typeof data4 == "number" && !(data4 % 1) && !isNaN(data4) && isFinite(data4))) {
            let err32 = { instancePath: instancePath + "/rate/num", schemaPath: "#/properties/rate/properties/num/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
            vErrors === null ? vErrors = [err32] : vErrors.push(err32), errors++;
          }
          if (typeof data4 == "number" && isFinite(data4)) {
            if (data4 > 1e6 || isNaN(data4)) {
              let err33 = { instancePath: instancePath + "/rate/num", schemaPath: "#/properties/rate/properties/num/maximum", keyword: "maximum", params: { comparison: "<=", limit: 1e6 }, message: "must be <= 1000000" };
              vErrors === null ? vErrors = [err33] : vErrors.push(err33), errors++;
            }
            if (data4 < 1 || isNaN(data4)) {
              let err34 = { instancePath: instancePath + "/rate/num", schemaPath: "#/properties/rate/properties/num/minimum", keyword: "minimum", params: { comparison: ">=", limit: 1 }, message: "must be >= 1" };
              vErrors === null ? vErrors = [err34] : vErrors.push(err34), errors++;
            }
          }
        }
        if (data3.den !== void 0) {
          let data5 = data3.den;
          if (!(typeof data5 == "number" && !(data5 % 1) && !isNaN(data5) && isFinite(data5))) {
            let err35 = { instancePath: instancePath + "/rate/den", schemaPath: "#/properties/rate/properties/den/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
            vErrors === null ? vErrors = [err35] : vErrors.push(err35), errors++;
          }
          if (typeof data5 == "number" && isFinite(data5)) {
            if (data5 > 1e6 || isNaN(data5)) {
              let err36 = { instancePath: instancePath + "/rate/den", schemaPath: "#/properties/rate/properties/den/maximum", keyword: "maximum", params: { comparison: "<=", limit: 1e6 }, message: "must be <= 1000000" };
              vErrors === null ? vErrors = [err36] : vErrors.push(err36), errors++;
            }
            if (data5 < 1 || isNaN(data5)) {
              let err37 = { instancePath: instancePath + "/rate/den", schemaPath: "#/properties/rate/properties/den/minimum", keyword: "minimum", params: { comparison: ">=", limit: 1 }, message: "must be >= 1" };
              vErrors === null ? vErrors = [err37] : vErrors.push(err37), errors++;
            }
          }
        }
      } else {
        let err38 = { instancePath: instancePath + "/rate", schemaPath: "#/properties/rate/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        vErrors === null ? vErrors = [err38] : vErrors.push(err38), errors++;
      }
    }
    if (data.frames !== void 0) {
      let data6 = data.frames;
      if (!(typeof data6 == "number" && !(data6 % 1) && !isNaN(data6) && isFinite(data6))) {
        let err39 = { instancePath: instancePath + "/frames", schemaPath: "#/properties/frames/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        vErrors === null ? vErrors = [err39] : vErrors.push(err39), errors++;
      }
      if (typeof data6 == "number" && isFinite(data6)) {
        if (data6 > 1e7 || isNaN(data6)) {
          let err40 = { instancePath: instancePath + "/frames", schemaPath: "#/properties/frames/maximum", keyword: "maximum", params: { comparison: "<=", limit: 1e7 }, message: "must be <= 10000000" };
          vErrors === null ? vErrors = [err40] : vErrors.push(err40), errors++;
        }
        if (data6 < 1 || isNaN(data6)) {
          let err41 = { instancePath: instancePath + "/frames", schemaPath: "#/properties/frames/minimum", keyword: "minimum", params: { comparison: ">=", limit: 1 }, message: "must be >= 1" };
          vErrors === null ? vErrors = [err41] : vErrors.push(err41), errors++;
        }
      }
    }
    if (data.speed !== void 0) {
      let data7 = data.speed;
      if (typeof data7 == "number" && isFinite(data7)) {
        if (data7 > 1e4 || isNaN(data7)) {
          let err42 = { instancePath: instancePath + "/speed", schemaPath: "#/properties/speed/maximum", keyword: "maximum", params: { comparison: "<=", limit: 1e4 }, message: "must be <= 10000" };
          vErrors === null ? vErrors = [err42] : vErrors.push(err42), errors++;
        }
        if (data7 < 0.01 || isNaN(data7)) {
          let err43 = { instancePath: instancePath + "/speed", schemaPath: "#/properties/speed/minimum", keyword: "minimum", params: { comparison: ">=", limit: 0.01 }, message: "must be >= 0.01" };
          vErrors === null ? vErrors = [err43] : vErrors.push(err43), errors++;
        }
      } else {
        let err44 = { instancePath: instancePath + "/speed", schemaPath: "#/properties/speed/type", keyword: "type", params: { type: "number" }, message: "must be number" };
        vErrors === null ? vErrors = [err44] : vErrors.push(err44), errors++;
      }
    }
    if (data.from !== void 0) {
      let data8 = data.from;
      if (!(typeof data8 == "number" && !(data8 % 1) && !isNaN(data8) && isFinite(data8))) {
        let err45 = { instancePath: instancePath + "/from", schemaPath: "#/properties/from/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        vErrors === null ? vErrors = [err45] : vErrors.push(err45), errors++;
      }
      if (typeof data8 == "number" && isFinite(data8) && (data8 < 0 || isNaN(data8))) {
        let err46 = { instancePath: instancePath + "/from", schemaPath: "#/properties/from/minimum", keyword: "minimum", params: { comparison: ">=", limit: 0 }, message: "must be >= 0" };
        vErrors === null ? vErrors = [err46] : vErrors.push(err46), errors++;
      }
    }
    if (data.to !== void 0) {
      let data9 = data.to;
      if (!(typeof data9 == "number" && !(data9 % 1) && !isNaN(data9) && isFinite(data9))) {
        let err47 = { instancePath: instancePath + "/to", schemaPath: "#/properties/to/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        vErrors === null ? vErrors = [err47] : vErrors.push(err47), errors++;
      }
      if (typeof data9 == "number" && isFinite(data9) && (data9 < 0 || isNaN(data9))) {
        let err48 = { instancePath: instancePath + "/to", schemaPath: "#/properties/to/minimum", keyword: "minimum", params: { comparison: ">=", limit: 0 }, message: "must be >= 0" };
        vErrors === null ? vErrors = [err48] : vErrors.push(err48), errors++;
      }
    }
    if (data.start !== void 0) {
      let data10 = data.start;
      if (typeof data10 == "string") {
        if (func2(data10) > 11) {
          let err49 = { instancePath: instancePath + "/start", schemaPath: "#/properties/start/maxLength", keyword: "maxLength", params: { limit: 11 }, message: "must NOT have more than 11 characters" };
          vErrors === null ? vErrors = [err49] : vErrors.push(err49), errors++;
        }
      } else {
        let err50 = { instancePath: instancePath + "/start", schemaPath: "#/properties/start/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        vErrors === null ? vErrors = [err50] : vErrors.push(err50), errors++;
      }
    }
    if (data.dropFrame !== void 0 && typeof data.dropFrame != "boolean") {
      let err51 = { instancePath: instancePath + "/dropFrame", schemaPath: "#/properties/dropFrame/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
      vErrors === null ? vErrors = [err51] : vErrors.push(err51), errors++;
    }
    if (data.source !== void 0) {
      let data12 = data.source;
      if (data12 && typeof data12 == "object" && !Array.isArray(data12)) {
        if (data12.width === void 0) {
          let err52 = { instancePath: instancePath + "/source", schemaPath: "#/properties/source/required", keyword: "required", params: { missingProperty: "width" }, message: "must have required property 'width'" };
          vErrors === null ? vErrors = [err52] : vErrors.push(err52), errors++;
        }
        if (data12.height === void 0) {
          let err53 = { instancePath: instancePath + "/source", schemaPath: "#/properties/source/required", keyword: "required", params: { missingProperty: "height" }, message: "must have required property 'height'" };
          vErrors === null ? vErrors = [err53] : vErrors.push(err53), errors++;
        }
        for (let key2 in data12)
          if (!(key2 === "width" || key2 === "height")) {
            let err54 = { instancePath: instancePath + "/source", schemaPath: "#/properties/source/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key2 }, message: "must NOT have additional properties" };
            vErrors === null ? vErrors = [err54] : vErrors.push(err54), errors++;
          }
        if (data12.width !== void 0) {
          let data13 = data12.width;
          if (!(typeof data13 == "number" && !(data13 % 1) && !isNaN(data13) && isFinite(data13))) {
            let err55 = { instancePath: instancePath + "/source/width", schemaPath: "#/properties/source/properties/width/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
            vErrors === null ? vErrors = [err55] : vErrors.push(err55), errors++;
          }
          if (typeof data13 == "number" && isFinite(data13)) {
            if (data13 > 16384 || isNaN(data13)) {
              let err56 = { instancePath: instancePath + "/source/width", schemaPath: "#/properties/source/properties/width/maximum", keyword: "maximum", params: { comparison: "<=", limit: 16384 }, message: "must be <= 16384" };
              vErrors === null ? vErrors = [err56] : vErrors.push(err56), errors++;
            }
            if (data13 < 16 || isNaN(data13)) {
              let err57 = { instancePath: instancePath + "/source/width", schemaPath: "#/properties/source/properties/width/minimum", keyword: "minimum", params: { comparison: ">=", limit: 16 }, message: "must be >= 16" };
              vErrors === null ? vErrors = [err57] : vErrors.push(err57), errors++;
            }
          }
        }
        if (data12.height !== void 0) {
          let data14 = data12.height;
          if (!(typeof data14 == "number" && !(data14 % 1) && !isNaN(data14) && isFinite(data14))) {
            let err58 = { instancePath: instancePath + "/source/height", schemaPath: "#/properties/source/properties/height/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
            vErrors === null ? vErrors = [err58] : vErrors.push(err58), errors++;
          }
          if (typeof data14 == "number" && isFinite(data14)) {
            if (data14 > 16384 || isNaN(data14)) {
              let err59 = { instancePath: instancePath + "/source/height", schemaPath: "#/properties/source/properties/height/maximum", keyword: "maximum", params: { comparison: "<=", limit: 16384 }, message: "must be <= 16384" };
              vErrors === null ? vErrors = [err59] : vErrors.push(err59), errors++;
            }
            if (data14 < 16 || isNaN(data14)) {
              let err60 = { instancePath: instancePath + "/source/height", schemaPath: "#/properties/source/properties/height/minimum", keyword: "minimum", params: { comparison: ">=", limit: 16 }, message: "must be >= 16" };
              vErrors === null ? vErrors = [err60] : vErrors.push(err60), errors++;
            }
          }
        }
      } else {
        let err61 = { instancePath: instancePath + "/source", schemaPath: "#/properties/source/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        vErrors === null ? vErrors = [err61] : vErrors.push(err61), errors++;
      }
    }
    if (data.level !== void 0) {
      let data15 = data.level;
      if (Array.isArray(data15)) {
        if (data15.length > 4) {
          let err62 = { instancePath: instancePath + "/level", schemaPath: "#/properties/level/maxItems", keyword: "maxItems", params: { limit: 4 }, message: "must NOT have more than 4 items" };
          vErrors === null ? vErrors = [err62] : vErrors.push(err62), errors++;
        }
        if (data15.length < 4) {
          let err63 = { instancePath: instancePath + "/level", schemaPath: "#/properties/level/minItems", keyword: "minItems", params: { limit: 4 }, message: "must NOT have fewer than 4 items" };
          vErrors === null ? vErrors = [err63] : vErrors.push(err63), errors++;
        }
        let len0 = data15.length;
        for (let i0 = 0; i0 < len0; i0++) {
          let data16 = data15[i0];
          if (typeof data16 == "number" && isFinite(data16)) {
            if (data16 > 1 || isNaN(data16)) {
              let err64 = { instancePath: instancePath + "/level/" + i0, schemaPath: "#/properties/level/items/maximum", keyword: "maximum", params: { comparison: "<=", limit: 1 }, message: "must be <= 1" };
              vErrors === null ? vErrors = [err64] : vErrors.push(err64), errors++;
            }
            if (data16 < -1 || isNaN(data16)) {
              let err65 = { instancePath: instancePath + "/level/" + i0, schemaPath: "#/properties/level/items/minimum", keyword: "minimum", params: { comparison: ">=", limit: -1 }, message: "must be >= -1" };
              vErrors === null ? vErrors = [err65] : vErrors.push(err65), errors++;
            }
          } else {
            let err66 = { instancePath: instancePath + "/level/" + i0, schemaPath: "#/properties/level/items/type", keyword: "type", params: { type: "number" }, message: "must be number" };
            vErrors === null ? vErrors = [err66] : vErrors.push(err66), errors++;
          }
        }
      } else {
        let err67 = { instancePath: instancePath + "/level", schemaPath: "#/properties/level/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        vErrors === null ? vErrors = [err67] : vErrors.push(err67), errors++;
      }
    }
    if (data.seamYaw !== void 0) {
      let data17 = data.seamYaw, _errs39 = errors, valid5 = !1, _errs40 = errors;
      if (typeof data17 == "number" && isFinite(data17)) {
        if (data17 > 36e3 || isNaN(data17)) {
          let err68 = { instancePath: instancePath + "/seamYaw", schemaPath: "#/properties/seamYaw/anyOf/0/maximum", keyword: "maximum", params: { comparison: "<=", limit: 36e3 }, message: "must be <= 36000" };
          vErrors === null ? vErrors = [err68] : vErrors.push(err68), errors++;
        }
        if (data17 < -36e3 || isNaN(data17)) {
          let err69 = { instancePath: instancePath + "/seamYaw", schemaPath: "#/properties/seamYaw/anyOf/0/minimum", keyword: "minimum", params: { comparison: ">=", limit: -36e3 }, message: "must be >= -36000" };
          vErrors === null ? vErrors = [err69] : vErrors.push(err69), errors++;
        }
      } else {
        let err70 = { instancePath: instancePath + "/seamYaw", schemaPath: "#/properties/seamYaw/anyOf/0/type", keyword: "type", params: { type: "number" }, message: "must be number" };
        vErrors === null ? vErrors = [err70] : vErrors.push(err70), errors++;
      }
      var _valid0 = _errs40 === errors;
      valid5 = valid5 || _valid0;
      let _errs42 = errors;
      if (data17 !== null) {
        let err71 = { instancePath: instancePath + "/seamYaw", schemaPath: "#/properties/seamYaw/anyOf/1/type", keyword: "type", params: { type: "null" }, message: "must be null" };
        vErrors === null ? vErrors = [err71] : vErrors.push(err71), errors++;
      }
      var _valid0 = _errs42 === errors;
      if (valid5 = valid5 || _valid0, valid5)
        errors = _errs39, vErrors !== null && (_errs39 ? vErrors.length = _errs39 : vErrors = null);
      else {
        let err72 = { instancePath: instancePath + "/seamYaw", schemaPath: "#/properties/seamYaw/anyOf", keyword: "anyOf", params: {}, message: "must match a schema in anyOf" };
        vErrors === null ? vErrors = [err72] : vErrors.push(err72), errors++;
      }
    }
    if (data.loops !== void 0 && typeof data.loops != "boolean") {
      let err73 = { instancePath: instancePath + "/loops", schemaPath: "#/properties/loops/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
      vErrors === null ? vErrors = [err73] : vErrors.push(err73), errors++;
    }
    if (data.exposure !== void 0) {
      let data19 = data.exposure, _errs47 = errors, valid6 = !1, _errs48 = errors;
      if (typeof data19 == "number" && isFinite(data19)) {
        if (data19 > 86400 || isNaN(data19)) {
          let err74 = { instancePath: instancePath + "/exposure", schemaPath: "#/properties/exposure/anyOf/0/maximum", keyword: "maximum", params: { comparison: "<=", limit: 86400 }, message: "must be <= 86400" };
          vErrors === null ? vErrors = [err74] : vErrors.push(err74), errors++;
        }
        if (data19 <= 0 || isNaN(data19)) {
          let err75 = { instancePath: instancePath + "/exposure", schemaPath: "#/properties/exposure/anyOf/0/exclusiveMinimum", keyword: "exclusiveMinimum", params: { comparison: ">", limit: 0 }, message: "must be > 0" };
          vErrors === null ? vErrors = [err75] : vErrors.push(err75), errors++;
        }
      } else {
        let err76 = { instancePath: instancePath + "/exposure", schemaPath: "#/properties/exposure/anyOf/0/type", keyword: "type", params: { type: "number" }, message: "must be number" };
        vErrors === null ? vErrors = [err76] : vErrors.push(err76), errors++;
      }
      var _valid1 = _errs48 === errors;
      valid6 = valid6 || _valid1;
      let _errs50 = errors;
      if (data19 !== null) {
        let err77 = { instancePath: instancePath + "/exposure", schemaPath: "#/properties/exposure/anyOf/1/type", keyword: "type", params: { type: "null" }, message: "must be null" };
        vErrors === null ? vErrors = [err77] : vErrors.push(err77), errors++;
      }
      var _valid1 = _errs50 === errors;
      if (valid6 = valid6 || _valid1, valid6)
        errors = _errs47, vErrors !== null && (_errs47 ? vErrors.length = _errs47 : vErrors = null);
      else {
        let err78 = { instancePath: instancePath + "/exposure", schemaPath: "#/properties/exposure/anyOf", keyword: "anyOf", params: {}, message: "must match a schema in anyOf" };
        vErrors === null ? vErrors = [err78] : vErrors.push(err78), errors++;
      }
    }
    if (data.interval !== void 0) {
      let data20 = data.interval, _errs53 = errors, valid7 = !1, _errs54 = errors;
      if (typeof data20 == "number" && isFinite(data20)) {
        if (data20 > 86400 || isNaN(data20)) {
          let err79 = { instancePath: instancePath + "/interval", schemaPath: "#/properties/interval/anyOf/0/maximum", keyword: "maximum", params: { comparison: "<=", limit: 86400 }, message: "must be <= 86400" };
          vErrors === null ? vErrors = [err79] : vErrors.push(err79), errors++;
        }
        if (data20 <= 0 || isNaN(data20)) {
          let err80 = { instancePath: instancePath + "/interval", schemaPath: "#/properties/interval/anyOf/0/exclusiveMinimum", keyword: "exclusiveMinimum", params: { comparison: ">", limit: 0 }, message: "must be > 0" };
          vErrors === null ? vErrors = [err80] : vErrors.push(err80), errors++;
        }
      } else {
        let err81 = { instancePath: instancePath + "/interval", schemaPath: "#/properties/interval/anyOf/0/type", keyword: "type", params: { type: "number" }, message: "must be number" };
        vErrors === null ? vErrors = [err81] : vErrors.push(err81), errors++;
      }
      var _valid2 = _errs54 === errors;
      valid7 = valid7 || _valid2;
      let _errs56 = errors;
      if (data20 !== null) {
        let err82 = { instancePath: instancePath + "/interval", schemaPath: "#/properties/interval/anyOf/1/type", keyword: "type", params: { type: "null" }, message: "must be null" };
        vErrors === null ? vErrors = [err82] : vErrors.push(err82), errors++;
      }
      var _valid2 = _errs56 === errors;
      if (valid7 = valid7 || _valid2, valid7)
        errors = _errs53, vErrors !== null && (_errs53 ? vErrors.length = _errs53 : vErrors = null);
      else {
        let err83 = { instancePath: instancePath + "/interval", schemaPath: "#/properties/interval/anyOf", keyword: "anyOf", params: {}, message: "must match a schema in anyOf" };
        vErrors === null ? vErrors = [err83] : vErrors.push(err83), errors++;
      }
    }
    if (data.notes !== void 0) {
      let data21 = data.notes;
      if (typeof data21 == "string") {
        if (func2(data21) > 2e4) {
          let err84 = { instancePath: instancePath + "/notes", schemaPath: "#/properties/notes/maxLength", keyword: "maxLength", params: { limit: 2e4 }, message: "must NOT have more than 20000 characters" };
          vErrors === null ? vErrors = [err84] : vErrors.push(err84), errors++;
        }
      } else {
        let err85 = { instancePath: instancePath + "/notes", schemaPath: "#/properties/notes/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        vErrors === null ? vErrors = [err85] : vErrors.push(err85), errors++;
      }
    }
    if (data.plateCount !== void 0) {
      let data22 = data.plateCount;
      if (!(typeof data22 == "number" && !(data22 % 1) && !isNaN(data22) && isFinite(data22))) {
        let err86 = { instancePath: instancePath + "/plateCount", schemaPath: "#/properties/plateCount/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        vErrors === null ? vErrors = [err86] : vErrors.push(err86), errors++;
      }
      if (typeof data22 == "number" && isFinite(data22) && (data22 < 0 || isNaN(data22))) {
        let err87 = { instancePath: instancePath + "/plateCount", schemaPath: "#/properties/plateCount/minimum", keyword: "minimum", params: { comparison: ">=", limit: 0 }, message: "must be >= 0" };
        vErrors === null ? vErrors = [err87] : vErrors.push(err87), errors++;
      }
    }
    if (data.moveCount !== void 0) {
      let data23 = data.moveCount;
      if (!(typeof data23 == "number" && !(data23 % 1) && !isNaN(data23) && isFinite(data23))) {
        let err88 = { instancePath: instancePath + "/moveCount", schemaPath: "#/properties/moveCount/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        vErrors === null ? vErrors = [err88] : vErrors.push(err88), errors++;
      }
      if (typeof data23 == "number" && isFinite(data23) && (data23 < 0 || isNaN(data23))) {
        let err89 = { instancePath: instancePath + "/moveCount", schemaPath: "#/properties/moveCount/minimum", keyword: "minimum", params: { comparison: ">=", limit: 0 }, message: "must be >= 0" };
        vErrors === null ? vErrors = [err89] : vErrors.push(err89), errors++;
      }
    }
    if (data.cover !== void 0) {
      let data24 = data.cover, _errs65 = errors, valid8 = !1, _errs66 = errors;
      if (data24 && typeof data24 == "object" && !Array.isArray(data24)) {
        if (data24.plateId === void 0) {
          let err90 = { instancePath: instancePath + "/cover", schemaPath: "plates.schema.json#/$defs/PlatePicture/required", keyword: "required", params: { missingProperty: "plateId" }, message: "must have required property 'plateId'" };
          vErrors === null ? vErrors = [err90] : vErrors.push(err90), errors++;
        }
        if (data24.thumbUrl === void 0) {
          let err91 = { instancePath: instancePath + "/cover", schemaPath: "plates.schema.json#/$defs/PlatePicture/required", keyword: "required", params: { missingProperty: "thumbUrl" }, message: "must have required property 'thumbUrl'" };
          vErrors === null ? vErrors = [err91] : vErrors.push(err91), errors++;
        }
        if (data24.url2048 === void 0) {
          let err92 = { instancePath: instancePath + "/cover", schemaPath: "plates.schema.json#/$defs/PlatePicture/required", keyword: "required", params: { missingProperty: "url2048" }, message: "must have required property 'url2048'" };
          vErrors === null ? vErrors = [err92] : vErrors.push(err92), errors++;
        }
        for (let key3 in data24)
          if (!(key3 === "plateId" || key3 === "thumbUrl" || key3 === "url2048")) {
            let err93 = { instancePath: instancePath + "/cover", schemaPath: "plates.schema.json#/$defs/PlatePicture/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key3 }, message: "must NOT have additional properties" };
            vErrors === null ? vErrors = [err93] : vErrors.push(err93), errors++;
          }
        if (data24.plateId !== void 0 && typeof data24.plateId != "string") {
          let err94 = { instancePath: instancePath + "/cover/plateId", schemaPath: "plates.schema.json#/$defs/PlatePicture/properties/plateId/type", keyword: "type", params: { type: "string" }, message: "must be string" };
          vErrors === null ? vErrors = [err94] : vErrors.push(err94), errors++;
        }
        if (data24.thumbUrl !== void 0 && typeof data24.thumbUrl != "string") {
          let err95 = { instancePath: instancePath + "/cover/thumbUrl", schemaPath: "plates.schema.json#/$defs/PlatePicture/properties/thumbUrl/type", keyword: "type", params: { type: "string" }, message: "must be string" };
          vErrors === null ? vErrors = [err95] : vErrors.push(err95), errors++;
        }
        if (data24.url2048 !== void 0 && typeof data24.url2048 != "string") {
          let err96 = { instancePath: instancePath + "/cover/url2048", schemaPath: "plates.schema.json#/$defs/PlatePicture/properties/url2048/type", keyword: "type", params: { type: "string" }, message: "must be string" };
          vErrors === null ? vErrors = [err96] : vErrors.push(err96), errors++;
        }
      } else {
        let err97 = { instancePath: instancePath + "/cover", schemaPath: "plates.schema.json#/$defs/PlatePicture/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        vErrors === null ? vErrors = [err97] : vErrors.push(err97), errors++;
      }
      var _valid3 = _errs66 === errors;
      valid8 = valid8 || _valid3;
      let _errs76 = errors;
      if (data24 !== null) {
        let err98 = { instancePath: instancePath + "/cover", schemaPath: "#/properties/cover/anyOf/1/type", keyword: "type", params: { type: "null" }, message: "must be null" };
        vErrors === null ? vErrors = [err98] : vErrors.push(err98), errors++;
      }
      var _valid3 = _errs76 === errors;
      if (valid8 = valid8 || _valid3, valid8)
        errors = _errs65, vErrors !== null && (_errs65 ? vErrors.length = _errs65 : vErrors = null);
      else {
        let err99 = { instancePath: instancePath + "/cover", schemaPath: "#/properties/cover/anyOf", keyword: "anyOf", params: {}, message: "must match a schema in anyOf" };
        vErrors === null ? vErrors = [err99] : vErrors.push(err99), errors++;
      }
    }
    if (data.revision !== void 0) {
      let data28 = data.revision;
      if (!(typeof data28 == "number" && !(data28 % 1) && !isNaN(data28) && isFinite(data28))) {
        let err100 = { instancePath: instancePath + "/revision", schemaPath: "#/properties/revision/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        vErrors === null ? vErrors = [err100] : vErrors.push(err100), errors++;
      }
      if (typeof data28 == "number" && isFinite(data28) && (data28 < 1 || isNaN(data28))) {
        let err101 = { instancePath: instancePath + "/revision", schemaPath: "#/properties/revision/minimum", keyword: "minimum", params: { comparison: ">=", limit: 1 }, message: "must be >= 1" };
        vErrors === null ? vErrors = [err101] : vErrors.push(err101), errors++;
      }
    }
    if (data.createdAt !== void 0 && typeof data.createdAt != "string") {
      let err102 = { instancePath: instancePath + "/createdAt", schemaPath: "#/properties/createdAt/type", keyword: "type", params: { type: "string" }, message: "must be string" };
      vErrors === null ? vErrors = [err102] : vErrors.push(err102), errors++;
    }
    if (data.updatedAt !== void 0 && typeof data.updatedAt != "string") {
      let err103 = { instancePath: instancePath + "/updatedAt", schemaPath: "#/properties/updatedAt/type", keyword: "type", params: { type: "string" }, message: "must be string" };
      vErrors === null ? vErrors = [err103] : vErrors.push(err103), errors++;
    }
  } else {
    let err104 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    vErrors === null ? vErrors = [err104] : vErrors.push(err104), errors++;
  }
  return validate21.errors = vErrors, errors === 0;
}
validate21.evaluated = { props: !0, dynamicProps: !1, dynamicItems: !1 };
function validate31(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null, errors = 0, evaluated0 = validate31.evaluated;
  if (evaluated0.dynamicProps && (evaluated0.props = void 0), evaluated0.dynamicItems && (evaluated0.items = void 0), data && typeof data == "object" && !Array.isArray(data)) {
    if (data.items === void 0) {
      let err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "items" }, message: "must have required property 'items'" };
      vErrors === null ? vErrors = [err0] : vErrors.push(err0), errors++;
    }
    if (data.next === void 0) {
      let err1 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "next" }, message: "must have required property 'next'" };
      vErrors === null ? vErrors = [err1] : vErrors.push(err1), errors++;
    }
    for (let key0 in data)
      if (!(key0 === "items" || key0 === "next")) {
        let err2 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        vErrors === null ? vErrors = [err2] : vErrors.push(err2), errors++;
      }
    if (data.items !== void 0) {
      let data0 = data.items;
      if (Array.isArray(data0)) {
        let len0 = data0.length;
        for (let i0 = 0; i0 < len0; i0++)
          validate21(data0[i0], { instancePath: instancePath + "/items/" + i0, parentData: data0, parentDataProperty: i0, rootData, dynamicAnchors }) || (vErrors = vErrors === null ? validate21.errors : vErrors.concat(validate21.errors), errors = vErrors.length);
      } else {
        let err3 = { instancePath: instancePath + "/items", schemaPath: "#/properties/items/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        vErrors === null ? vErrors = [err3] : vErrors.push(err3), errors++;
      }
    }
    if (data.next !== void 0) {
      let data2 = data.next, _errs6 = errors, valid3 = !1, _errs7 = errors;
      if (typeof data2 != "string") {
        let err4 = { instancePath: instancePath + "/next", schemaPath: "#/properties/next/anyOf/0/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        vErrors === null ? vErrors = [err4] : vErrors.push(err4), errors++;
      }
      var _valid0 = _errs7 === errors;
      valid3 = valid3 || _valid0;
      let _errs9 = errors;
      if (data2 !== null) {
        let err5 = { instancePath: instancePath + "/next", schemaPath: "#/properties/next/anyOf/1/type", keyword: "type", params: { type: "null" }, message: "must be null" };
        vErrors === null ? vErrors = [err5] : vErrors.push(err5), errors++;
      }
      var _valid0 = _errs9 === errors;
      if (valid3 = valid3 || _valid0, valid3)
        errors = _errs6, vErrors !== null && (_errs6 ? vErrors.length = _errs6 : vErrors = null);
      else {
        let err6 = { instancePath: instancePath + "/next", schemaPath: "#/properties/next/anyOf", keyword: "anyOf", params: {}, message: "must match a schema in anyOf" };
        vErrors === null ? vErrors = [err6] : vErrors.push(err6), errors++;
      }
    }
  } else {
    let err7 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    vErrors === null ? vErrors = [err7] : vErrors.push(err7), errors++;
  }
  return validate31.errors = vErrors, errors === 0;
}
validate31.evaluated = { props: !0, dynamicProps: !1, dynamicItems: !1 };
function validate20(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null, errors = 0, evaluated0 = validate20.evaluated;
  if (evaluated0.dynamicProps && (evaluated0.props = void 0), evaluated0.dynamicItems && (evaluated0.items = void 0), data && typeof data == "object" && !Array.isArray(data)) {
    for (let key0 in data)
      if (!(key0 === "shot" || key0 === "shotDraft" || key0 === "shotChanges" || key0 === "shotPage")) {
        let err0 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        vErrors === null ? vErrors = [err0] : vErrors.push(err0), errors++;
      }
    if (data.shot !== void 0 && (validate21(data.shot, { instancePath: instancePath + "/shot", parentData: data, parentDataProperty: "shot", rootData, dynamicAnchors }) || (vErrors = vErrors === null ? validate21.errors : vErrors.concat(validate21.errors), errors = vErrors.length)), data.shotDraft !== void 0) {
      let data1 = data.shotDraft;
      if (data1 && typeof data1 == "object" && !Array.isArray(data1)) {
        if (data1.title === void 0) {
          let err1 = { instancePath: instancePath + "/shotDraft", schemaPath: "#/$defs/ShotDraft/required", keyword: "required", params: { missingProperty: "title" }, message: "must have required property 'title'" };
          vErrors === null ? vErrors = [err1] : vErrors.push(err1), errors++;
        }
        if (data1.rate === void 0) {
          let err2 = { instancePath: instancePath + "/shotDraft", schemaPath: "#/$defs/ShotDraft/required", keyword: "required", params: { missingProperty: "rate" }, message: "must have required property 'rate'" };
          vErrors === null ? vErrors = [err2] : vErrors.push(err2), errors++;
        }
        if (data1.frames === void 0) {
          let err3 = { instancePath: instancePath + "/shotDraft", schemaPath: "#/$defs/ShotDraft/required", keyword: "required", params: { missingProperty: "frames" }, message: "must have required property 'frames'" };
          vErrors === null ? vErrors = [err3] : vErrors.push(err3), errors++;
        }
        if (data1.source === void 0) {
          let err4 = { instancePath: instancePath + "/shotDraft", schemaPath: "#/$defs/ShotDraft/required", keyword: "required", params: { missingProperty: "source" }, message: "must have required property 'source'" };
          vErrors === null ? vErrors = [err4] : vErrors.push(err4), errors++;
        }
        for (let key1 in data1)
          if (!func1.call(schema40.properties, key1)) {
            let err5 = { instancePath: instancePath + "/shotDraft", schemaPath: "#/$defs/ShotDraft/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key1 }, message: "must NOT have additional properties" };
            vErrors === null ? vErrors = [err5] : vErrors.push(err5), errors++;
          }
        if (data1.title !== void 0) {
          let data2 = data1.title;
          if (typeof data2 == "string") {
            if (func2(data2) > 200) {
              let err6 = { instancePath: instancePath + "/shotDraft/title", schemaPath: "#/$defs/ShotDraft/properties/title/maxLength", keyword: "maxLength", params: { limit: 200 }, message: "must NOT have more than 200 characters" };
              vErrors === null ? vErrors = [err6] : vErrors.push(err6), errors++;
            }
            if (!pattern4.test(data2)) {
              let err7 = { instancePath: instancePath + "/shotDraft/title", schemaPath: "#/$defs/ShotDraft/properties/title/pattern", keyword: "pattern", params: { pattern: "\\S" }, message: 'must match pattern "\\S"' };
              vErrors === null ? vErrors = [err7] : vErrors.push(err7), errors++;
            }
          } else {
            let err8 = { instancePath: instancePath + "/shotDraft/title", schemaPath: "#/$defs/ShotDraft/properties/title/type", keyword: "type", params: { type: "string" }, message: "must be string" };
            vErrors === null ? vErrors = [err8] : vErrors.push(err8), errors++;
          }
        }
        if (data1.rate !== void 0) {
          let data3 = data1.rate;
          if (data3 && typeof data3 == "object" && !Array.isArray(data3)) {
            if (data3.num === void 0) {
              let err9 = { instancePath: instancePath + "/shotDraft/rate", schemaPath: "#/$defs/ShotDraft/properties/rate/required", keyword: "required", params: { missingProperty: "num" }, message: "must have required property 'num'" };
              vErrors === null ? vErrors = [err9] : vErrors.push(err9), errors++;
            }
            if (data3.den === void 0) {
              let err10 = { instancePath: instancePath + "/shotDraft/rate", schemaPath: "#/$defs/ShotDraft/properties/rate/required", keyword: "required", params: { missingProperty: "den" }, message: "must have required property 'den'" };
              vErrors === null ? vErrors = [err10] : vErrors.push(err10), errors++;
            }
            for (let key2 in data3)
              if (!(key2 === "num" || key2 === "den")) {
                let err11 = { instancePath: instancePath + "/shotDraft/rate", schemaPath: "#/$defs/ShotDraft/properties/rate/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key2 }, message: "must NOT have additional properties" };
                vErrors === null ? vErrors = [err11] : vErrors.push(err11), errors++;
              }
            if (data3.num !== void 0) {
              let data4 = data3.num;
              if (!(typeof data4 == "number" && !(data4 % 1) && !isNaN(data4) && isFinite(data4))) {
                let err12 = { instancePath: instancePath + "/shotDraft/rate/num", schemaPath: "#/$defs/ShotDraft/properties/rate/properties/num/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
                vErrors === null ? vErrors = [err12] : vErrors.push(err12), errors++;
              }
              if (typeof data4 == "number" && isFinite(data4)) {
                if (data4 > 1e6 || isNaN(data4)) {
                  let err13 = { instancePath: instancePath + "/shotDraft/rate/num", schemaPath: "#/$defs/ShotDraft/properties/rate/properties/num/maximum", keyword: "maximum", params: { comparison: "<=", limit: 1e6 }, message: "must be <= 1000000" };
                  vErrors === null ? vErrors = [err13] : vErrors.push(err13), errors++;
                }
                if (data4 < 1 || isNaN(data4)) {
                  let err14 = { instancePath: instancePath + "/shotDraft/rate/num", schemaPath: "#/$defs/ShotDraft/properties/rate/properties/num/minimum", keyword: "minimum", params: { comparison: ">=", limit: 1 }, message: "must be >= 1" };
                  vErrors === null ? vErrors = [err14] : vErrors.push(err14), errors++;
                }
              }
            }
            if (data3.den !== void 0) {
              let data5 = data3.den;
              if (!(typeof data5 == "number" && !(data5 % 1) && !isNaN(data5) && isFinite(data5))) {
                let err15 = { instancePath: instancePath + "/shotDraft/rate/den", schemaPath: "#/$defs/ShotDraft/properties/rate/properties/den/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
                vErrors === null ? vErrors = [err15] : vErrors.push(err15), errors++;
              }
              if (typeof data5 == "number" && isFinite(data5)) {
                if (data5 > 1e6 || isNaN(data5)) {
                  let err16 = { instancePath: instancePath + "/shotDraft/rate/den", schemaPath: "#/$defs/ShotDraft/properties/rate/properties/den/maximum", keyword: "maximum", params: { comparison: "<=", limit: 1e6 }, message: "must be <= 1000000" };
                  vErrors === null ? vErrors = [err16] : vErrors.push(err16), errors++;
                }
                if (data5 < 1 || isNaN(data5)) {
                  let err17 = { instancePath: instancePath + "/shotDraft/rate/den", schemaPath: "#/$defs/ShotDraft/properties/rate/properties/den/minimum", keyword: "minimum", params: { comparison: ">=", limit: 1 }, message: "must be >= 1" };
                  vErrors === null ? vErrors = [err17] : vErrors.push(err17), errors++;
                }
              }
            }
          } else {
            let err18 = { instancePath: instancePath + "/shotDraft/rate", schemaPath: "#/$defs/ShotDraft/properties/rate/type", keyword: "type", params: { type: "object" }, message: "must be object" };
            vErrors === null ? vErrors = [err18] : vErrors.push(err18), errors++;
          }
        }
        if (data1.frames !== void 0) {
          let data6 = data1.frames;
          if (!(typeof data6 == "number" && !(data6 % 1) && !isNaN(data6) && isFinite(data6))) {
            let err19 = { instancePath: instancePath + "/shotDraft/frames", schemaPath: "#/$defs/ShotDraft/properties/frames/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
            vErrors === null ? vErrors = [err19] : vErrors.push(err19), errors++;
          }
          if (typeof data6 == "number" && isFinite(data6)) {
            if (data6 > 1e7 || isNaN(data6)) {
              let err20 = { instancePath: instancePath + "/shotDraft/frames", schemaPath: "#/$defs/ShotDraft/properties/frames/maximum", keyword: "maximum", params: { comparison: "<=", limit: 1e7 }, message: "must be <= 10000000" };
              vErrors === null ? vErrors = [err20] : vErrors.push(err20), errors++;
            }
            if (data6 < 1 || isNaN(data6)) {
              let err21 = { instancePath: instancePath + "/shotDraft/frames", schemaPath: "#/$defs/ShotDraft/properties/frames/minimum", keyword: "minimum", params: { comparison: ">=", limit: 1 }, message: "must be >= 1" };
              vErrors === null ? vErrors = [err21] : vErrors.push(err21), errors++;
            }
          }
        }
        if (data1.speed !== void 0) {
          let data7 = data1.speed;
          if (typeof data7 == "number" && isFinite(data7)) {
            if (data7 > 1e4 || isNaN(data7)) {
              let err22 = { instancePath: instancePath + "/shotDraft/speed", schemaPath: "#/$defs/ShotDraft/properties/speed/maximum", keyword: "maximum", params: { comparison: "<=", limit: 1e4 }, message: "must be <= 10000" };
              vErrors === null ? vErrors = [err22] : vErrors.push(err22), errors++;
            }
            if (data7 < 0.01 || isNaN(data7)) {
              let err23 = { instancePath: instancePath + "/shotDraft/speed", schemaPath: "#/$defs/ShotDraft/properties/speed/minimum", keyword: "minimum", params: { comparison: ">=", limit: 0.01 }, message: "must be >= 0.01" };
              vErrors === null ? vErrors = [err23] : vErrors.push(err23), errors++;
            }
          } else {
            let err24 = { instancePath: instancePath + "/shotDraft/speed", schemaPath: "#/$defs/ShotDraft/properties/speed/type", keyword: "type", params: { type: "number" }, message: "must be number" };
            vErrors === null ? vErrors = [err24] : vErrors.push(err24), errors++;
          }
        }
        if (data1.from !== void 0) {
          let data8 = data1.from;
          if (!(typeof data8 == "number" && !(data8 % 1) && !isNaN(data8) && isFinite(data8))) {
            let err25 = { instancePath: instancePath + "/shotDraft/from", schemaPath: "#/$defs/ShotDraft/properties/from/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
            vErrors === null ? vErrors = [err25] : vErrors.push(err25), errors++;
          }
          if (typeof data8 == "number" && isFinite(data8) && (data8 < 0 || isNaN(data8))) {
            let err26 = { instancePath: instancePath + "/shotDraft/from", schemaPath: "#/$defs/ShotDraft/properties/from/minimum", keyword: "minimum", params: { comparison: ">=", limit: 0 }, message: "must be >= 0" };
            vErrors === null ? vErrors = [err26] : vErrors.push(err26), errors++;
          }
        }
        if (data1.to !== void 0) {
          let data9 = data1.to;
          if (!(typeof data9 == "number" && !(data9 % 1) && !isNaN(data9) && isFinite(data9))) {
            let err27 = { instancePath: instancePath + "/shotDraft/to", schemaPath: "#/$defs/ShotDraft/properties/to/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
            vErrors === null ? vErrors = [err27] : vErrors.push(err27), errors++;
          }
          if (typeof data9 == "number" && isFinite(data9) && (data9 < 0 || isNaN(data9))) {
            let err28 = { instancePath: instancePath + "/shotDraft/to", schemaPath: "#/$defs/ShotDraft/properties/to/minimum", keyword: "minimum", params: { comparison: ">=", limit: 0 }, message: "must be >= 0" };
            vErrors === null ? vErrors = [err28] : vErrors.push(err28), errors++;
          }
        }
        if (data1.start !== void 0) {
          let data10 = data1.start;
          if (typeof data10 == "string") {
            if (func2(data10) > 11) {
              let err29 = { instancePath: instancePath + "/shotDraft/start", schemaPath: "#/$defs/ShotDraft/properties/start/maxLength", keyword: "maxLength", params: { limit: 11 }, message: "must NOT have more than 11 characters" };
              vErrors === null ? vErrors = [err29] : vErrors.push(err29), errors++;
            }
          } else {
            let err30 = { instancePath: instancePath + "/shotDraft/start", schemaPath: "#/$defs/ShotDraft/properties/start/type", keyword: "type", params: { type: "string" }, message: "must be string" };
            vErrors === null ? vErrors = [err30] : vErrors.push(err30), errors++;
          }
        }
        if (data1.dropFrame !== void 0 && typeof data1.dropFrame != "boolean") {
          let err31 = { instancePath: instancePath + "/shotDraft/dropFrame", schemaPath: "#/$defs/ShotDraft/properties/dropFrame/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
          vErrors === null ? vErrors = [err31] : vErrors.push(err31), errors++;
        }
        if (data1.source !== void 0) {
          let data12 = data1.source;
          if (data12 && typeof data12 == "object" && !Array.isArray(data12)) {
            if (data12.width === void 0) {
              let err32 = { instancePath: instancePath + "/shotDraft/source", schemaPath: "#/$defs/ShotDraft/properties/source/required", keyword: "required", params: { missingProperty: "width" }, message: "must have required property 'width'" };
              vErrors === null ? vErrors = [err32] : vErrors.push(err32), errors++;
            }
            if (data12.height === void 0) {
              let err33 = { instancePath: instancePath + "/shotDraft/source", schemaPath: "#/$defs/ShotDraft/properties/source/required", keyword: "required", params: { missingProperty: "height" }, message: "must have required property 'height'" };
              vErrors === null ? vErrors = [err33] : vErrors.push(err33), errors++;
            }
            for (let key3 in data12)
              if (!(key3 === "width" || key3 === "height")) {
                let err34 = { instancePath: instancePath + "/shotDraft/source", schemaPath: "#/$defs/ShotDraft/properties/source/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key3 }, message: "must NOT have additional properties" };
                vErrors === null ? vErrors = [err34] : vErrors.push(err34), errors++;
              }
            if (data12.width !== void 0) {
              let data13 = data12.width;
              if (!(typeof data13 == "number" && !(data13 % 1) && !isNaN(data13) && isFinite(data13))) {
                let err35 = { instancePath: instancePath + "/shotDraft/source/width", schemaPath: "#/$defs/ShotDraft/properties/source/properties/width/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
                vErrors === null ? vErrors = [err35] : vErrors.push(err35), errors++;
              }
              if (typeof data13 == "number" && isFinite(data13)) {
                if (data13 > 16384 || isNaN(data13)) {
                  let err36 = { instancePath: instancePath + "/shotDraft/source/width", schemaPath: "#/$defs/ShotDraft/properties/source/properties/width/maximum", keyword: "maximum", params: { comparison: "<=", limit: 16384 }, message: "must be <= 16384" };
                  vErrors === null ? vErrors = [err36] : vErrors.push(err36), errors++;
                }
                if (data13 < 16 || isNaN(data13)) {
                  let err37 = { instancePath: instancePath + "/shotDraft/source/width", schemaPath: "#/$defs/ShotDraft/properties/source/properties/width/minimum", keyword: "minimum", params: { comparison: ">=", limit: 16 }, message: "must be >= 16" };
                  vErrors === null ? vErrors = [err37] : vErrors.push(err37), errors++;
                }
              }
            }
            if (data12.height !== void 0) {
              let data14 = data12.height;
              if (!(typeof data14 == "number" && !(data14 % 1) && !isNaN(data14) && isFinite(data14))) {
                let err38 = { instancePath: instancePath + "/shotDraft/source/height", schemaPath: "#/$defs/ShotDraft/properties/source/properties/height/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
                vErrors === null ? vErrors = [err38] : vErrors.push(err38), errors++;
              }
              if (typeof data14 == "number" && isFinite(data14)) {
                if (data14 > 16384 || isNaN(data14)) {
                  let err39 = { instancePath: instancePath + "/shotDraft/source/height", schemaPath: "#/$defs/ShotDraft/properties/source/properties/height/maximum", keyword: "maximum", params: { comparison: "<=", limit: 16384 }, message: "must be <= 16384" };
                  vErrors === null ? vErrors = [err39] : vErrors.push(err39), errors++;
                }
                if (data14 < 16 || isNaN(data14)) {
                  let err40 = { instancePath: instancePath + "/shotDraft/source/height", schemaPath: "#/$defs/ShotDraft/properties/source/properties/height/minimum", keyword: "minimum", params: { comparison: ">=", limit: 16 }, message: "must be >= 16" };
                  vErrors === null ? vErrors = [err40] : vErrors.push(err40), errors++;
                }
              }
            }
          } else {
            let err41 = { instancePath: instancePath + "/shotDraft/source", schemaPath: "#/$defs/ShotDraft/properties/source/type", keyword: "type", params: { type: "object" }, message: "must be object" };
            vErrors === null ? vErrors = [err41] : vErrors.push(err41), errors++;
          }
        }
        if (data1.level !== void 0) {
          let data15 = data1.level;
          if (Array.isArray(data15)) {
            if (data15.length > 4) {
              let err42 = { instancePath: instancePath + "/shotDraft/level", schemaPath: "#/$defs/ShotDraft/properties/level/maxItems", keyword: "maxItems", params: { limit: 4 }, message: "must NOT have more than 4 items" };
              vErrors === null ? vErrors = [err42] : vErrors.push(err42), errors++;
            }
            if (data15.length < 4) {
              let err43 = { instancePath: instancePath + "/shotDraft/level", schemaPath: "#/$defs/ShotDraft/properties/level/minItems", keyword: "minItems", params: { limit: 4 }, message: "must NOT have fewer than 4 items" };
              vErrors === null ? vErrors = [err43] : vErrors.push(err43), errors++;
            }
            let len0 = data15.length;
            for (let i0 = 0; i0 < len0; i0++) {
              let data16 = data15[i0];
              if (typeof data16 == "number" && isFinite(data16)) {
                if (data16 > 1 || isNaN(data16)) {
                  let err44 = { instancePath: instancePath + "/shotDraft/level/" + i0, schemaPath: "#/$defs/ShotDraft/properties/level/items/maximum", keyword: "maximum", params: { comparison: "<=", limit: 1 }, message: "must be <= 1" };
                  vErrors === null ? vErrors = [err44] : vErrors.push(err44), errors++;
                }
                if (data16 < -1 || isNaN(data16)) {
                  let err45 = { instancePath: instancePath + "/shotDraft/level/" + i0, schemaPath: "#/$defs/ShotDraft/properties/level/items/minimum", keyword: "minimum", params: { comparison: ">=", limit: -1 }, message: "must be >= -1" };
                  vErrors === null ? vErrors = [err45] : vErrors.push(err45), errors++;
                }
              } else {
                let err46 = { instancePath: instancePath + "/shotDraft/level/" + i0, schemaPath: "#/$defs/ShotDraft/properties/level/items/type", keyword: "type", params: { type: "number" }, message: "must be number" };
                vErrors === null ? vErrors = [err46] : vErrors.push(err46), errors++;
              }
            }
          } else {
            let err47 = { instancePath: instancePath + "/shotDraft/level", schemaPath: "#/$defs/ShotDraft/properties/level/type", keyword: "type", params: { type: "array" }, message: "must be array" };
            vErrors === null ? vErrors = [err47] : vErrors.push(err47), errors++;
          }
        }
        if (data1.seamYaw !== void 0) {
          let data17 = data1.seamYaw, _errs40 = errors, valid7 = !1, _errs41 = errors;
          if (typeof data17 == "number" && isFinite(data17)) {
            if (data17 > 36e3 || isNaN(data17)) {
              let err48 = { instancePath: instancePath + "/shotDraft/seamYaw", schemaPath: "#/$defs/ShotDraft/properties/seamYaw/anyOf/0/maximum", keyword: "maximum", params: { comparison: "<=", limit: 36e3 }, message: "must be <= 36000" };
              vErrors === null ? vErrors = [err48] : vErrors.push(err48), errors++;
            }
            if (data17 < -36e3 || isNaN(data17)) {
              let err49 = { instancePath: instancePath + "/shotDraft/seamYaw", schemaPath: "#/$defs/ShotDraft/properties/seamYaw/anyOf/0/minimum", keyword: "minimum", params: { comparison: ">=", limit: -36e3 }, message: "must be >= -36000" };
              vErrors === null ? vErrors = [err49] : vErrors.push(err49), errors++;
            }
          } else {
            let err50 = { instancePath: instancePath + "/shotDraft/seamYaw", schemaPath: "#/$defs/ShotDraft/properties/seamYaw/anyOf/0/type", keyword: "type", params: { type: "number" }, message: "must be number" };
            vErrors === null ? vErrors = [err50] : vErrors.push(err50), errors++;
          }
          var _valid0 = _errs41 === errors;
          valid7 = valid7 || _valid0;
          let _errs43 = errors;
          if (data17 !== null) {
            let err51 = { instancePath: instancePath + "/shotDraft/seamYaw", schemaPath: "#/$defs/ShotDraft/properties/seamYaw/anyOf/1/type", keyword: "type", params: { type: "null" }, message: "must be null" };
            vErrors === null ? vErrors = [err51] : vErrors.push(err51), errors++;
          }
          var _valid0 = _errs43 === errors;
          if (valid7 = valid7 || _valid0, valid7)
            errors = _errs40, vErrors !== null && (_errs40 ? vErrors.length = _errs40 : vErrors = null);
          else {
            let err52 = { instancePath: instancePath + "/shotDraft/seamYaw", schemaPath: "#/$defs/ShotDraft/properties/seamYaw/anyOf", keyword: "anyOf", params: {}, message: "must match a schema in anyOf" };
            vErrors === null ? vErrors = [err52] : vErrors.push(err52), errors++;
          }
        }
        if (data1.loops !== void 0 && typeof data1.loops != "boolean") {
          let err53 = { instancePath: instancePath + "/shotDraft/loops", schemaPath: "#/$defs/ShotDraft/properties/loops/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
          vErrors === null ? vErrors = [err53] : vErrors.push(err53), errors++;
        }
        if (data1.exposure !== void 0) {
          let data19 = data1.exposure, _errs48 = errors, valid8 = !1, _errs49 = errors;
          if (typeof data19 == "number" && isFinite(data19)) {
            if (data19 > 86400 || isNaN(data19)) {
              let err54 = { instancePath: instancePath + "/shotDraft/exposure", schemaPath: "#/$defs/ShotDraft/properties/exposure/anyOf/0/maximum", keyword: "maximum", params: { comparison: "<=", limit: 86400 }, message: "must be <= 86400" };
              vErrors === null ? vErrors = [err54] : vErrors.push(err54), errors++;
            }
            if (data19 <= 0 || isNaN(data19)) {
              let err55 = { instancePath: instancePath + "/shotDraft/exposure", schemaPath: "#/$defs/ShotDraft/properties/exposure/anyOf/0/exclusiveMinimum", keyword: "exclusiveMinimum", params: { comparison: ">", limit: 0 }, message: "must be > 0" };
              vErrors === null ? vErrors = [err55] : vErrors.push(err55), errors++;
            }
          } else {
            let err56 = { instancePath: instancePath + "/shotDraft/exposure", schemaPath: "#/$defs/ShotDraft/properties/exposure/anyOf/0/type", keyword: "type", params: { type: "number" }, message: "must be number" };
            vErrors === null ? vErrors = [err56] : vErrors.push(err56), errors++;
          }
          var _valid1 = _errs49 === errors;
          valid8 = valid8 || _valid1;
          let _errs51 = errors;
          if (data19 !== null) {
            let err57 = { instancePath: instancePath + "/shotDraft/exposure", schemaPath: "#/$defs/ShotDraft/properties/exposure/anyOf/1/type", keyword: "type", params: { type: "null" }, message: "must be null" };
            vErrors === null ? vErrors = [err57] : vErrors.push(err57), errors++;
          }
          var _valid1 = _errs51 === errors;
          if (valid8 = valid8 || _valid1, valid8)
            errors = _errs48, vErrors !== null && (_errs48 ? vErrors.length = _errs48 : vErrors = null);
          else {
            let err58 = { instancePath: instancePath + "/shotDraft/exposure", schemaPath: "#/$defs/ShotDraft/properties/exposure/anyOf", keyword: "anyOf", params: {}, message: "must match a schema in anyOf" };
            vErrors === null ? vErrors = [err58] : vErrors.push(err58), errors++;
          }
        }
        if (data1.interval !== void 0) {
          let data20 = data1.interval, _errs54 = errors, valid9 = !1, _errs55 = errors;
          if (typeof data20 == "number" && isFinite(data20)) {
            if (data20 > 86400 || isNaN(data20)) {
              let err59 = { instancePath: instancePath + "/shotDraft/interval", schemaPath: "#/$defs/ShotDraft/properties/interval/anyOf/0/maximum", keyword: "maximum", params: { comparison: "<=", limit: 86400 }, message: "must be <= 86400" };
              vErrors === null ? vErrors = [err59] : vErrors.push(err59), errors++;
            }
            if (data20 <= 0 || isNaN(data20)) {
              let err60 = { instancePath: instancePath + "/shotDraft/interval", schemaPath: "#/$defs/ShotDraft/properties/interval/anyOf/0/exclusiveMinimum", keyword: "exclusiveMinimum", params: { comparison: ">", limit: 0 }, message: "must be > 0" };
              vErrors === null ? vErrors = [err60] : vErrors.push(err60), errors++;
            }
          } else {
            let err61 = { instancePath: instancePath + "/shotDraft/interval", schemaPath: "#/$defs/ShotDraft/properties/interval/anyOf/0/type", keyword: "type", params: { type: "number" }, message: "must be number" };
            vErrors === null ? vErrors = [err61] : vErrors.push(err61), errors++;
          }
          var _valid2 = _errs55 === errors;
          valid9 = valid9 || _valid2;
          let _errs57 = errors;
          if (data20 !== null) {
            let err62 = { instancePath: instancePath + "/shotDraft/interval", schemaPath: "#/$defs/ShotDraft/properties/interval/anyOf/1/type", keyword: "type", params: { type: "null" }, message: "must be null" };
            vErrors === null ? vErrors = [err62] : vErrors.push(err62), errors++;
          }
          var _valid2 = _errs57 === errors;
          if (valid9 = valid9 || _valid2, valid9)
            errors = _errs54, vErrors !== null && (_errs54 ? vErrors.length = _errs54 : vErrors = null);
          else {
            let err63 = { instancePath: instancePath + "/shotDraft/interval", schemaPath: "#/$defs/ShotDraft/properties/interval/anyOf", keyword: "anyOf", params: {}, message: "must match a schema in anyOf" };
            vErrors === null ? vErrors = [err63] : vErrors.push(err63), errors++;
          }
        }
        if (data1.notes !== void 0) {
          let data21 = data1.notes;
          if (typeof data21 == "string") {
            if (func2(data21) > 2e4) {
              let err64 = { instancePath: instancePath + "/shotDraft/notes", schemaPath: "#/$defs/ShotDraft/properties/notes/maxLength", keyword: "maxLength", params: { limit: 2e4 }, message: "must NOT have more than 20000 characters" };
              vErrors === null ? vErrors = [err64] : vErrors.push(err64), errors++;
            }
          } else {
            let err65 = { instancePath: instancePath + "/shotDraft/notes", schemaPath: "#/$defs/ShotDraft/properties/notes/type", keyword: "type", params: { type: "string" }, message: "must be string" };
            vErrors === null ? vErrors = [err65] : vErrors.push(err65), errors++;
          }
        }
      } else {
        let err66 = { instancePath: instancePath + "/shotDraft", schemaPath: "#/$defs/ShotDraft/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        vErrors === null ? vErrors = [err66] : vErrors.push(err66), errors++;
      }
    }
    if (data.shotChanges !== void 0) {
      let data22 = data.shotChanges;
      if (data22 && typeof data22 == "object" && !Array.isArray(data22)) {
        if (Object.keys(data22).length < 1) {
          let err67 = { instancePath: instancePath + "/shotChanges", schemaPath: "#/$defs/ShotChanges/minProperties", keyword: "minProperties", params: { limit: 1 }, message: "must NOT have fewer than 1 properties" };
          vErrors === null ? vErrors = [err67] : vErrors.push(err67), errors++;
        }
        for (let key4 in data22)
          if (!func1.call(schema41.properties, key4)) {
            let err68 = { instancePath: instancePath + "/shotChanges", schemaPath: "#/$defs/ShotChanges/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key4 }, message: "must NOT have additional properties" };
            vErrors === null ? vErrors = [err68] : vErrors.push(err68), errors++;
          }
        if (data22.title !== void 0) {
          let data23 = data22.title;
          if (typeof data23 == "string") {
            if (func2(data23) > 200) {
              let err69 = { instancePath: instancePath + "/shotChanges/title", schemaPath: "#/$defs/ShotChanges/properties/title/maxLength", keyword: "maxLength", params: { limit: 200 }, message: "must NOT have more than 200 characters" };
              vErrors === null ? vErrors = [err69] : vErrors.push(err69), errors++;
            }
            if (!pattern4.test(data23)) {
              let err70 = { instancePath: instancePath + "/shotChanges/title", schemaPath: "#/$defs/ShotChanges/properties/title/pattern", keyword: "pattern", params: { pattern: "\\S" }, message: 'must match pattern "\\S"' };
              vErrors === null ? vErrors = [err70] : vErrors.push(err70), errors++;
            }
          } else {
            let err71 = { instancePath: instancePath + "/shotChanges/title", schemaPath: "#/$defs/ShotChanges/properties/title/type", keyword: "type", params: { type: "string" }, message: "must be string" };
            vErrors === null ? vErrors = [err71] : vErrors.push(err71), errors++;
          }
        }
        if (data22.rate !== void 0) {
          let data24 = data22.rate;
          if (data24 && typeof data24 == "object" && !Array.isArray(data24)) {
            if (data24.num === void 0) {
              let err72 = { instancePath: instancePath + "/shotChanges/rate", schemaPath: "#/$defs/ShotChanges/properties/rate/required", keyword: "required", params: { missingProperty: "num" }, message: "must have required property 'num'" };
              vErrors === null ? vErrors = [err72] : vErrors.push(err72), errors++;
            }
            if (data24.den === void 0) {
              let err73 = { instancePath: instancePath + "/shotChanges/rate", schemaPath: "#/$defs/ShotChanges/properties/rate/required", keyword: "required", params: { missingProperty: "den" }, message: "must have required property 'den'" };
              vErrors === null ? vErrors = [err73] : vErrors.push(err73), errors++;
            }
            for (let key5 in data24)
              if (!(key5 === "num" || key5 === "den")) {
                let err74 = { instancePath: instancePath + "/shotChanges/rate", schemaPath: "#/$defs/ShotChanges/properties/rate/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key5 }, message: "must NOT have additional properties" };
                vErrors === null ? vErrors = [err74] : vErrors.push(err74), errors++;
              }
            if (data24.num !== void 0) {
              let data25 = data24.num;
              if (!(typeof data25 == "number" && !(data25 % 1) && !isNaN(data25) && isFinite(data25))) {
                let err75 = { instancePath: instancePath + "/shotChanges/rate/num", schemaPath: "#/$defs/ShotChanges/properties/rate/properties/num/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
                vErrors === null ? vErrors = [err75] : vErrors.push(err75), errors++;
              }
              if (typeof data25 == "number" && isFinite(data25)) {
                if (data25 > 1e6 || isNaN(data25)) {
                  let err76 = { instancePath: instancePath + "/shotChanges/rate/num", schemaPath: "#/$defs/ShotChanges/properties/rate/properties/num/maximum", keyword: "maximum", params: { comparison: "<=", limit: 1e6 }, message: "must be <= 1000000" };
                  vErrors === null ? vErrors = [err76] : vErrors.push(err76), errors++;
                }
                if (data25 < 1 || isNaN(data25)) {
                  let err77 = { instancePath: instancePath + "/shotChanges/rate/num", schemaPath: "#/$defs/ShotChanges/properties/rate/properties/num/minimum", keyword: "minimum", params: { comparison: ">=", limit: 1 }, message: "must be >= 1" };
                  vErrors === null ? vErrors = [err77] : vErrors.push(err77), errors++;
                }
              }
            }
            if (data24.den !== void 0) {
              let data26 = data24.den;
              if (!(typeof data26 == "number" && !(data26 % 1) && !isNaN(data26) && isFinite(data26))) {
                let err78 = { instancePath: instancePath + "/shotChanges/rate/den", schemaPath: "#/$defs/ShotChanges/properties/rate/properties/den/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
                vErrors === null ? vErrors = [err78] : vErrors.push(err78), errors++;
              }
              if (typeof data26 == "number" && isFinite(data26)) {
                if (data26 > 1e6 || isNaN(data26)) {
                  let err79 = { instancePath: instancePath + "/shotChanges/rate/den", schemaPath: "#/$defs/ShotChanges/properties/rate/properties/den/maximum", keyword: "maximum", params: { comparison: "<=", limit: 1e6 }, message: "must be <= 1000000" };
                  vErrors === null ? vErrors = [err79] : vErrors.push(err79), errors++;
                }
                if (data26 < 1 || isNaN(data26)) {
                  let err80 = { instancePath: instancePath + "/shotChanges/rate/den", schemaPath: "#/$defs/ShotChanges/properties/rate/properties/den/minimum", keyword: "minimum", params: { comparison: ">=", limit: 1 }, message: "must be >= 1" };
                  vErrors === null ? vErrors = [err80] : vErrors.push(err80), errors++;
                }
              }
            }
          } else {
            let err81 = { instancePath: instancePath + "/shotChanges/rate", schemaPath: "#/$defs/ShotChanges/properties/rate/type", keyword: "type", params: { type: "object" }, message: "must be object" };
            vErrors === null ? vErrors = [err81] : vErrors.push(err81), errors++;
          }
        }
        if (data22.frames !== void 0) {
          let data27 = data22.frames;
          if (!(typeof data27 == "number" && !(data27 % 1) && !isNaN(data27) && isFinite(data27))) {
            let err82 = { instancePath: instancePath + "/shotChanges/frames", schemaPath: "#/$defs/ShotChanges/properties/frames/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
            vErrors === null ? vErrors = [err82] : vErrors.push(err82), errors++;
          }
          if (typeof data27 == "number" && isFinite(data27)) {
            if (data27 > 1e7 || isNaN(data27)) {
              let err83 = { instancePath: instancePath + "/shotChanges/frames", schemaPath: "#/$defs/ShotChanges/properties/frames/maximum", keyword: "maximum", params: { comparison: "<=", limit: 1e7 }, message: "must be <= 10000000" };
              vErrors === null ? vErrors = [err83] : vErrors.push(err83), errors++;
            }
            if (data27 < 1 || isNaN(data27)) {
              let err84 = { instancePath: instancePath + "/shotChanges/frames", schemaPath: "#/$defs/ShotChanges/properties/frames/minimum", keyword: "minimum", params: { comparison: ">=", limit: 1 }, message: "must be >= 1" };
              vErrors === null ? vErrors = [err84] : vErrors.push(err84), errors++;
            }
          }
        }
        if (data22.speed !== void 0) {
          let data28 = data22.speed;
          if (typeof data28 == "number" && isFinite(data28)) {
            if (data28 > 1e4 || isNaN(data28)) {
              let err85 = { instancePath: instancePath + "/shotChanges/speed", schemaPath: "#/$defs/ShotChanges/properties/speed/maximum", keyword: "maximum", params: { comparison: "<=", limit: 1e4 }, message: "must be <= 10000" };
              vErrors === null ? vErrors = [err85] : vErrors.push(err85), errors++;
            }
            if (data28 < 0.01 || isNaN(data28)) {
              let err86 = { instancePath: instancePath + "/shotChanges/speed", schemaPath: "#/$defs/ShotChanges/properties/speed/minimum", keyword: "minimum", params: { comparison: ">=", limit: 0.01 }, message: "must be >= 0.01" };
              vErrors === null ? vErrors = [err86] : vErrors.push(err86), errors++;
            }
          } else {
            let err87 = { instancePath: instancePath + "/shotChanges/speed", schemaPath: "#/$defs/ShotChanges/properties/speed/type", keyword: "type", params: { type: "number" }, message: "must be number" };
            vErrors === null ? vErrors = [err87] : vErrors.push(err87), errors++;
          }
        }
        if (data22.from !== void 0) {
          let data29 = data22.from;
          if (!(typeof data29 == "number" && !(data29 % 1) && !isNaN(data29) && isFinite(data29))) {
            let err88 = { instancePath: instancePath + "/shotChanges/from", schemaPath: "#/$defs/ShotChanges/properties/from/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
            vErrors === null ? vErrors = [err88] : vErrors.push(err88), errors++;
          }
          if (typeof data29 == "number" && isFinite(data29) && (data29 < 0 || isNaN(data29))) {
            let err89 = { instancePath: instancePath + "/shotChanges/from", schemaPath: "#/$defs/ShotChanges/properties/from/minimum", keyword: "minimum", params: { comparison: ">=", limit: 0 }, message: "must be >= 0" };
            vErrors === null ? vErrors = [err89] : vErrors.push(err89), errors++;
          }
        }
        if (data22.to !== void 0) {
          let data30 = data22.to;
          if (!(typeof data30 == "number" && !(data30 % 1) && !isNaN(data30) && isFinite(data30))) {
            let err90 = { instancePath: instancePath + "/shotChanges/to", schemaPath: "#/$defs/ShotChanges/properties/to/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
            vErrors === null ? vErrors = [err90] : vErrors.push(err90), errors++;
          }
          if (typeof data30 == "number" && isFinite(data30) && (data30 < 0 || isNaN(data30))) {
            let err91 = { instancePath: instancePath + "/shotChanges/to", schemaPath: "#/$defs/ShotChanges/properties/to/minimum", keyword: "minimum", params: { comparison: ">=", limit: 0 }, message: "must be >= 0" };
            vErrors === null ? vErrors = [err91] : vErrors.push(err91), errors++;
          }
        }
        if (data22.start !== void 0) {
          let data31 = data22.start;
          if (typeof data31 == "string") {
            if (func2(data31) > 11) {
              let err92 = { instancePath: instancePath + "/shotChanges/start", schemaPath: "#/$defs/ShotChanges/properties/start/maxLength", keyword: "maxLength", params: { limit: 11 }, message: "must NOT have more than 11 characters" };
              vErrors === null ? vErrors = [err92] : vErrors.push(err92), errors++;
            }
          } else {
            let err93 = { instancePath: instancePath + "/shotChanges/start", schemaPath: "#/$defs/ShotChanges/properties/start/type", keyword: "type", params: { type: "string" }, message: "must be string" };
            vErrors === null ? vErrors = [err93] : vErrors.push(err93), errors++;
          }
        }
        if (data22.dropFrame !== void 0 && typeof data22.dropFrame != "boolean") {
          let err94 = { instancePath: instancePath + "/shotChanges/dropFrame", schemaPath: "#/$defs/ShotChanges/properties/dropFrame/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
          vErrors === null ? vErrors = [err94] : vErrors.push(err94), errors++;
        }
        if (data22.source !== void 0) {
          let data33 = data22.source;
          if (data33 && typeof data33 == "object" && !Array.isArray(data33)) {
            if (data33.width === void 0) {
              let err95 = { instancePath: instancePath + "/shotChanges/source", schemaPath: "#/$defs/ShotChanges/properties/source/required", keyword: "required", params: { missingProperty: "width" }, message: "must have required property 'width'" };
              vErrors === null ? vErrors = [err95] : vErrors.push(err95), errors++;
            }
            if (data33.height === void 0) {
              let err96 = { instancePath: instancePath + "/shotChanges/source", schemaPath: "#/$defs/ShotChanges/properties/source/required", keyword: "required", params: { missingProperty: "height" }, message: "must have required property 'height'" };
              vErrors === null ? vErrors = [err96] : vErrors.push(err96), errors++;
            }
            for (let key6 in data33)
              if (!(key6 === "width" || key6 === "height")) {
                let err97 = { instancePath: instancePath + "/shotChanges/source", schemaPath: "#/$defs/ShotChanges/properties/source/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key6 }, message: "must NOT have additional properties" };
                vErrors === null ? vErrors = [err97] : vErrors.push(err97), errors++;
              }
            if (data33.width !== void 0) {
              let data34 = data33.width;
              if (!(typeof data34 == "number" && !(data34 % 1) && !isNaN(data34) && isFinite(data34))) {
                let err98 = { instancePath: instancePath + "/shotChanges/source/width", schemaPath: "#/$defs/ShotChanges/properties/source/properties/width/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
                vErrors === null ? vErrors = [err98] : vErrors.push(err98), errors++;
              }
              if (typeof data34 == "number" && isFinite(data34)) {
                if (data34 > 16384 || isNaN(data34)) {
                  let err99 = { instancePath: instancePath + "/shotChanges/source/width", schemaPath: "#/$defs/ShotChanges/properties/source/properties/width/maximum", keyword: "maximum", params: { comparison: "<=", limit: 16384 }, message: "must be <= 16384" };
                  vErrors === null ? vErrors = [err99] : vErrors.push(err99), errors++;
                }
                if (data34 < 16 || isNaN(data34)) {
                  let err100 = { instancePath: instancePath + "/shotChanges/source/width", schemaPath: "#/$defs/ShotChanges/properties/source/properties/width/minimum", keyword: "minimum", params: { comparison: ">=", limit: 16 }, message: "must be >= 16" };
                  vErrors === null ? vErrors = [err100] : vErrors.push(err100), errors++;
                }
              }
            }
            if (data33.height !== void 0) {
              let data35 = data33.height;
              if (!(typeof data35 == "number" && !(data35 % 1) && !isNaN(data35) && isFinite(data35))) {
                let err101 = { instancePath: instancePath + "/shotChanges/source/height", schemaPath: "#/$defs/ShotChanges/properties/source/properties/height/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
                vErrors === null ? vErrors = [err101] : vErrors.push(err101), errors++;
              }
              if (typeof data35 == "number" && isFinite(data35)) {
                if (data35 > 16384 || isNaN(data35)) {
                  let err102 = { instancePath: instancePath + "/shotChanges/source/height", schemaPath: "#/$defs/ShotChanges/properties/source/properties/height/maximum", keyword: "maximum", params: { comparison: "<=", limit: 16384 }, message: "must be <= 16384" };
                  vErrors === null ? vErrors = [err102] : vErrors.push(err102), errors++;
                }
                if (data35 < 16 || isNaN(data35)) {
                  let err103 = { instancePath: instancePath + "/shotChanges/source/height", schemaPath: "#/$defs/ShotChanges/properties/source/properties/height/minimum", keyword: "minimum", params: { comparison: ">=", limit: 16 }, message: "must be >= 16" };
                  vErrors === null ? vErrors = [err103] : vErrors.push(err103), errors++;
                }
              }
            }
          } else {
            let err104 = { instancePath: instancePath + "/shotChanges/source", schemaPath: "#/$defs/ShotChanges/properties/source/type", keyword: "type", params: { type: "object" }, message: "must be object" };
            vErrors === null ? vErrors = [err104] : vErrors.push(err104), errors++;
          }
        }
        if (data22.level !== void 0) {
          let data36 = data22.level;
          if (Array.isArray(data36)) {
            if (data36.length > 4) {
              let err105 = { instancePath: instancePath + "/shotChanges/level", schemaPath: "#/$defs/ShotChanges/properties/level/maxItems", keyword: "maxItems", params: { limit: 4 }, message: "must NOT have more than 4 items" };
              vErrors === null ? vErrors = [err105] : vErrors.push(err105), errors++;
            }
            if (data36.length < 4) {
              let err106 = { instancePath: instancePath + "/shotChanges/level", schemaPath: "#/$defs/ShotChanges/properties/level/minItems", keyword: "minItems", params: { limit: 4 }, message: "must NOT have fewer than 4 items" };
              vErrors === null ? vErrors = [err106] : vErrors.push(err106), errors++;
            }
            let len1 = data36.length;
            for (let i1 = 0; i1 < len1; i1++) {
              let data37 = data36[i1];
              if (typeof data37 == "number" && isFinite(data37)) {
                if (data37 > 1 || isNaN(data37)) {
                  let err107 = { instancePath: instancePath + "/shotChanges/level/" + i1, schemaPath: "#/$defs/ShotChanges/properties/level/items/maximum", keyword: "maximum", params: { comparison: "<=", limit: 1 }, message: "must be <= 1" };
                  vErrors === null ? vErrors = [err107] : vErrors.push(err107), errors++;
                }
                if (data37 < -1 || isNaN(data37)) {
                  let err108 = { instancePath: instancePath + "/shotChanges/level/" + i1, schemaPath: "#/$defs/ShotChanges/properties/level/items/minimum", keyword: "minimum", params: { comparison: ">=", limit: -1 }, message: "must be >= -1" };
                  vErrors === null ? vErrors = [err108] : vErrors.push(err108), errors++;
                }
              } else {
                let err109 = { instancePath: instancePath + "/shotChanges/level/" + i1, schemaPath: "#/$defs/ShotChanges/properties/level/items/type", keyword: "type", params: { type: "number" }, message: "must be number" };
                vErrors === null ? vErrors = [err109] : vErrors.push(err109), errors++;
              }
            }
          } else {
            let err110 = { instancePath: instancePath + "/shotChanges/level", schemaPath: "#/$defs/ShotChanges/properties/level/type", keyword: "type", params: { type: "array" }, message: "must be array" };
            vErrors === null ? vErrors = [err110] : vErrors.push(err110), errors++;
          }
        }
        if (data22.seamYaw !== void 0) {
          let data38 = data22.seamYaw, _errs98 = errors, valid16 = !1, _errs99 = errors;
          if (typeof data38 == "number" && isFinite(data38)) {
            if (data38 > 36e3 || isNaN(data38)) {
              let err111 = { instancePath: instancePath + "/shotChanges/seamYaw", schemaPath: "#/$defs/ShotChanges/properties/seamYaw/anyOf/0/maximum", keyword: "maximum", params: { comparison: "<=", limit: 36e3 }, message: "must be <= 36000" };
              vErrors === null ? vErrors = [err111] : vErrors.push(err111), errors++;
            }
            if (data38 < -36e3 || isNaN(data38)) {
              let err112 = { instancePath: instancePath + "/shotChanges/seamYaw", schemaPath: "#/$defs/ShotChanges/properties/seamYaw/anyOf/0/minimum", keyword: "minimum", params: { comparison: ">=", limit: -36e3 }, message: "must be >= -36000" };
              vErrors === null ? vErrors = [err112] : vErrors.push(err112), errors++;
            }
          } else {
            let err113 = { instancePath: instancePath + "/shotChanges/seamYaw", schemaPath: "#/$defs/ShotChanges/properties/seamYaw/anyOf/0/type", keyword: "type", params: { type: "number" }, message: "must be number" };
            vErrors === null ? vErrors = [err113] : vErrors.push(err113), errors++;
          }
          var _valid3 = _errs99 === errors;
          valid16 = valid16 || _valid3;
          let _errs101 = errors;
          if (data38 !== null) {
            let err114 = { instancePath: instancePath + "/shotChanges/seamYaw", schemaPath: "#/$defs/ShotChanges/properties/seamYaw/anyOf/1/type", keyword: "type", params: { type: "null" }, message: "must be null" };
            vErrors === null ? vErrors = [err114] : vErrors.push(err114), errors++;
          }
          var _valid3 = _errs101 === errors;
          if (valid16 = valid16 || _valid3, valid16)
            errors = _errs98, vErrors !== null && (_errs98 ? vErrors.length = _errs98 : vErrors = null);
          else {
            let err115 = { instancePath: instancePath + "/shotChanges/seamYaw", schemaPath: "#/$defs/ShotChanges/properties/seamYaw/anyOf", keyword: "anyOf", params: {}, message: "must match a schema in anyOf" };
            vErrors === null ? vErrors = [err115] : vErrors.push(err115), errors++;
          }
        }
        if (data22.loops !== void 0 && typeof data22.loops != "boolean") {
          let err116 = { instancePath: instancePath + "/shotChanges/loops", schemaPath: "#/$defs/ShotChanges/properties/loops/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
          vErrors === null ? vErrors = [err116] : vErrors.push(err116), errors++;
        }
        if (data22.exposure !== void 0) {
          let data40 = data22.exposure, _errs106 = errors, valid17 = !1, _errs107 = errors;
          if (typeof data40 == "number" && isFinite(data40)) {
            if (data40 > 86400 || isNaN(data40)) {
              let err117 = { instancePath: instancePath + "/shotChanges/exposure", schemaPath: "#/$defs/ShotChanges/properties/exposure/anyOf/0/maximum", keyword: "maximum", params: { comparison: "<=", limit: 86400 }, message: "must be <= 86400" };
              vErrors === null ? vErrors = [err117] : vErrors.push(err117), errors++;
            }
            if (data40 <= 0 || isNaN(data40)) {
              let err118 = { instancePath: instancePath + "/shotChanges/exposure", schemaPath: "#/$defs/ShotChanges/properties/exposure/anyOf/0/exclusiveMinimum", keyword: "exclusiveMinimum", params: { comparison: ">", limit: 0 }, message: "must be > 0" };
              vErrors === null ? vErrors = [err118] : vErrors.push(err118), errors++;
            }
          } else {
            let err119 = { instancePath: instancePath + "/shotChanges/exposure", schemaPath: "#/$defs/ShotChanges/properties/exposure/anyOf/0/type", keyword: "type", params: { type: "number" }, message: "must be number" };
            vErrors === null ? vErrors = [err119] : vErrors.push(err119), errors++;
          }
          var _valid4 = _errs107 === errors;
          valid17 = valid17 || _valid4;
          let _errs109 = errors;
          if (data40 !== null) {
            let err120 = { instancePath: instancePath + "/shotChanges/exposure", schemaPath: "#/$defs/ShotChanges/properties/exposure/anyOf/1/type", keyword: "type", params: { type: "null" }, message: "must be null" };
            vErrors === null ? vErrors = [err120] : vErrors.push(err120), errors++;
          }
          var _valid4 = _errs109 === errors;
          if (valid17 = valid17 || _valid4, valid17)
            errors = _errs106, vErrors !== null && (_errs106 ? vErrors.length = _errs106 : vErrors = null);
          else {
            let err121 = { instancePath: instancePath + "/shotChanges/exposure", schemaPath: "#/$defs/ShotChanges/properties/exposure/anyOf", keyword: "anyOf", params: {}, message: "must match a schema in anyOf" };
            vErrors === null ? vErrors = [err121] : vErrors.push(err121), errors++;
          }
        }
        if (data22.interval !== void 0) {
          let data41 = data22.interval, _errs112 = errors, valid18 = !1, _errs113 = errors;
          if (typeof data41 == "number" && isFinite(data41)) {
            if (data41 > 86400 || isNaN(data41)) {
              let err122 = { instancePath: instancePath + "/shotChanges/interval", schemaPath: "#/$defs/ShotChanges/properties/interval/anyOf/0/maximum", keyword: "maximum", params: { comparison: "<=", limit: 86400 }, message: "must be <= 86400" };
              vErrors === null ? vErrors = [err122] : vErrors.push(err122), errors++;
            }
            if (data41 <= 0 || isNaN(data41)) {
              let err123 = { instancePath: instancePath + "/shotChanges/interval", schemaPath: "#/$defs/ShotChanges/properties/interval/anyOf/0/exclusiveMinimum", keyword: "exclusiveMinimum", params: { comparison: ">", limit: 0 }, message: "must be > 0" };
              vErrors === null ? vErrors = [err123] : vErrors.push(err123), errors++;
            }
          } else {
            let err124 = { instancePath: instancePath + "/shotChanges/interval", schemaPath: "#/$defs/ShotChanges/properties/interval/anyOf/0/type", keyword: "type", params: { type: "number" }, message: "must be number" };
            vErrors === null ? vErrors = [err124] : vErrors.push(err124), errors++;
          }
          var _valid5 = _errs113 === errors;
          valid18 = valid18 || _valid5;
          let _errs115 = errors;
          if (data41 !== null) {
            let err125 = { instancePath: instancePath + "/shotChanges/interval", schemaPath: "#/$defs/ShotChanges/properties/interval/anyOf/1/type", keyword: "type", params: { type: "null" }, message: "must be null" };
            vErrors === null ? vErrors = [err125] : vErrors.push(err125), errors++;
          }
          var _valid5 = _errs115 === errors;
          if (valid18 = valid18 || _valid5, valid18)
            errors = _errs112, vErrors !== null && (_errs112 ? vErrors.length = _errs112 : vErrors = null);
          else {
            let err126 = { instancePath: instancePath + "/shotChanges/interval", schemaPath: "#/$defs/ShotChanges/properties/interval/anyOf", keyword: "anyOf", params: {}, message: "must match a schema in anyOf" };
            vErrors === null ? vErrors = [err126] : vErrors.push(err126), errors++;
          }
        }
        if (data22.notes !== void 0) {
          let data42 = data22.notes;
          if (typeof data42 == "string") {
            if (func2(data42) > 2e4) {
              let err127 = { instancePath: instancePath + "/shotChanges/notes", schemaPath: "#/$defs/ShotChanges/properties/notes/maxLength", keyword: "maxLength", params: { limit: 2e4 }, message: "must NOT have more than 20000 characters" };
              vErrors === null ? vErrors = [err127] : vErrors.push(err127), errors++;
            }
          } else {
            let err128 = { instancePath: instancePath + "/shotChanges/notes", schemaPath: "#/$defs/ShotChanges/properties/notes/type", keyword: "type", params: { type: "string" }, message: "must be string" };
            vErrors === null ? vErrors = [err128] : vErrors.push(err128), errors++;
          }
        }
      } else {
        let err129 = { instancePath: instancePath + "/shotChanges", schemaPath: "#/$defs/ShotChanges/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        vErrors === null ? vErrors = [err129] : vErrors.push(err129), errors++;
      }
    }
    data.shotPage !== void 0 && (validate31(data.shotPage, { instancePath: instancePath + "/shotPage", parentData: data, parentDataProperty: "shotPage", rootData, dynamicAnchors }) || (vErrors = vErrors === null ? validate31.errors : vErrors.concat(validate31.errors), errors = vErrors.length));
  } else {
    let err130 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    vErrors === null ? vErrors = [err130] : vErrors.push(err130), errors++;
  }
  return validate20.errors = vErrors, errors === 0;
}
validate20.evaluated = { props: !0, dynamicProps: !1, dynamicItems: !1 };

export const validate: SchemaValidator<ShotBodies> = machineMade as SchemaValidator<ShotBodies>;
