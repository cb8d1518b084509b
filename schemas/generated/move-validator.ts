// Made by `npm run generate` from the JSON Schema of the same name. Not to be edited.
// @ts-nocheck: machine-made code; its type is stated at the end.
import { type SchemaValidator } from './schema-validator';
import { type MoveDocument } from './move';

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
var func1 = require_ucs2length().default, schema34 = { title: "Shot", description: "What the move needs to know of the shot that it travels through.", type: "object", additionalProperties: !1, required: ["title", "rate", "frames", "speed", "source"], properties: { title: { $ref: "#/$defs/title" }, rate: { $ref: "#/$defs/rate" }, frames: { description: "Source frames in the shot.", type: "integer", minimum: 1, maximum: 1e7 }, speed: { description: "How many times faster the delivered film runs than the source.", type: "number", minimum: 0.01, maximum: 1e4 }, from: { description: "First delivered source frame; the shot's first unless said.", $ref: "#/$defs/frame" }, to: { description: "Last delivered source frame, included; the shot's last unless said.", $ref: "#/$defs/frame" }, start: { description: "Timecode of source frame 0, SMPTE ST 12-1; 00:00:00:00 unless said.", type: "string", pattern: "^\\d\\d:[0-5]\\d:[0-5]\\d[:;]\\d{2,4}$" }, dropFrame: { description: "Drop-frame counting, only at 30000/1001 and 60000/1001; false unless said.", type: "boolean" }, source: { $ref: "#/$defs/source" }, level: { description: "Unit quaternion x, y, z, w from source directions to the levelled world; none unless said.", type: "array", minItems: 4, maxItems: 4, items: { type: "number", minimum: -1, maximum: 1 } }, seamYaw: { description: "Heading of the stitch seam's great circle in source directions, degrees.", type: "number", minimum: -36e3, maximum: 36e3 }, loops: { description: "Whether the shot's end joins its beginning; false unless said.", type: "boolean" }, exposure: { description: "Seconds of one exposure.", type: "number", exclusiveMinimum: 0, maximum: 86400 }, interval: { description: "Real seconds from one source frame to the next; one over the rate unless said.", type: "number", exclusiveMinimum: 0, maximum: 86400 }, extensions: { $ref: "#/$defs/extensions" } } };
var func3 = Object.prototype.hasOwnProperty, pattern4 = new RegExp("^\\d\\d:[0-5]\\d:[0-5]\\d[:;]\\d{2,4}$", "u");
function validate22(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null, errors = 0, evaluated0 = validate22.evaluated;
  if (evaluated0.dynamicProps && (evaluated0.props = void 0), evaluated0.dynamicItems && (evaluated0.items = void 0), data && typeof data == "object" && !Array.isArray(data)) {
    if (data.width === void 0) {
      let err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "width" }, message: "must have required property 'width'" };
      vErrors === null ? vErrors = [err0] : vErrors.push(err0), errors++;
    }
    if (data.height === void 0) {
      let err1 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "height" }, message: "must have required property 'height'" };
      vErrors === null ? vErrors = [err1] : vErrors.push(err1), errors++;
    }
    for (let key0 in data)
      if (!(key0 === "width" || key0 === "height")) {
        let err2 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        vErrors === null ? vErrors = [err2] : vErrors.push(err2), errors++;
      }
    if (data.width !== void 0) {
      let data0 = data.width;
      if (!(typeof data0 == "number" && !(data0 % 1) && !isNaN(data0) && isFinite(data0))) {
        let err3 = { instancePath: instancePath + "/width", schemaPath: "#/$defs/side/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        vErrors === null ? vErrors = [err3] : vErrors.push(err3), errors++;
      }
      if (typeof data0 == "number" && isFinite(data0)) {
        if (data0 > 16384 || isNaN(data0)) {
          let err4 = { instancePath: instancePath + "/width", schemaPath: "#/$defs/side/maximum", keyword: "maximum", params: { comparison: "<=", limit: 16384 }, message: "must be <= 16384" };
          vErrors === null ? vErrors = [err4] : vErrors.push(err4), errors++;
        }
        if (data0 < 16 || isNaN(data0)) {
          let err5 = { instancePath: instancePath + "/width", schemaPath: "#/$defs/side/minimum", keyword: "minimum", params: { comparison: ">=", limit: 16 }, message: "must be >= 16" };
          vErrors === null ? vErrors = [err5] : vErrors.push(err5), errors++;
        }
      }
    }
    if (data.height !== void 0) {
      let data1 = data.height;
      if (!(typeof data1 == "number" && !(data1 % 1) && !isNaN(data1) && isFinite(data1))) {
        let err6 = { instancePath: instancePath + "/height", schemaPath: "#/$defs/side/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        vErrors === null ? vErrors = [err6] : vErrors.push(err6), errors++;
      }
      if (typeof data1 == "number" && isFinite(data1)) {
        if (data1 > 16384 || isNaN(data1)) {
          let err7 = { instancePath: instancePath + "/height", schemaPath: "#/$defs/side/maximum", keyword: "maximum", params: { comparison: "<=", limit: 16384 }, message: "must be <= 16384" };
          vErrors === null ? vErrors = [err7] : vErrors.push(err7), errors++;
        }
        if (data1 < 16 || isNaN(data1)) {
          let err8 = { instancePath: instancePath + "/height", schemaPath: "#/$defs/side/minimum", keyword: "minimum", params: { comparison: ">=", limit: 16 }, message: "must be >= 16" };
          vErrors === null ? vErrors = [err8] : vErrors.push(err8), errors++;
        }
      }
    }
  } else {
    let err9 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    vErrors === null ? vErrors = [err9] : vErrors.push(err9), errors++;
  }
  return validate22.errors = vErrors, errors === 0;
}
validate22.evaluated = { props: !0, dynamicProps: !1, dynamicItems: !1 };
function validate21(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null, errors = 0, evaluated0 = validate21.evaluated;
  if (evaluated0.dynamicProps && (evaluated0.props = void 0), evaluated0.dynamicItems && (evaluated0.items = void 0), data && typeof data == "object" && !Array.isArray(data)) {
    if (data.title === void 0) {
      let err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "title" }, message: "must have required property 'title'" };
      vErrors === null ? vErrors = [err0] : vErrors.push(err0), errors++;
    }
    if (data.rate === void 0) {
      let err1 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "rate" }, message: "must have required property 'rate'" };
      vErrors === null ? vErrors = [err1] : vErrors.push(err1), errors++;
    }
    if (data.frames === void 0) {
      let err2 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "frames" }, message: "must have required property 'frames'" };
      vErrors === null ? vErrors = [err2] : vErrors.push(err2), errors++;
    }
    if (data.speed === void 0) {
      let err3 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "speed" }, message: "must have required property 'speed'" };
      vErrors === null ? vErrors = [err3] : vErrors.push(err3), errors++;
    }
    if (data.source === void 0) {
      let err4 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "source" }, message: "must have required property 'source'" };
      vErrors === null ? vErrors = [err4] : vErrors.push(err4), errors++;
    }
    for (let key0 in data)
      if (!func3.call(schema34.properties, key0)) {
        let err5 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        vErrors === null ? vErrors = [err5] : vErrors.push(err5), errors++;
      }
    if (data.title !== void 0) {
      let data0 = data.title;
      if (typeof data0 == "string") {
        if (func1(data0) > 200) {
          let err6 = { instancePath: instancePath + "/title", schemaPath: "#/$defs/title/maxLength", keyword: "maxLength", params: { limit: 200 }, message: "must NOT have more than 200 characters" };
          vErrors === null ? vErrors = [err6] : vErrors.push(err6), errors++;
        }
      } else {
        let err7 = { instancePath: instancePath + "/title", schemaPath: "#/$defs/title/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        vErrors === null ? vErrors = [err7] : vErrors.push(err7), errors++;
      }
    }
    if (data.rate !== void 0) {
      let data1 = data.rate;
      if (data1 && typeof data1 == "object" && !Array.isArray(data1)) {
        if (data1.num === void 0) {
          let err8 = { instancePath: instancePath + "/rate", schemaPath: "#/$defs/rate/required", keyword: "required", params: { missingProperty: "num" }, message: "must have required property 'num'" };
          vErrors === null ? vErrors = [err8] : vErrors.push(err8), errors++;
        }
        if (data1.den === void 0) {
          let err9 = { instancePath: instancePath + "/rate", schemaPath: "#/$defs/rate/required", keyword: "required", params: { missingProperty: "den" }, message: "must have required property 'den'" };
          vErrors === null ? vErrors = [err9] : vErrors.push(err9), errors++;
        }
        for (let key1 in data1)
          if (!(key1 === "num" || key1 === "den")) {
            let err10 = { instancePath: instancePath + "/rate", schemaPath: "#/$defs/rate/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key1 }, message: "must NOT have additional properties" };
            vErrors === null ? vErrors = [err10] : vErrors.push(err10), errors++;
          }
        if (data1.num !== void 0) {
          let data2 = data1.num;
          if (!(typeof data2 == "number" && !(data2 % 1) && !isNaN(data2) && isFinite(data2))) {
            let err11 = { instancePath: instancePath + "/rate/num", schemaPath: "#/$defs/rate/properties/num/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
            vErrors === null ? vErrors = [err11] : vErrors.push(err11), errors++;
          }
          if (typeof data2 == "number" && isFinite(data2)) {
            if (data2 > 1e6 || isNaN(data2)) {
              let err12 = { instancePath: instancePath + "/rate/num", schemaPath: "#/$defs/rate/properties/num/maximum", keyword: "maximum", params: { comparison: "<=", limit: 1e6 }, message: "must be <= 1000000" };
              vErrors === null ? vErrors = [err12] : vErrors.push(err12), errors++;
            }
            if (data2 < 1 || isNaN(data2)) {
              let err13 = { instancePath: instancePath + "/rate/num", schemaPath: "#/$defs/rate/properties/num/minimum", keyword: "minimum", params: { comparison: ">=", limit: 1 }, message: "must be >= 1" };
              vErrors === null ? vErrors = [err13] : vErrors.push(err13), errors++;
            }
          }
        }
        if (data1.den !== void 0) {
          let data3 = data1.den;
          if (!(typeof data3 == "number" && !(data3 % 1) && !isNaN(data3) && isFinite(data3))) {
            let err14 = { instancePath: instancePath + "/rate/den", schemaPath: "#/$defs/rate/properties/den/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
            vErrors === null ? vErrors = [err14] : vErrors.push(err14), errors++;
          }
          if (typeof data3 == "number" && isFinite(data3)) {
            if (data3 > 1e6 || isNaN(data3)) {
              let err15 = { instancePath: instancePath + "/rate/den", schemaPath: "#/$defs/rate/properties/den/maximum", keyword: "maximum", params: { comparison: "<=", limit: 1e6 }, message: "must be <= 1000000" };
              vErrors === null ? vErrors = [err15] : vErrors.push(err15), errors++;
            }
            if (data3 < 1 || isNaN(data3)) {
              let err16 = { instancePath: instancePath + "/rate/den", schemaPath: "#/$defs/rate/properties/den/minimum", keyword: "minimum", params: { comparison: ">=", limit: 1 }, message: "must be >= 1" };
              vErrors === null ? vErrors = [err16] : vErrors.push(err16), errors++;
            }
          }
        }
      } else {
        let err17 = { instancePath: instancePath + "/rate", schemaPath: "#/$defs/rate/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        vErrors === null ? vErrors = [err17] : vErrors.push(err17), errors++;
      }
    }
    if (data.frames !== void 0) {
      let data4 = data.frames;
      if (!(typeof data4 == "number" && !(data4 % 1) && !isNaN(data4) && isFinite(data4))) {
        let err18 = { instancePath: instancePath + "/frames", schemaPath: "#/properties/frames/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        vErrors === null ? vErrors = [err18] : vErrors.push(err18), errors++;
      }
      if (typeof data4 == "number" && isFinite(data4)) {
        if (data4 > 1e7 || isNaN(data4)) {
          let err19 = { instancePath: instancePath + "/frames", schemaPath: "#/properties/frames/maximum", keyword: "maximum", params: { comparison: "<=", limit: 1e7 }, message: "must be <= 10000000" };
          vErrors === null ? vErrors = [err19] : vErrors.push(err19), errors++;
        }
        if (data4 < 1 || isNaN(data4)) {
          let err20 = { instancePath: instancePath + "/frames", schemaPath: "#/properties/frames/minimum", keyword: "minimum", params: { comparison: ">=", limit: 1 }, message: "must be >= 1" };
          vErrors === null ? vErrors = [err20] : vErrors.push(err20), errors++;
        }
      }
    }
    if (data.speed !== void 0) {
      let data5 = data.speed;
      if (typeof data5 == "number" && isFinite(data5)) {
        if (data5 > 1e4 || isNaN(data5)) {
          let err21 = { instancePath: instancePath + "/speed", schemaPath: "#/properties/speed/maximum", keyword: "maximum", params: { comparison: "<=", limit: 1e4 }, message: "must be <= 10000" };
          vErrors === null ? vErrors = [err21] : vErrors.push(err21), errors++;
        }
        if (data5 < 0.01 || isNaN(data5)) {
          let err22 = { instancePath: instancePath + "/speed", schemaPath: "#/properties/speed/minimum", keyword: "minimum", params: { comparison: ">=", limit: 0.01 }, message: "must be >= 0.01" };
          vErrors === null ? vErrors = [err22] : vErrors.push(err22), errors++;
        }
      } else {
        let err23 = { instancePath: instancePath + "/speed", schemaPath: "#/properties/speed/type", keyword: "type", params: { type: "number" }, message: "must be number" };
        vErrors === null ? vErrors = [err23] : vErrors.push(err23), errors++;
      }
    }
    if (data.from !== void 0) {
      let data6 = data.from;
      if (!(typeof data6 == "number" && !(data6 % 1) && !isNaN(data6) && isFinite(data6))) {
        let err24 = { instancePath: instancePath + "/from", schemaPath: "#/$defs/frame/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        vErrors === null ? vErrors = [err24] : vErrors.push(err24), errors++;
      }
      if (typeof data6 == "number" && isFinite(data6)) {
        if (data6 > 1e7 || isNaN(data6)) {
          let err25 = { instancePath: instancePath + "/from", schemaPath: "#/$defs/frame/maximum", keyword: "maximum", params: { comparison: "<=", limit: 1e7 }, message: "must be <= 10000000" };
          vErrors === null ? vErrors = [err25] : vErrors.push(err25), errors++;
        }
        if (data6 < 0 || isNaN(data6)) {
          let err26 = { instancePath: instancePath + "/from", schemaPath: "#/$defs/frame/minimum", keyword: "minimum", params: { comparison: ">=", limit: 0 }, message: "must be >= 0" };
          vErrors === null ? vErrors = [err26] : vErrors.push(err26), errors++;
        }
      }
    }
    if (data.to !== void 0) {
      let data7 = data.to;
      if (!(typeof data7 == "number" && !(data7 % 1) && !isNaN(data7) && isFinite(data7))) {
        let err27 = { instancePath: instancePath + "/to", schemaPath: "#/$defs/frame/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        vErrors === null ? vErrors = [err27] : vErrors.push(err27), errors++;
      }
      if (typeof data7 == "number" && isFinite(data7)) {
        if (data7 > 1e7 || isNaN(data7)) {
          let err28 = { instancePath: instancePath + "/to", schemaPath: "#/$defs/frame/maximum", keyword: "maximum", params: { comparison: "<=", limit: 1e7 }, message: "must be <= 10000000" };
          vErrors === null ? vErrors = [err28] : vErrors.push(err28), errors++;
        }
        if (data7 < 0 || isNaN(data7)) {
          let err29 = { instancePath: instancePath + "/to", schemaPath: "#/$defs/frame/minimum", keyword: "minimum", params: { comparison: ">=", limit: 0 }, message: "must be >= 0" };
          vErrors === null ? vErrors = [err29] : vErrors.push(err29), errors++;
        }
      }
    }
    if (data.start !== void 0) {
      let data8 = data.start;
      if (typeof data8 == "string") {
        if (!pattern4.test(data8)) {
          let err30 = { instancePath: instancePath + "/start", schemaPath: "#/properties/start/pattern", keyword: "pattern", params: { pattern: "^\\d\\d:[0-5]\\d:[0-5]\\d[:;]\\d{2,4}$" }, message: 'must match pattern "^\\d\\d:[0-5]\\d:[0-5]\\d[:;]\\d{2,4}$"' };
          vErrors === null ? vErrors = [err30] : vErrors.push(err30), errors++;
        }
      } else {
        let err31 = { instancePath: instancePath + "/start", schemaPath: "#/properties/start/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        vErrors === null ? vErrors = [err31] : vErrors.push(err31), errors++;
      }
    }
    if (data.dropFrame !== void 0 && typeof data.dropFrame != "boolean") {
      let err32 = { instancePath: instancePath + "/dropFrame", schemaPath: "#/properties/dropFrame/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
      vErrors === null ? vErrors = [err32] : vErrors.push(err32), errors++;
    }
    if (data.source !== void 0 && (validate22(data.source, { instancePath: instancePath + "/source", parentData: data, parentDataProperty: "source", rootData, dynamicAnchors }) || (vErrors = vErrors === null ? validate22.errors : vErrors.concat(validate22.errors), errors = vErrors.length)), data.level !== void 0) {
      let data11 = data.level;
      if (Array.isArray(data11)) {
        if (data11.length > 4) {
          let err33 = { instancePath: instancePath + "/level", schemaPath: "#/properties/level/maxItems", keyword: "maxItems", params: { limit: 4 }, message: "must NOT have more than 4 items" };
          vErrors === null ? vErrors = [err33] : vErrors.push(err33), errors++;
        }
        if (data11.length < 4) {
          let err34 = { instancePath: instancePath + "/level", schemaPath: "#/properties/level/minItems", keyword: "minItems", params: { limit: 4 }, message: "must NOT have fewer than 4 items" };
          vErrors === null ? vErrors = [err34] : vErrors.push(err34), errors++;
        }
        let len0 = data11.length;
        for (let i0 = 0; i0 < len0; i0++) {
          let data12 = data11[i0];
          if (typeof data12 == "number" && isFinite(data12)) {
            if (data12 > 1 || isNaN(data12)) {
              let err35 = { instancePath: instancePath + "/level/" + i0, schemaPath: "#/properties/level/items/maximum", keyword: "maximum", params: { comparison: "<=", limit: 1 }, message: "must be <= 1" };
              vErrors === null ? vErrors = [err35] : vErrors.push(err35), errors++;
            }
            if (data12 < -1 || isNaN(data12)) {
              let err36 = { instancePath: instancePath + "/level/" + i0, schemaPath: "#/properties/level/items/minimum", keyword: "minimum", params: { comparison: ">=", limit: -1 }, message: "must be >= -1" };
              vErrors === null ? vErrors = [err36] : vErrors.push(err36), errors++;
            }
          } else {
            let err37 = { instancePath: instancePath + "/level/" + i0, schemaPath: "#/properties/level/items/type", keyword: "type", params: { type: "number" }, message: "must be number" };
            vErrors === null ? vErrors = [err37] : vErrors.push(err37), errors++;
          }
        }
      } else {
        let err38 = { instancePath: instancePath + "/level", schemaPath: "#/properties/level/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        vErrors === null ? vErrors = [err38] : vErrors.push(err38), errors++;
      }
    }
    if (data.seamYaw !== void 0) {
      let data13 = data.seamYaw;
      if (typeof data13 == "number" && isFinite(data13)) {
        if (data13 > 36e3 || isNaN(data13)) {
          let err39 = { instancePath: instancePath + "/seamYaw", schemaPath: "#/properties/seamYaw/maximum", keyword: "maximum", params: { comparison: "<=", limit: 36e3 }, message: "must be <= 36000" };
          vErrors === null ? vErrors = [err39] : vErrors.push(err39), errors++;
        }
        if (data13 < -36e3 || isNaN(data13)) {
          let err40 = { instancePath: instancePath + "/seamYaw", schemaPath: "#/properties/seamYaw/minimum", keyword: "minimum", params: { comparison: ">=", limit: -36e3 }, message: "must be >= -36000" };
          vErrors === null ? vErrors = [err40] : vErrors.push(err40), errors++;
        }
      } else {
        let err41 = { instancePath: instancePath + "/seamYaw", schemaPath: "#/properties/seamYaw/type", keyword: "type", params: { type: "number" }, message: "must be number" };
        vErrors === null ? vErrors = [err41] : vErrors.push(err41), errors++;
      }
    }
    if (data.loops !== void 0 && typeof data.loops != "boolean") {
      let err42 = { instancePath: instancePath + "/loops", schemaPath: "#/properties/loops/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
      vErrors === null ? vErrors = [err42] : vErrors.push(err42), errors++;
    }
    if (data.exposure !== void 0) {
      let data15 = data.exposure;
      if (typeof data15 == "number" && isFinite(data15)) {
        if (data15 > 86400 || isNaN(data15)) {
          let err43 = { instancePath: instancePath + "/exposure", schemaPath: "#/properties/exposure/maximum", keyword: "maximum", params: { comparison: "<=", limit: 86400 }, message: "must be <= 86400" };
          vErrors === null ? vErrors = [err43] : vErrors.push(err43), errors++;
        }
        if (data15 <= 0 || isNaN(data15)) {
          let err44 = { instancePath: instancePath + "/exposure", schemaPath: "#/properties/exposure/exclusiveMinimum", keyword: "exclusiveMinimum", params: { comparison: ">", limit: 0 }, message: "must be > 0" };
          vErrors === null ? vErrors = [err44] : vErrors.push(err44), errors++;
        }
      } else {
        let err45 = { instancePath: instancePath + "/exposure", schemaPath: "#/properties/exposure/type", keyword: "type", params: { type: "number" }, message: "must be number" };
        vErrors === null ? vErrors = [err45] : vErrors.push(err45), errors++;
      }
    }
    if (data.interval !== void 0) {
      let data16 = data.interval;
      if (typeof data16 == "number" && isFinite(data16)) {
        if (data16 > 86400 || isNaN(data16)) {
          let err46 = { instancePath: instancePath + "/interval", schemaPath: "#/properties/interval/maximum", keyword: "maximum", params: { comparison: "<=", limit: 86400 }, message: "must be <= 86400" };
          vErrors === null ? vErrors = [err46] : vErrors.push(err46), errors++;
        }
        if (data16 <= 0 || isNaN(data16)) {
          let err47 = { instancePath: instancePath + "/interval", schemaPath: "#/properties/interval/exclusiveMinimum", keyword: "exclusiveMinimum", params: { comparison: ">", limit: 0 }, message: "must be > 0" };
          vErrors === null ? vErrors = [err47] : vErrors.push(err47), errors++;
        }
      } else {
        let err48 = { instancePath: instancePath + "/interval", schemaPath: "#/properties/interval/type", keyword: "type", params: { type: "number" }, message: "must be number" };
        vErrors === null ? vErrors = [err48] : vErrors.push(err48), errors++;
      }
    }
    if (data.extensions !== void 0) {
      let data17 = data.extensions;
      if (!(data17 && typeof data17 == "object" && !Array.isArray(data17))) {
        let err49 = { instancePath: instancePath + "/extensions", schemaPath: "#/$defs/extensions/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        vErrors === null ? vErrors = [err49] : vErrors.push(err49), errors++;
      }
    }
  } else {
    let err50 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    vErrors === null ? vErrors = [err50] : vErrors.push(err50), errors++;
  }
  return validate21.errors = vErrors, errors === 0;
}
validate21.evaluated = { props: !0, dynamicProps: !1, dynamicItems: !1 };
var schema43 = { title: "Deliverable", description: "A flat film that the move is delivered as.", type: "object", additionalProperties: !1, required: ["name", "width", "height"], properties: { name: { description: "Unique in the document.", type: "string", minLength: 1, maxLength: 200 }, width: { $ref: "#/$defs/side" }, height: { $ref: "#/$defs/side" }, match: { description: "Which of its sides keeps the first deliverable's coverage. Forbidden on the first, required on every other.", enum: ["width", "height", "diagonal"] }, extensions: { $ref: "#/$defs/extensions" } } };
function validate25(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null, errors = 0, evaluated0 = validate25.evaluated;
  if (evaluated0.dynamicProps && (evaluated0.props = void 0), evaluated0.dynamicItems && (evaluated0.items = void 0), data && typeof data == "object" && !Array.isArray(data)) {
    if (data.name === void 0) {
      let err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "name" }, message: "must have required property 'name'" };
      vErrors === null ? vErrors = [err0] : vErrors.push(err0), errors++;
    }
    if (data.width === void 0) {
      let err1 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "width" }, message: "must have required property 'width'" };
      vErrors === null ? vErrors = [err1] : vErrors.push(err1), errors++;
    }
    if (data.height === void 0) {
      let err2 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "height" }, message: "must have required property 'height'" };
      vErrors === null ? vErrors = [err2] : vErrors.push(err2), errors++;
    }
    for (let key0 in data)
      if (!(key0 === "name" || key0 === "width" || key0 === "height" || key0 === "match" || key0 === "extensions")) {
        let err3 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        vErrors === null ? vErrors = [err3] : vErrors.push(err3), errors++;
      }
    if (data.name !== void 0) {
      let data0 = data.name;
      if (typeof data0 == "string") {
        if (func1(data0) > 200) {
          let err4 = { instancePath: instancePath + "/name", schemaPath: "#/properties/name/maxLength", keyword: "maxLength", params: { limit: 200 }, message: "must NOT have more than 200 characters" };
          vErrors === null ? vErrors = [err4] : vErrors.push(err4), errors++;
        }
        if (func1(data0) < 1) {
          let err5 = { instancePath: instancePath + "/name", schemaPath: "#/properties/name/minLength", keyword: "minLength", params: { limit: 1 }, message: "must NOT have fewer than 1 characters" };
          vErrors === null ? vErrors = [err5] : vErrors.push(err5), errors++;
        }
      } else {
        let err6 = { instancePath: instancePath + "/name", schemaPath: "#/properties/name/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        vErrors === null ? vErrors = [err6] : vErrors.push(err6), errors++;
      }
    }
    if (data.width !== void 0) {
      let data1 = data.width;
      if (!(typeof data1 == "number" && !(data1 % 1) && !isNaN(data1) && isFinite(data1))) {
        let err7 = { instancePath: instancePath + "/width", schemaPath: "#/$defs/side/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        vErrors === null ? vErrors = [err7] : vErrors.push(err7), errors++;
      }
      if (typeof data1 == "number" && isFinite(data1)) {
        if (data1 > 16384 || isNaN(data1)) {
          let err8 = { instancePath: instancePath + "/width", schemaPath: "#/$defs/side/maximum", keyword: "maximum", params: { comparison: "<=", limit: 16384 }, message: "must be <= 16384" };
          vErrors === null ? vErrors = [err8] : vErrors.push(err8), errors++;
        }
        if (data1 < 16 || isNaN(data1)) {
          let err9 = { instancePath: instancePath + "/width", schemaPath: "#/$defs/side/minimum", keyword: "minimum", params: { comparison: ">=", limit: 16 }, message: "must be >= 16" };
          vErrors === null ? vErrors = [err9] : vErrors.push(err9), errors++;
        }
      }
    }
    if (data.height !== void 0) {
      let data2 = data.height;
      if (!(typeof data2 == "number" && !(data2 % 1) && !isNaN(data2) && isFinite(data2))) {
        let err10 = { instancePath: instancePath + "/height", schemaPath: "#/$defs/side/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        vErrors === null ? vErrors = [err10] : vErrors.push(err10), errors++;
      }
      if (typeof data2 == "number" && isFinite(data2)) {
        if (data2 > 16384 || isNaN(data2)) {
          let err11 = { instancePath: instancePath + "/height", schemaPath: "#/$defs/side/maximum", keyword: "maximum", params: { comparison: "<=", limit: 16384 }, message: "must be <= 16384" };
          vErrors === null ? vErrors = [err11] : vErrors.push(err11), errors++;
        }
        if (data2 < 16 || isNaN(data2)) {
          let err12 = { instancePath: instancePath + "/height", schemaPath: "#/$defs/side/minimum", keyword: "minimum", params: { comparison: ">=", limit: 16 }, message: "must be >= 16" };
          vErrors === null ? vErrors = [err12] : vErrors.push(err12), errors++;
        }
      }
    }
    if (data.match !== void 0) {
      let data3 = data.match;
      if (!(data3 === "width" || data3 === "height" || data3 === "diagonal")) {
        let err13 = { instancePath: instancePath + "/match", schemaPath: "#/properties/match/enum", keyword: "enum", params: { allowedValues: schema43.properties.match.enum }, message: "must be equal to one of the allowed values" };
        vErrors === null ? vErrors = [err13] : vErrors.push(err13), errors++;
      }
    }
    if (data.extensions !== void 0) {
      let data4 = data.extensions;
      if (!(data4 && typeof data4 == "object" && !Array.isArray(data4))) {
        let err14 = { instancePath: instancePath + "/extensions", schemaPath: "#/$defs/extensions/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        vErrors === null ? vErrors = [err14] : vErrors.push(err14), errors++;
      }
    }
  } else {
    let err15 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    vErrors === null ? vErrors = [err15] : vErrors.push(err15), errors++;
  }
  return validate25.errors = vErrors, errors === 0;
}
validate25.evaluated = { props: !0, dynamicProps: !1, dynamicItems: !1 };
var schema47 = { title: "Key", description: "Where the frame looks at one source frame.", type: "object", additionalProperties: !1, required: ["frame", "yaw", "pitch", "roll", "fov", "eye"], properties: { frame: { $ref: "#/$defs/frame" }, yaw: { description: "Degrees to the right, not wrapped: 0 to 360 is one whole turn.", type: "number", minimum: -36e3, maximum: 36e3 }, pitch: { description: "Degrees up.", type: "number", minimum: -90, maximum: 90 }, roll: { description: "Degrees clockwise as the operator sees it, not wrapped.", type: "number", minimum: -36e3, maximum: 36e3 }, fov: { description: "Horizontal field of view, degrees: 10 to min(330, 2\xB7acos(\u2212eye) \u2212 10).", type: "number", exclusiveMinimum: 0, exclusiveMaximum: 360 }, eye: { description: "Eye point: 0 rectilinear, 1 stereographic.", type: "number", minimum: 0, maximum: 1 }, rest: { description: "Whether the camera stands still here; false unless said.", type: "boolean" }, leg: { $ref: "#/$defs/leg" }, extensions: { $ref: "#/$defs/extensions" } } }, schema49 = { title: "Leg", description: "How the camera travels from this key to the next. Required on all keys but the last, forbidden there.", type: "object", additionalProperties: !1, required: ["path", "ease"], properties: { path: { description: "By the shortest rotation, or with yaw, pitch and roll each going straight.", enum: ["arc", "level"] }, ease: { $ref: "#/$defs/ease" }, extensions: { $ref: "#/$defs/extensions" } } }, schema50 = { title: "Ease", description: "How time runs along a leg: smooth through the keys, evenly, standing, or by a CSS easing curve.", anyOf: [{ enum: ["fair", "linear", "hold", "ease", "ease-in", "ease-out", "ease-in-out"] }, { type: "object", additionalProperties: !1, required: ["bezier"], properties: { bezier: { description: "x1, y1, x2, y2 of CSS cubic-bezier(): x within 0\u20261, y within \xB110.", type: "array", minItems: 4, maxItems: 4, items: { type: "number", minimum: -10, maximum: 10 } } } }] };
function validate28(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null, errors = 0, evaluated0 = validate28.evaluated;
  if (evaluated0.dynamicProps && (evaluated0.props = void 0), evaluated0.dynamicItems && (evaluated0.items = void 0), data && typeof data == "object" && !Array.isArray(data)) {
    if (data.path === void 0) {
      let err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "path" }, message: "must have required property 'path'" };
      vErrors === null ? vErrors = [err0] : vErrors.push(err0), errors++;
    }
    if (data.ease === void 0) {
      let err1 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "ease" }, message: "must have required property 'ease'" };
      vErrors === null ? vErrors = [err1] : vErrors.push(err1), errors++;
    }
    for (let key0 in data)
      if (!(key0 === "path" || key0 === "ease" || key0 === "extensions")) {
        let err2 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        vErrors === null ? vErrors = [err2] : vErrors.push(err2), errors++;
      }
    if (data.path !== void 0) {
      let data0 = data.path;
      if (!(data0 === "arc" || data0 === "level")) {
        let err3 = { instancePath: instancePath + "/path", schemaPath: "#/properties/path/enum", keyword: "enum", params: { allowedValues: schema49.properties.path.enum }, message: "must be equal to one of the allowed values" };
        vErrors === null ? vErrors = [err3] : vErrors.push(err3), errors++;
      }
    }
    if (data.ease !== void 0) {
      let data1 = data.ease, _errs5 = errors, valid2 = !1, _errs6 = errors;
      if (!(data1 === "fair" || data1 === "linear" || data1 === "hold" || data1 === "ease" || data1 === "ease-in" || data1 === "ease-out" || data1 === "ease-in-out")) {
        let err4 = { instancePath: instancePath + "/ease", schemaPath: "#/$defs/ease/anyOf/0/enum", keyword: "enum", params: { allowedValues: schema50.anyOf[0].enum }, message: "must be equal to one of the allowed values" };
        vErrors === null ? vErrors = [err4] : vErrors.push(err4), errors++;
      }
      var _valid0 = _errs6 === errors;
      valid2 = valid2 || _valid0;
      let _errs7 = errors;
      if (data1 && typeof data1 == "object" && !Array.isArray(data1)) {
        if (data1.bezier === void 0) {
          let err5 = { instancePath: instancePath + "/ease", schemaPath: "#/$defs/ease/anyOf/1/required", keyword: "required", params: { missingProperty: "bezier" }, message: "must have required property 'bezier'" };
          vErrors === null ? vErrors = [err5] : vErrors.push(err5), errors++;
        }
        for (let key1 in data1)
          if (key1 !== "bezier") {
            let err6 = { instancePath: instancePath + "/ease", schemaPath: "#/$defs/ease/anyOf/1/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key1 }, message: "must NOT have additional properties" };
            vErrors === null ? vErrors = [err6] : vErrors.push(err6), errors++;
          }
        if (data1.bezier !== void 0) {
          let data2 = data1.bezier;
          if (Array.isArray(data2)) {
            if (data2.length > 4) {
              let err7 = { instancePath: instancePath + "/ease/bezier", schemaPath: "#/$defs/ease/anyOf/1/properties/bezier/maxItems", keyword: "maxItems", params: { limit: 4 }, message: "must NOT have more than 4 items" };
              vErrors === null ? vErrors = [err7] : vErrors.push(err7), errors++;
            }
            if (data2.length < 4) {
              let err8 = { instancePath: instancePath + "/ease/bezier", schemaPath: "#/$defs/ease/anyOf/1/properties/bezier/minItems", keyword: "minItems", params: { limit: 4 }, message: "must NOT have fewer than 4 items" };
              vErrors === null ? vErrors = [err8] : vErrors.push(err8), errors++;
            }
            let len0 = data2.length;
            for (let i0 = 0; i0 < len0; i0++) {
              let data3 = data2[i0];
              if (typeof data3 == "number" && isFinite(data3)) {
                if (data3 > 10 || isNaN(data3)) {
                  let err9 = { instancePath: instancePath + "/ease/bezier/" + i0, schemaPath: "#/$defs/ease/anyOf/1/properties/bezier/items/maximum", keyword: "maximum", params: { comparison: "<=", limit: 10 }, message: "must be <= 10" };
                  vErrors === null ? vErrors = [err9] : vErrors.push(err9), errors++;
                }
                if (data3 < -10 || isNaN(data3)) {
                  let err10 = { instancePath: instancePath + "/ease/bezier/" + i0, schemaPath: "#/$defs/ease/anyOf/1/properties/bezier/items/minimum", keyword: "minimum", params: { comparison: ">=", limit: -10 }, message: "must be >= -10" };
                  vErrors === null ? vErrors = [err10] : vErrors.push(err10), errors++;
                }
              } else {
                let err11 = { instancePath: instancePath + "/ease/bezier/" + i0, schemaPath: "#/$defs/ease/anyOf/1/properties/bezier/items/type", keyword: "type", params: { type: "number" }, message: "must be number" };
                vErrors === null ? vErrors = [err11] : vErrors.push(err11), errors++;
              }
            }
          } else {
            let err12 = { instancePath: instancePath + "/ease/bezier", schemaPath: "#/$defs/ease/anyOf/1/properties/bezier/type", keyword: "type", params: { type: "array" }, message: "must be array" };
            vErrors === null ? vErrors = [err12] : vErrors.push(err12), errors++;
          }
        }
      } else {
        let err13 = { instancePath: instancePath + "/ease", schemaPath: "#/$defs/ease/anyOf/1/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        vErrors === null ? vErrors = [err13] : vErrors.push(err13), errors++;
      }
      var _valid0 = _errs7 === errors;
      if (valid2 = valid2 || _valid0, valid2)
        errors = _errs5, vErrors !== null && (_errs5 ? vErrors.length = _errs5 : vErrors = null);
      else {
        let err14 = { instancePath: instancePath + "/ease", schemaPath: "#/$defs/ease/anyOf", keyword: "anyOf", params: {}, message: "must match a schema in anyOf" };
        vErrors === null ? vErrors = [err14] : vErrors.push(err14), errors++;
      }
    }
    if (data.extensions !== void 0) {
      let data4 = data.extensions;
      if (!(data4 && typeof data4 == "object" && !Array.isArray(data4))) {
        let err15 = { instancePath: instancePath + "/extensions", schemaPath: "#/$defs/extensions/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        vErrors === null ? vErrors = [err15] : vErrors.push(err15), errors++;
      }
    }
  } else {
    let err16 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    vErrors === null ? vErrors = [err16] : vErrors.push(err16), errors++;
  }
  return validate28.errors = vErrors, errors === 0;
}
validate28.evaluated = { props: !0, dynamicProps: !1, dynamicItems: !1 };
function validate27(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null, errors = 0, evaluated0 = validate27.evaluated;
  if (evaluated0.dynamicProps && (evaluated0.props = void 0), evaluated0.dynamicItems && (evaluated0.items = void 0), data && typeof data == "object" && !Array.isArray(data)) {
    if (data.frame === void 0) {
      let err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "frame" }, message: "must have required property 'frame'" };
      vErrors === null ? vErrors = [err0] : vErrors.push(err0), errors++;
    }
    if (data.yaw === void 0) {
      let err1 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "yaw" }, message: "must have required property 'yaw'" };
      vErrors === null ? vErrors = [err1] : vErrors.push(err1), errors++;
    }
    if (data.pitch === void 0) {
      let err2 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "pitch" }, message: "must have required property 'pitch'" };
      vErrors === null ? vErrors = [err2] : vErrors.push(err2), errors++;
    }
    if (data.roll === void 0) {
      let err3 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "roll" }, message: "must have required property 'roll'" };
      vErrors === null ? vErrors = [err3] : vErrors.push(err3), errors++;
    }
    if (data.fov === void 0) {
      let err4 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "fov" }, message: "must have required property 'fov'" };
      vErrors === null ? vErrors = [err4] : vErrors.push(err4), errors++;
    }
    if (data.eye === void 0) {
      let err5 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "eye" }, message: "must have required property 'eye'" };
      vErrors === null ? vErrors = [err5] : vErrors.push(err5), errors++;
    }
    for (let key0 in data)
      if (!func3.call(schema47.properties, key0)) {
        let err6 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        vErrors === null ? vErrors = [err6] : vErrors.push(err6), errors++;
      }
    if (data.frame !== void 0) {
      let data0 = data.frame;
      if (!(typeof data0 == "number" && !(data0 % 1) && !isNaN(data0) && isFinite(data0))) {
        let err7 = { instancePath: instancePath + "/frame", schemaPath: "#/$defs/frame/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        vErrors === null ? vErrors = [err7] : vErrors.push(err7), errors++;
      }
      if (typeof data0 == "number" && isFinite(data0)) {
        if (data0 > 1e7 || isNaN(data0)) {
          let err8 = { instancePath: instancePath + "/frame", schemaPath: "#/$defs/frame/maximum", keyword: "maximum", params: { comparison: "<=", limit: 1e7 }, message: "must be <= 10000000" };
          vErrors === null ? vErrors = [err8] : vErrors.push(err8), errors++;
        }
        if (data0 < 0 || isNaN(data0)) {
          let err9 = { instancePath: instancePath + "/frame", schemaPath: "#/$defs/frame/minimum", keyword: "minimum", params: { comparison: ">=", limit: 0 }, message: "must be >= 0" };
          vErrors === null ? vErrors = [err9] : vErrors.push(err9), errors++;
        }
      }
    }
    if (data.yaw !== void 0) {
      let data1 = data.yaw;
      if (typeof data1 == "number" && isFinite(data1)) {
        if (data1 > 36e3 || isNaN(data1)) {
          let err10 = { instancePath: instancePath + "/yaw", schemaPath: "#/properties/yaw/maximum", keyword: "maximum", params: { comparison: "<=", limit: 36e3 }, message: "must be <= 36000" };
          vErrors === null ? vErrors = [err10] : vErrors.push(err10), errors++;
        }
        if (data1 < -36e3 || isNaN(data1)) {
          let err11 = { instancePath: instancePath + "/yaw", schemaPath: "#/properties/yaw/minimum", keyword: "minimum", params: { comparison: ">=", limit: -36e3 }, message: "must be >= -36000" };
          vErrors === null ? vErrors = [err11] : vErrors.push(err11), errors++;
        }
      } else {
        let err12 = { instancePath: instancePath + "/yaw", schemaPath: "#/properties/yaw/type", keyword: "type", params: { type: "number" }, message: "must be number" };
        vErrors === null ? vErrors = [err12] : vErrors.push(err12), errors++;
      }
    }
    if (data.pitch !== void 0) {
      let data2 = data.pitch;
      if (typeof data2 == "number" && isFinite(data2)) {
        if (data2 > 90 || isNaN(data2)) {
          let err13 = { instancePath: instancePath + "/pitch", schemaPath: "#/properties/pitch/maximum", keyword: "maximum", params: { comparison: "<=", limit: 90 }, message: "must be <= 90" };
          vErrors === null ? vErrors = [err13] : vErrors.push(err13), errors++;
        }
        if (data2 < -90 || isNaN(data2)) {
          let err14 = { instancePath: instancePath + "/pitch", schemaPath: "#/properties/pitch/minimum", keyword: "minimum", params: { comparison: ">=", limit: -90 }, message: "must be >= -90" };
          vErrors === null ? vErrors = [err14] : vErrors.push(err14), errors++;
        }
      } else {
        let err15 = { instancePath: instancePath + "/pitch", schemaPath: "#/properties/pitch/type", keyword: "type", params: { type: "number" }, message: "must be number" };
        vErrors === null ? vErrors = [err15] : vErrors.push(err15), errors++;
      }
    }
    if (data.roll !== void 0) {
      let data3 = data.roll;
      if (typeof data3 == "number" && isFinite(data3)) {
        if (data3 > 36e3 || isNaN(data3)) {
          let err16 = { instancePath: instancePath + "/roll", schemaPath: "#/properties/roll/maximum", keyword: "maximum", params: { comparison: "<=", limit: 36e3 }, message: "must be <= 36000" };
          vErrors === null ? vErrors = [err16] : vErrors.push(err16), errors++;
        }
        if (data3 < -36e3 || isNaN(data3)) {
          let err17 = { instancePath: instancePath + "/roll", schemaPath: "#/properties/roll/minimum", keyword: "minimum", params: { comparison: ">=", limit: -36e3 }, message: "must be >= -36000" };
          vErrors === null ? vErrors = [err17] : vErrors.push(err17), errors++;
        }
      } else {
        let err18 = { instancePath: instancePath + "/roll", schemaPath: "#/properties/roll/type", keyword: "type", params: { type: "number" }, message: "must be number" };
        vErrors === null ? vErrors = [err18] : vErrors.push(err18), errors++;
      }
    }
    if (data.fov !== void 0) {
      let data4 = data.fov;
      if (typeof data4 == "number" && isFinite(data4)) {
        if (data4 >= 360 || isNaN(data4)) {
          let err19 = { instancePath: instancePath + "/fov", schemaPath: "#/properties/fov/exclusiveMaximum", keyword: "exclusiveMaximum", params: { comparison: "<", limit: 360 }, message: "must be < 360" };
          vErrors === null ? vErrors = [err19] : vErrors.push(err19), errors++;
        }
        if (data4 <= 0 || isNaN(data4)) {
          let err20 = { instancePath: instancePath + "/fov", schemaPath: "#/properties/fov/exclusiveMinimum", keyword: "exclusiveMinimum", params: { comparison: ">", limit: 0 }, message: "must be > 0" };
          vErrors === null ? vErrors = [err20] : vErrors.push(err20), errors++;
        }
      } else {
        let err21 = { instancePath: instancePath + "/fov", schemaPath: "#/properties/fov/type", keyword: "type", params: { type: "number" }, message: "must be number" };
        vErrors === null ? vErrors = [err21] : vErrors.push(err21), errors++;
      }
    }
    if (data.eye !== void 0) {
      let data5 = data.eye;
      if (typeof data5 == "number" && isFinite(data5)) {
        if (data5 > 1 || isNaN(data5)) {
          let err22 = { instancePath: instancePath + "/eye", schemaPath: "#/properties/eye/maximum", keyword: "maximum", params: { comparison: "<=", limit: 1 }, message: "must be <= 1" };
          vErrors === null ? vErrors = [err22] : vErrors.push(err22), errors++;
        }
        if (data5 < 0 || isNaN(data5)) {
          let err23 = { instancePath: instancePath + "/eye", schemaPath: "#/properties/eye/minimum", keyword: "minimum", params: { comparison: ">=", limit: 0 }, message: "must be >= 0" };
          vErrors === null ? vErrors = [err23] : vErrors.push(err23), errors++;
        }
      } else {
        let err24 = { instancePath: instancePath + "/eye", schemaPath: "#/properties/eye/type", keyword: "type", params: { type: "number" }, message: "must be number" };
        vErrors === null ? vErrors = [err24] : vErrors.push(err24), errors++;
      }
    }
    if (data.rest !== void 0 && typeof data.rest != "boolean") {
      let err25 = { instancePath: instancePath + "/rest", schemaPath: "#/properties/rest/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
      vErrors === null ? vErrors = [err25] : vErrors.push(err25), errors++;
    }
    if (data.leg !== void 0 && (validate28(data.leg, { instancePath: instancePath + "/leg", parentData: data, parentDataProperty: "leg", rootData, dynamicAnchors }) || (vErrors = vErrors === null ? validate28.errors : vErrors.concat(validate28.errors), errors = vErrors.length)), data.extensions !== void 0) {
      let data8 = data.extensions;
      if (!(data8 && typeof data8 == "object" && !Array.isArray(data8))) {
        let err26 = { instancePath: instancePath + "/extensions", schemaPath: "#/$defs/extensions/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        vErrors === null ? vErrors = [err26] : vErrors.push(err26), errors++;
      }
    }
  } else {
    let err27 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    vErrors === null ? vErrors = [err27] : vErrors.push(err27), errors++;
  }
  return validate27.errors = vErrors, errors === 0;
}
validate27.evaluated = { props: !0, dynamicProps: !1, dynamicItems: !1 };
function validate20(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null, errors = 0, evaluated0 = validate20.evaluated;
  if (evaluated0.dynamicProps && (evaluated0.props = void 0), evaluated0.dynamicItems && (evaluated0.items = void 0), data && typeof data == "object" && !Array.isArray(data)) {
    if (data.format === void 0) {
      let err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "format" }, message: "must have required property 'format'" };
      vErrors === null ? vErrors = [err0] : vErrors.push(err0), errors++;
    }
    if (data.version === void 0) {
      let err1 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "version" }, message: "must have required property 'version'" };
      vErrors === null ? vErrors = [err1] : vErrors.push(err1), errors++;
    }
    if (data.title === void 0) {
      let err2 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "title" }, message: "must have required property 'title'" };
      vErrors === null ? vErrors = [err2] : vErrors.push(err2), errors++;
    }
    if (data.shot === void 0) {
      let err3 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "shot" }, message: "must have required property 'shot'" };
      vErrors === null ? vErrors = [err3] : vErrors.push(err3), errors++;
    }
    if (data.deliverables === void 0) {
      let err4 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "deliverables" }, message: "must have required property 'deliverables'" };
      vErrors === null ? vErrors = [err4] : vErrors.push(err4), errors++;
    }
    if (data.keys === void 0) {
      let err5 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "keys" }, message: "must have required property 'keys'" };
      vErrors === null ? vErrors = [err5] : vErrors.push(err5), errors++;
    }
    for (let key0 in data)
      if (!(key0 === "format" || key0 === "version" || key0 === "title" || key0 === "notes" || key0 === "shot" || key0 === "deliverables" || key0 === "keys" || key0 === "extensions")) {
        let err6 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        vErrors === null ? vErrors = [err6] : vErrors.push(err6), errors++;
      }
    if (data.format !== void 0 && data.format !== "fairlead.move") {
      let err7 = { instancePath: instancePath + "/format", schemaPath: "#/properties/format/const", keyword: "const", params: { allowedValue: "fairlead.move" }, message: "must be equal to constant" };
      vErrors === null ? vErrors = [err7] : vErrors.push(err7), errors++;
    }
    if (data.version !== void 0 && data.version !== 1) {
      let err8 = { instancePath: instancePath + "/version", schemaPath: "#/properties/version/const", keyword: "const", params: { allowedValue: 1 }, message: "must be equal to constant" };
      vErrors === null ? vErrors = [err8] : vErrors.push(err8), errors++;
    }
    if (data.title !== void 0) {
      let data2 = data.title;
      if (typeof data2 == "string") {
        if (func1(data2) > 200) {
          let err9 = { instancePath: instancePath + "/title", schemaPath: "#/$defs/title/maxLength", keyword: "maxLength", params: { limit: 200 }, message: "must NOT have more than 200 characters" };
          vErrors === null ? vErrors = [err9] : vErrors.push(err9), errors++;
        }
      } else {
        let err10 = { instancePath: instancePath + "/title", schemaPath: "#/$defs/title/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        vErrors === null ? vErrors = [err10] : vErrors.push(err10), errors++;
      }
    }
    if (data.notes !== void 0) {
      let data3 = data.notes;
      if (typeof data3 == "string") {
        if (func1(data3) > 2e4) {
          let err11 = { instancePath: instancePath + "/notes", schemaPath: "#/$defs/notes/maxLength", keyword: "maxLength", params: { limit: 2e4 }, message: "must NOT have more than 20000 characters" };
          vErrors === null ? vErrors = [err11] : vErrors.push(err11), errors++;
        }
      } else {
        let err12 = { instancePath: instancePath + "/notes", schemaPath: "#/$defs/notes/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        vErrors === null ? vErrors = [err12] : vErrors.push(err12), errors++;
      }
    }
    if (data.shot !== void 0 && (validate21(data.shot, { instancePath: instancePath + "/shot", parentData: data, parentDataProperty: "shot", rootData, dynamicAnchors }) || (vErrors = vErrors === null ? validate21.errors : vErrors.concat(validate21.errors), errors = vErrors.length)), data.deliverables !== void 0) {
      let data5 = data.deliverables;
      if (Array.isArray(data5)) {
        if (data5.length > 12) {
          let err13 = { instancePath: instancePath + "/deliverables", schemaPath: "#/properties/deliverables/maxItems", keyword: "maxItems", params: { limit: 12 }, message: "must NOT have more than 12 items" };
          vErrors === null ? vErrors = [err13] : vErrors.push(err13), errors++;
        }
        if (data5.length < 1) {
          let err14 = { instancePath: instancePath + "/deliverables", schemaPath: "#/properties/deliverables/minItems", keyword: "minItems", params: { limit: 1 }, message: "must NOT have fewer than 1 items" };
          vErrors === null ? vErrors = [err14] : vErrors.push(err14), errors++;
        }
        let len0 = data5.length;
        for (let i0 = 0; i0 < len0; i0++)
          validate25(data5[i0], { instancePath: instancePath + "/deliverables/" + i0, parentData: data5, parentDataProperty: i0, rootData, dynamicAnchors }) || (vErrors = vErrors === null ? validate25.errors : vErrors.concat(validate25.errors), errors = vErrors.length);
      } else {
        let err15 = { instancePath: instancePath + "/deliverables", schemaPath: "#/properties/deliverables/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        vErrors === null ? vErrors = [err15] : vErrors.push(err15), errors++;
      }
    }
    if (data.keys !== void 0) {
      let data7 = data.keys;
      if (Array.isArray(data7)) {
        if (data7.length > 2e3) {
          let err16 = { instancePath: instancePath + "/keys", schemaPath: "#/properties/keys/maxItems", keyword: "maxItems", params: { limit: 2e3 }, message: "must NOT have more than 2000 items" };
          vErrors === null ? vErrors = [err16] : vErrors.push(err16), errors++;
        }
        if (data7.length < 1) {
          let err17 = { instancePath: instancePath + "/keys", schemaPath: "#/properties/keys/minItems", keyword: "minItems", params: { limit: 1 }, message: "must NOT have fewer than 1 items" };
          vErrors === null ? vErrors = [err17] : vErrors.push(err17), errors++;
        }
        let len1 = data7.length;
        for (let i1 = 0; i1 < len1; i1++)
          validate27(data7[i1], { instancePath: instancePath + "/keys/" + i1, parentData: data7, parentDataProperty: i1, rootData, dynamicAnchors }) || (vErrors = vErrors === null ? validate27.errors : vErrors.concat(validate27.errors), errors = vErrors.length);
      } else {
        let err18 = { instancePath: instancePath + "/keys", schemaPath: "#/properties/keys/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        vErrors === null ? vErrors = [err18] : vErrors.push(err18), errors++;
      }
    }
    if (data.extensions !== void 0) {
      let data9 = data.extensions;
      if (!(data9 && typeof data9 == "object" && !Array.isArray(data9))) {
        let err19 = { instancePath: instancePath + "/extensions", schemaPath: "#/$defs/extensions/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        vErrors === null ? vErrors = [err19] : vErrors.push(err19), errors++;
      }
    }
  } else {
    let err20 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    vErrors === null ? vErrors = [err20] : vErrors.push(err20), errors++;
  }
  return validate20.errors = vErrors, errors === 0;
}
validate20.evaluated = { props: !0, dynamicProps: !1, dynamicItems: !1 };

export const validate: SchemaValidator<MoveDocument> = machineMade as SchemaValidator<MoveDocument>;
