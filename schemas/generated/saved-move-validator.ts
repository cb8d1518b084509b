// Made by `npm run generate` from the JSON Schema of the same name. Not to be edited.
// @ts-nocheck: machine-made code; its type is stated at the end.
import { type SchemaValidator } from './schema-validator';
import { type SavedMove } from './saved-move';

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
var machineMade = validate20, schema31 = { $schema: "https://json-schema.org/draft/2020-12/schema", $id: "saved-move.schema.json", title: "SavedMove", description: "A camera move to be used again on other shots: keys along the move instead of at frames, yaw from where it starts to look. Angles in degrees.", type: "object", additionalProperties: !1, required: ["format", "version", "title", "deliverables", "keys"], properties: { format: { const: "fairlead.saved-move" }, version: { const: 1 }, title: { $ref: "move.schema.json#/$defs/title" }, notes: { $ref: "move.schema.json#/$defs/notes" }, deliverables: { description: "What it was made for; the field of view is meant for the first.", type: "array", minItems: 1, maxItems: 12, items: { $ref: "move.schema.json#/$defs/deliverable" } }, keys: { description: "The keys, at rising places along the move: the first at 0, the last of several at 1.", type: "array", minItems: 1, maxItems: 2e3, items: { $ref: "#/$defs/savedKey" } }, tags: { description: "Words to find it by.", type: "array", maxItems: 50, items: { type: "string", minLength: 1, maxLength: 100 } }, author: { description: "Who made it.", type: "string", maxLength: 200 }, licence: { description: "Under which licence it may be used: an SPDX licence name or expression, such as CC-BY-4.0.", type: "string", minLength: 1, maxLength: 200, pattern: "^[A-Za-z0-9.+()\\- :]+$" }, usual: { description: "Usual length, seconds of the delivered film.", type: "number", exclusiveMinimum: 0, maximum: 1e15 }, turns: { description: "Turns of yaw from the first key to the last, to the right; not always whole.", type: "number", minimum: -200, maximum: 200 }, extensions: { $ref: "move.schema.json#/$defs/extensions" } }, $defs: { savedKey: { title: "SavedKey", description: "Where the frame looks at one place along the move.", type: "object", additionalProperties: !1, required: ["at", "yaw", "pitch", "roll", "fov", "eye"], properties: { at: { description: "Share of the move's length, 0 to 1.", type: "number", minimum: 0, maximum: 1 }, yaw: { description: "Degrees to the right of the first key's yaw, not wrapped; 0 at the first.", type: "number", minimum: -72e3, maximum: 72e3 }, pitch: { description: "Degrees up.", type: "number", minimum: -90, maximum: 90 }, roll: { description: "Degrees clockwise as the operator sees it, not wrapped.", type: "number", minimum: -36e3, maximum: 36e3 }, fov: { description: "Horizontal field of view of the first deliverable, degrees: 10 to min(330, 2\xB7acos(\u2212eye) \u2212 10).", type: "number", exclusiveMinimum: 0, exclusiveMaximum: 360 }, eye: { description: "Eye point: 0 rectilinear, 1 stereographic.", type: "number", minimum: 0, maximum: 1 }, rest: { description: "Whether the camera stands still here; false unless said.", type: "boolean" }, leg: { $ref: "move.schema.json#/$defs/leg" }, extensions: { $ref: "move.schema.json#/$defs/extensions" } } } } };
var func1 = Object.prototype.hasOwnProperty, func2 = require_ucs2length().default, schema44 = { title: "Deliverable", description: "A flat film that the move is delivered as.", type: "object", additionalProperties: !1, required: ["name", "width", "height"], properties: { name: { description: "Unique in the document.", type: "string", minLength: 1, maxLength: 200 }, width: { $ref: "#/$defs/side" }, height: { $ref: "#/$defs/side" }, match: { description: "Which of its sides keeps the first deliverable's coverage. Forbidden on the first, required on every other.", enum: ["width", "height", "diagonal"] }, extensions: { $ref: "#/$defs/extensions" } } };
function validate32(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null, errors = 0, evaluated0 = validate32.evaluated;
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
        if (func2(data0) > 200) {
          let err4 = { instancePath: instancePath + "/name", schemaPath: "#/properties/name/maxLength", keyword: "maxLength", params: { limit: 200 }, message: "must NOT have more than 200 characters" };
          vErrors === null ? vErrors = [err4] : vErrors.push(err4), errors++;
        }
        if (func2(data0) < 1) {
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
        let err13 = { instancePath: instancePath + "/match", schemaPath: "#/properties/match/enum", keyword: "enum", params: { allowedValues: schema44.properties.match.enum }, message: "must be equal to one of the allowed values" };
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
  return validate32.errors = vErrors, errors === 0;
}
validate32.evaluated = { props: !0, dynamicProps: !1, dynamicItems: !1 };
var schema61 = { title: "SavedKey", description: "Where the frame looks at one place along the move.", type: "object", additionalProperties: !1, required: ["at", "yaw", "pitch", "roll", "fov", "eye"], properties: { at: { description: "Share of the move's length, 0 to 1.", type: "number", minimum: 0, maximum: 1 }, yaw: { description: "Degrees to the right of the first key's yaw, not wrapped; 0 at the first.", type: "number", minimum: -72e3, maximum: 72e3 }, pitch: { description: "Degrees up.", type: "number", minimum: -90, maximum: 90 }, roll: { description: "Degrees clockwise as the operator sees it, not wrapped.", type: "number", minimum: -36e3, maximum: 36e3 }, fov: { description: "Horizontal field of view of the first deliverable, degrees: 10 to min(330, 2\xB7acos(\u2212eye) \u2212 10).", type: "number", exclusiveMinimum: 0, exclusiveMaximum: 360 }, eye: { description: "Eye point: 0 rectilinear, 1 stereographic.", type: "number", minimum: 0, maximum: 1 }, rest: { description: "Whether the camera stands still here; false unless said.", type: "boolean" }, leg: { $ref: "move.schema.json#/$defs/leg" }, extensions: { $ref: "move.schema.json#/$defs/extensions" } } }, schema50 = { title: "Leg", description: "How the camera travels from this key to the next. Required on all keys but the last, forbidden there.", type: "object", additionalProperties: !1, required: ["path", "ease"], properties: { path: { description: "By the shortest rotation, or with yaw, pitch and roll each going straight.", enum: ["arc", "level"] }, ease: { $ref: "#/$defs/ease" }, extensions: { $ref: "#/$defs/extensions" } } }, schema51 = { title: "Ease", description: "How time runs along a leg: smooth through the keys, evenly, standing, or by a CSS easing curve.", anyOf: [{ enum: ["fair", "linear", "hold", "ease", "ease-in", "ease-out", "ease-in-out"] }, { type: "object", additionalProperties: !1, required: ["bezier"], properties: { bezier: { description: "x1, y1, x2, y2 of CSS cubic-bezier(): x within 0\u20261, y within \xB110.", type: "array", minItems: 4, maxItems: 4, items: { type: "number", minimum: -10, maximum: 10 } } } }] };
function validate35(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null, errors = 0, evaluated0 = validate35.evaluated;
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
        let err3 = { instancePath: instancePath + "/path", schemaPath: "#/properties/path/enum", keyword: "enum", params: { allowedValues: schema50.properties.path.enum }, message: "must be equal to one of the allowed values" };
        vErrors === null ? vErrors = [err3] : vErrors.push(err3), errors++;
      }
    }
    if (data.ease !== void 0) {
      let data1 = data.ease, _errs5 = errors, valid2 = !1, _errs6 = errors;
      if (!(data1 === "fair" || data1 === "linear" || data1 === "hold" || data1 === "ease" || data1 === "ease-in" || data1 === "ease-out" || data1 === "ease-in-out")) {
        let err4 = { instancePath: instancePath + "/ease", schemaPath: "#/$defs/ease/anyOf/0/enum", keyword: "enum", params: { allowedValues: schema51.anyOf[0].enum }, message: "must be equal to one of the allowed values" };
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
  return validate35.errors = vErrors, errors === 0;
}
validate35.evaluated = { props: !0, dynamicProps: !1, dynamicItems: !1 };
function validate34(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null, errors = 0, evaluated0 = validate34.evaluated;
  if (evaluated0.dynamicProps && (evaluated0.props = void 0), evaluated0.dynamicItems && (evaluated0.items = void 0), data && typeof data == "object" && !Array.isArray(data)) {
    if (data.at === void 0) {
      let err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "at" }, message: "must have required property 'at'" };
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
      if (!func1.call(schema61.properties, key0)) {
        let err6 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        vErrors === null ? vErrors = [err6] : vErrors.push(err6), errors++;
      }
    if (data.at !== void 0) {
      let data0 = data.at;
      if (typeof data0 == "number" && isFinite(data0)) {
        if (data0 > 1 || isNaN(data0)) {
          let err7 = { instancePath: instancePath + "/at", schemaPath: "#/properties/at/maximum", keyword: "maximum", params: { comparison: "<=", limit: 1 }, message: "must be <= 1" };
          vErrors === null ? vErrors = [err7] : vErrors.push(err7), errors++;
        }
        if (data0 < 0 || isNaN(data0)) {
          let err8 = { instancePath: instancePath + "/at", schemaPath: "#/properties/at/minimum", keyword: "minimum", params: { comparison: ">=", limit: 0 }, message: "must be >= 0" };
          vErrors === null ? vErrors = [err8] : vErrors.push(err8), errors++;
        }
      } else {
        let err9 = { instancePath: instancePath + "/at", schemaPath: "#/properties/at/type", keyword: "type", params: { type: "number" }, message: "must be number" };
        vErrors === null ? vErrors = [err9] : vErrors.push(err9), errors++;
      }
    }
    if (data.yaw !== void 0) {
      let data1 = data.yaw;
      if (typeof data1 == "number" && isFinite(data1)) {
        if (data1 > 72e3 || isNaN(data1)) {
          let err10 = { instancePath: instancePath + "/yaw", schemaPath: "#/properties/yaw/maximum", keyword: "maximum", params: { comparison: "<=", limit: 72e3 }, message: "must be <= 72000" };
          vErrors === null ? vErrors = [err10] : vErrors.push(err10), errors++;
        }
        if (data1 < -72e3 || isNaN(data1)) {
          let err11 = { instancePath: instancePath + "/yaw", schemaPath: "#/properties/yaw/minimum", keyword: "minimum", params: { comparison: ">=", limit: -72e3 }, message: "must be >= -72000" };
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
    if (data.leg !== void 0 && (validate35(data.leg, { instancePath: instancePath + "/leg", parentData: data, parentDataProperty: "leg", rootData, dynamicAnchors }) || (vErrors = vErrors === null ? validate35.errors : vErrors.concat(validate35.errors), errors = vErrors.length)), data.extensions !== void 0) {
      let data8 = data.extensions;
      if (!(data8 && typeof data8 == "object" && !Array.isArray(data8))) {
        let err26 = { instancePath: instancePath + "/extensions", schemaPath: "move.schema.json#/$defs/extensions/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        vErrors === null ? vErrors = [err26] : vErrors.push(err26), errors++;
      }
    }
  } else {
    let err27 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    vErrors === null ? vErrors = [err27] : vErrors.push(err27), errors++;
  }
  return validate34.errors = vErrors, errors === 0;
}
validate34.evaluated = { props: !0, dynamicProps: !1, dynamicItems: !1 };
var pattern5 = new RegExp("^[A-Za-z0-9.+()\\- :]+$", "u");
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
    if (data.deliverables === void 0) {
      let err3 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "deliverables" }, message: "must have required property 'deliverables'" };
      vErrors === null ? vErrors = [err3] : vErrors.push(err3), errors++;
    }
    if (data.keys === void 0) {
      let err4 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "keys" }, message: "must have required property 'keys'" };
      vErrors === null ? vErrors = [err4] : vErrors.push(err4), errors++;
    }
    for (let key0 in data)
      if (!func1.call(schema31.properties, key0)) {
        let err5 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        vErrors === null ? vErrors = [err5] : vErrors.push(err5), errors++;
      }
    if (data.format !== void 0 && data.format !== "fairlead.saved-move") {
      let err6 = { instancePath: instancePath + "/format", schemaPath: "#/properties/format/const", keyword: "const", params: { allowedValue: "fairlead.saved-move" }, message: "must be equal to constant" };
      vErrors === null ? vErrors = [err6] : vErrors.push(err6), errors++;
    }
    if (data.version !== void 0 && data.version !== 1) {
      let err7 = { instancePath: instancePath + "/version", schemaPath: "#/properties/version/const", keyword: "const", params: { allowedValue: 1 }, message: "must be equal to constant" };
      vErrors === null ? vErrors = [err7] : vErrors.push(err7), errors++;
    }
    if (data.title !== void 0) {
      let data2 = data.title;
      if (typeof data2 == "string") {
        if (func2(data2) > 200) {
          let err8 = { instancePath: instancePath + "/title", schemaPath: "move.schema.json#/$defs/title/maxLength", keyword: "maxLength", params: { limit: 200 }, message: "must NOT have more than 200 characters" };
          vErrors === null ? vErrors = [err8] : vErrors.push(err8), errors++;
        }
      } else {
        let err9 = { instancePath: instancePath + "/title", schemaPath: "move.schema.json#/$defs/title/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        vErrors === null ? vErrors = [err9] : vErrors.push(err9), errors++;
      }
    }
    if (data.notes !== void 0) {
      let data3 = data.notes;
      if (typeof data3 == "string") {
        if (func2(data3) > 2e4) {
          let err10 = { instancePath: instancePath + "/notes", schemaPath: "move.schema.json#/$defs/notes/maxLength", keyword: "maxLength", params: { limit: 2e4 }, message: "must NOT have more than 20000 characters" };
          vErrors === null ? vErrors = [err10] : vErrors.push(err10), errors++;
        }
      } else {
        let err11 = { instancePath: instancePath + "/notes", schemaPath: "move.schema.json#/$defs/notes/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        vErrors === null ? vErrors = [err11] : vErrors.push(err11), errors++;
      }
    }
    if (data.deliverables !== void 0) {
      let data4 = data.deliverables;
      if (Array.isArray(data4)) {
        if (data4.length > 12) {
          let err12 = { instancePath: instancePath + "/deliverables", schemaPath: "#/properties/deliverables/maxItems", keyword: "maxItems", params: { limit: 12 }, message: "must NOT have more than 12 items" };
          vErrors === null ? vErrors = [err12] : vErrors.push(err12), errors++;
        }
        if (data4.length < 1) {
          let err13 = { instancePath: instancePath + "/deliverables", schemaPath: "#/properties/deliverables/minItems", keyword: "minItems", params: { limit: 1 }, message: "must NOT have fewer than 1 items" };
          vErrors === null ? vErrors = [err13] : vErrors.push(err13), errors++;
        }
        let len0 = data4.length;
        for (let i0 = 0; i0 < len0; i0++)
          validate32(data4[i0], { instancePath: instancePath + "/deliverables/" + i0, parentData: data4, parentDataProperty: i0, rootData, dynamicAnchors }) || (vErrors = vErrors === null ? validate32.errors : vErrors.concat(validate32.errors), errors = vErrors.length);
      } else {
        let err14 = { instancePath: instancePath + "/deliverables", schemaPath: "#/properties/deliverables/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        vErrors === null ? vErrors = [err14] : vErrors.push(err14), errors++;
      }
    }
    if (data.keys !== void 0) {
      let data6 = data.keys;
      if (Array.isArray(data6)) {
        if (data6.length > 2e3) {
          let err15 = { instancePath: instancePath + "/keys", schemaPath: "#/properties/keys/maxItems", keyword: "maxItems", params: { limit: 2e3 }, message: "must NOT have more than 2000 items" };
          vErrors === null ? vErrors = [err15] : vErrors.push(err15), errors++;
        }
        if (data6.length < 1) {
          let err16 = { instancePath: instancePath + "/keys", schemaPath: "#/properties/keys/minItems", keyword: "minItems", params: { limit: 1 }, message: "must NOT have fewer than 1 items" };
          vErrors === null ? vErrors = [err16] : vErrors.push(err16), errors++;
        }
        let len1 = data6.length;
        for (let i1 = 0; i1 < len1; i1++)
          validate34(data6[i1], { instancePath: instancePath + "/keys/" + i1, parentData: data6, parentDataProperty: i1, rootData, dynamicAnchors }) || (vErrors = vErrors === null ? validate34.errors : vErrors.concat(validate34.errors), errors = vErrors.length);
      } else {
        let err17 = { instancePath: instancePath + "/keys", schemaPath: "#/properties/keys/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        vErrors === null ? vErrors = [err17] : vErrors.push(err17), errors++;
      }
    }
    if (data.tags !== void 0) {
      let data8 = data.tags;
      if (Array.isArray(data8)) {
        if (data8.length > 50) {
          let err18 = { instancePath: instancePath + "/tags", schemaPath: "#/properties/tags/maxItems", keyword: "maxItems", params: { limit: 50 }, message: "must NOT have more than 50 items" };
          vErrors === null ? vErrors = [err18] : vErrors.push(err18), errors++;
        }
        let len2 = data8.length;
        for (let i2 = 0; i2 < len2; i2++) {
          let data9 = data8[i2];
          if (typeof data9 == "string") {
            if (func2(data9) > 100) {
              let err19 = { instancePath: instancePath + "/tags/" + i2, schemaPath: "#/properties/tags/items/maxLength", keyword: "maxLength", params: { limit: 100 }, message: "must NOT have more than 100 characters" };
              vErrors === null ? vErrors = [err19] : vErrors.push(err19), errors++;
            }
            if (func2(data9) < 1) {
              let err20 = { instancePath: instancePath + "/tags/" + i2, schemaPath: "#/properties/tags/items/minLength", keyword: "minLength", params: { limit: 1 }, message: "must NOT have fewer than 1 characters" };
              vErrors === null ? vErrors = [err20] : vErrors.push(err20), errors++;
            }
          } else {
            let err21 = { instancePath: instancePath + "/tags/" + i2, schemaPath: "#/properties/tags/items/type", keyword: "type", params: { type: "string" }, message: "must be string" };
            vErrors === null ? vErrors = [err21] : vErrors.push(err21), errors++;
          }
        }
      } else {
        let err22 = { instancePath: instancePath + "/tags", schemaPath: "#/properties/tags/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        vErrors === null ? vErrors = [err22] : vErrors.push(err22), errors++;
      }
    }
    if (data.author !== void 0) {
      let data10 = data.author;
      if (typeof data10 == "string") {
        if (func2(data10) > 200) {
          let err23 = { instancePath: instancePath + "/author", schemaPath: "#/properties/author/maxLength", keyword: "maxLength", params: { limit: 200 }, message: "must NOT have more than 200 characters" };
          vErrors === null ? vErrors = [err23] : vErrors.push(err23), errors++;
        }
      } else {
        let err24 = { instancePath: instancePath + "/author", schemaPath: "#/properties/author/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        vErrors === null ? vErrors = [err24] : vErrors.push(err24), errors++;
      }
    }
    if (data.licence !== void 0) {
      let data11 = data.licence;
      if (typeof data11 == "string") {
        if (func2(data11) > 200) {
          let err25 = { instancePath: instancePath + "/licence", schemaPath: "#/properties/licence/maxLength", keyword: "maxLength", params: { limit: 200 }, message: "must NOT have more than 200 characters" };
          vErrors === null ? vErrors = [err25] : vErrors.push(err25), errors++;
        }
        if (func2(data11) < 1) {
          let err26 = { instancePath: instancePath + "/licence", schemaPath: "#/properties/licence/minLength", keyword: "minLength", params: { limit: 1 }, message: "must NOT have fewer than 1 characters" };
          vErrors === null ? vErrors = [err26] : vErrors.push(err26), errors++;
        }
        if (!pattern5.test(data11)) {
          let err27 = { instancePath: instancePath + "/licence", schemaPath: "#/properties/licence/pattern", keyword: "pattern", params: { pattern: "^[A-Za-z0-9.+()\\- :]+$" }, message: 'must match pattern "^[A-Za-z0-9.+()\\- :]+$"' };
          vErrors === null ? vErrors = [err27] : vErrors.push(err27), errors++;
        }
      } else {
        let err28 = { instancePath: instancePath + "/licence", schemaPath: "#/properties/licence/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        vErrors === null ? vErrors = [err28] : vErrors.push(err28), errors++;
      }
    }
    if (data.usual !== void 0) {
      let data12 = data.usual;
      if (typeof data12 == "number" && isFinite(data12)) {
        if (data12 > 1e15 || isNaN(data12)) {
          let err29 = { instancePath: instancePath + "/usual", schemaPath: "#/properties/usual/maximum", keyword: "maximum", params: { comparison: "<=", limit: 1e15 }, message: "must be <= 1000000000000000" };
          vErrors === null ? vErrors = [err29] : vErrors.push(err29), errors++;
        }
        if (data12 <= 0 || isNaN(data12)) {
          let err30 = { instancePath: instancePath + "/usual", schemaPath: "#/properties/usual/exclusiveMinimum", keyword: "exclusiveMinimum", params: { comparison: ">", limit: 0 }, message: "must be > 0" };
          vErrors === null ? vErrors = [err30] : vErrors.push(err30), errors++;
        }
      } else {
        let err31 = { instancePath: instancePath + "/usual", schemaPath: "#/properties/usual/type", keyword: "type", params: { type: "number" }, message: "must be number" };
        vErrors === null ? vErrors = [err31] : vErrors.push(err31), errors++;
      }
    }
    if (data.turns !== void 0) {
      let data13 = data.turns;
      if (typeof data13 == "number" && isFinite(data13)) {
        if (data13 > 200 || isNaN(data13)) {
          let err32 = { instancePath: instancePath + "/turns", schemaPath: "#/properties/turns/maximum", keyword: "maximum", params: { comparison: "<=", limit: 200 }, message: "must be <= 200" };
          vErrors === null ? vErrors = [err32] : vErrors.push(err32), errors++;
        }
        if (data13 < -200 || isNaN(data13)) {
          let err33 = { instancePath: instancePath + "/turns", schemaPath: "#/properties/turns/minimum", keyword: "minimum", params: { comparison: ">=", limit: -200 }, message: "must be >= -200" };
          vErrors === null ? vErrors = [err33] : vErrors.push(err33), errors++;
        }
      } else {
        let err34 = { instancePath: instancePath + "/turns", schemaPath: "#/properties/turns/type", keyword: "type", params: { type: "number" }, message: "must be number" };
        vErrors === null ? vErrors = [err34] : vErrors.push(err34), errors++;
      }
    }
    if (data.extensions !== void 0) {
      let data14 = data.extensions;
      if (!(data14 && typeof data14 == "object" && !Array.isArray(data14))) {
        let err35 = { instancePath: instancePath + "/extensions", schemaPath: "move.schema.json#/$defs/extensions/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        vErrors === null ? vErrors = [err35] : vErrors.push(err35), errors++;
      }
    }
  } else {
    let err36 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    vErrors === null ? vErrors = [err36] : vErrors.push(err36), errors++;
  }
  return validate20.errors = vErrors, errors === 0;
}
validate20.evaluated = { props: !0, dynamicProps: !1, dynamicItems: !1 };

export const validate: SchemaValidator<SavedMove> = machineMade as SchemaValidator<SavedMove>;
