// Made by `npm run generate` from the JSON Schema of the same name. Not to be edited.
// @ts-nocheck: machine-made code; its type is stated at the end.
import { type SchemaValidator } from '../schema-validator';
import { type ShootBodies } from './shoots';

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
var schema32 = { type: "object", description: "A shoot of the crew", additionalProperties: !1, required: ["id", "title", "place", "notes", "startsOn", "shotCount", "moveCount", "cover", "revision", "createdAt", "updatedAt"], properties: { id: { type: "string", description: "The shoot: a UUID" }, title: { type: "string", maxLength: 200, pattern: "\\S", description: "One line, not blank; 1 to 200 signs" }, place: { type: "string", maxLength: 200, description: "Where it was shot; up to 200 signs" }, notes: { type: "string", maxLength: 2e4, description: "Free text; up to 20,000 signs" }, startsOn: { anyOf: [{ type: "string", pattern: "^\\d{4}-\\d{2}-\\d{2}$", description: "Calendar day, YYYY-MM-DD" }, { type: "null" }], description: "First day of the shoot, YYYY-MM-DD; null where it is not set" }, shotCount: { type: "integer", minimum: 0, description: "Its shots: a count" }, moveCount: { type: "integer", minimum: 0, description: "The moves of its shots: a count" }, cover: { anyOf: [{ $ref: "plates.schema.json#/$defs/PlatePicture" }, { type: "null" }], description: "A picture of it; null while there is no plate" }, revision: { type: "integer", minimum: 1, description: "A count, one more after every change; it is also the ETag" }, createdAt: { type: "string", description: "When it was made: an instant, ISO 8601 in UTC" }, updatedAt: { type: "string", description: "When it was last changed: an instant, ISO 8601 in UTC" } } };
var func1 = Object.prototype.hasOwnProperty, func2 = require_ucs2length().default, pattern4 = new RegExp("\\S", "u"), pattern5 = new RegExp("^\\d{4}-\\d{2}-\\d{2}$", "u");
function validate21(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null, errors = 0, evaluated0 = validate21.evaluated;
  if (evaluated0.dynamicProps && (evaluated0.props = void 0), evaluated0.dynamicItems && (evaluated0.items = void 0), data && typeof data == "object" && !Array.isArray(data)) {
    if (data.id === void 0) {
      let err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "id" }, message: "must have required property 'id'" };
      vErrors === null ? vErrors = [err0] : vErrors.push(err0), errors++;
    }
    if (data.title === void 0) {
      let err1 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "title" }, message: "must have required property 'title'" };
      vErrors === null ? vErrors = [err1] : vErrors.push(err1), errors++;
    }
    if (data.place === void 0) {
      let err2 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "place" }, message: "must have required property 'place'" };
      vErrors === null ? vErrors = [err2] : vErrors.push(err2), errors++;
    }
    if (data.notes === void 0) {
      let err3 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "notes" }, message: "must have required property 'notes'" };
      vErrors === null ? vErrors = [err3] : vErrors.push(err3), errors++;
    }
    if (data.startsOn === void 0) {
      let err4 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "startsOn" }, message: "must have required property 'startsOn'" };
      vErrors === null ? vErrors = [err4] : vErrors.push(err4), errors++;
    }
    if (data.shotCount === void 0) {
      let err5 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "shotCount" }, message: "must have required property 'shotCount'" };
      vErrors === null ? vErrors = [err5] : vErrors.push(err5), errors++;
    }
    if (data.moveCount === void 0) {
      let err6 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "moveCount" }, message: "must have required property 'moveCount'" };
      vErrors === null ? vErrors = [err6] : vErrors.push(err6), errors++;
    }
    if (data.cover === void 0) {
      let err7 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "cover" }, message: "must have required property 'cover'" };
      vErrors === null ? vErrors = [err7] : vErrors.push(err7), errors++;
    }
    if (data.revision === void 0) {
      let err8 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "revision" }, message: "must have required property 'revision'" };
      vErrors === null ? vErrors = [err8] : vErrors.push(err8), errors++;
    }
    if (data.createdAt === void 0) {
      let err9 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "createdAt" }, message: "must have required property 'createdAt'" };
      vErrors === null ? vErrors = [err9] : vErrors.push(err9), errors++;
    }
    if (data.updatedAt === void 0) {
      let err10 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "updatedAt" }, message: "must have required property 'updatedAt'" };
      vErrors === null ? vErrors = [err10] : vErrors.push(err10), errors++;
    }
    for (let key0 in data)
      if (!func1.call(schema32.properties, key0)) {
        let err11 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        vErrors === null ? vErrors = [err11] : vErrors.push(err11), errors++;
      }
    if (data.id !== void 0 && typeof data.id != "string") {
      let err12 = { instancePath: instancePath + "/id", schemaPath: "#/properties/id/type", keyword: "type", params: { type: "string" }, message: "must be string" };
      vErrors === null ? vErrors = [err12] : vErrors.push(err12), errors++;
    }
    if (data.title !== void 0) {
      let data1 = data.title;
      if (typeof data1 == "string") {
        if (func2(data1) > 200) {
          let err13 = { instancePath: instancePath + "/title", schemaPath: "#/properties/title/maxLength", keyword: "maxLength", params: { limit: 200 }, message: "must NOT have more than 200 characters" };
          vErrors === null ? vErrors = [err13] : vErrors.push(err13), errors++;
        }
        if (!pattern4.test(data1)) {
          let err14 = { instancePath: instancePath + "/title", schemaPath: "#/properties/title/pattern", keyword: "pattern", params: { pattern: "\\S" }, message: 'must match pattern "\\S"' };
          vErrors === null ? vErrors = [err14] : vErrors.push(err14), errors++;
        }
      } else {
        let err15 = { instancePath: instancePath + "/title", schemaPath: "#/properties/title/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        vErrors === null ? vErrors = [err15] : vErrors.push(err15), errors++;
      }
    }
    if (data.place !== void 0) {
      let data2 = data.place;
      if (typeof data2 == "string") {
        if (func2(data2) > 200) {
          let err16 = { instancePath: instancePath + "/place", schemaPath: "#/properties/place/maxLength", keyword: "maxLength", params: { limit: 200 }, message: "must NOT have more than 200 characters" };
          vErrors === null ? vErrors = [err16] : vErrors.push(err16), errors++;
        }
      } else {
        let err17 = { instancePath: instancePath + "/place", schemaPath: "#/properties/place/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        vErrors === null ? vErrors = [err17] : vErrors.push(err17), errors++;
      }
    }
    if (data.notes !== void 0) {
      let data3 = data.notes;
      if (typeof data3 == "string") {
        if (func2(data3) > 2e4) {
          let err18 = { instancePath: instancePath + "/notes", schemaPath: "#/properties/notes/maxLength", keyword: "maxLength", params: { limit: 2e4 }, message: "must NOT have more than 20000 characters" };
          vErrors === null ? vErrors = [err18] : vErrors.push(err18), errors++;
        }
      } else {
        let err19 = { instancePath: instancePath + "/notes", schemaPath: "#/properties/notes/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        vErrors === null ? vErrors = [err19] : vErrors.push(err19), errors++;
      }
    }
    if (data.startsOn !== void 0) {
      let data4 = data.startsOn, _errs11 = errors, valid1 = !1, _errs12 = errors;
      if (typeof data4 == "string") {
        if (!pattern5.test(data4)) {
          let err20 = { instancePath: instancePath + "/startsOn", schemaPath: "#/properties/startsOn/anyOf/0/pattern", keyword: "pattern", params: { pattern: "^\\d{4}-\\d{2}-\\d{2}$" }, message: 'must match pattern "^\\d{4}-\\d{2}-\\d{2}$"' };
          vErrors === null ? vErrors = [err20] : vErrors.push(err20), errors++;
        }
      } else {
        let err21 = { instancePath: instancePath + "/startsOn", schemaPath: "#/properties/startsOn/anyOf/0/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        vErrors === null ? vErrors = [err21] : vErrors.push(err21), errors++;
      }
      var _valid0 = _errs12 === errors;
      valid1 = valid1 || _valid0;
      let _errs14 = errors;
      if (data4 !== null) {
        let err22 = { instancePath: instancePath + "/startsOn", schemaPath: "#/properties/startsOn/anyOf/1/type", keyword: "type", params: { type: "null" }, message: "must be null" };
        vErrors === null ? vErrors = [err22] : vErrors.push(err22), errors++;
      }
      var _valid0 = _errs14 === errors;
      if (valid1 = valid1 || _valid0, valid1)
        errors = _errs11, vErrors !== null && (_errs11 ? vErrors.length = _errs11 : vErrors = null);
      else {
        let err23 = { instancePath: instancePath + "/startsOn", schemaPath: "#/properties/startsOn/anyOf", keyword: "anyOf", params: {}, message: "must match a schema in anyOf" };
        vErrors === null ? vErrors = [err23] : vErrors.push(err23), errors++;
      }
    }
    if (data.shotCount !== void 0) {
      let data5 = data.shotCount;
      if (!(typeof data5 == "number" && !(data5 % 1) && !isNaN(data5) && isFinite(data5))) {
        let err24 = { instancePath: instancePath + "/shotCount", schemaPath: "#/properties/shotCount/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        vErrors === null ? vErrors = [err24] : vErrors.push(err24), errors++;
      }
      if (typeof data5 == "number" && isFinite(data5) && (data5 < 0 || isNaN(data5))) {
        let err25 = { instancePath: instancePath + "/shotCount", schemaPath: "#/properties/shotCount/minimum", keyword: "minimum", params: { comparison: ">=", limit: 0 }, message: "must be >= 0" };
        vErrors === null ? vErrors = [err25] : vErrors.push(err25), errors++;
      }
    }
    if (data.moveCount !== void 0) {
      let data6 = data.moveCount;
      if (!(typeof data6 == "number" && !(data6 % 1) && !isNaN(data6) && isFinite(data6))) {
        let err26 = { instancePath: instancePath + "/moveCount", schemaPath: "#/properties/moveCount/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        vErrors === null ? vErrors = [err26] : vErrors.push(err26), errors++;
      }
      if (typeof data6 == "number" && isFinite(data6) && (data6 < 0 || isNaN(data6))) {
        let err27 = { instancePath: instancePath + "/moveCount", schemaPath: "#/properties/moveCount/minimum", keyword: "minimum", params: { comparison: ">=", limit: 0 }, message: "must be >= 0" };
        vErrors === null ? vErrors = [err27] : vErrors.push(err27), errors++;
      }
    }
    if (data.cover !== void 0) {
      let data7 = data.cover, _errs21 = errors, valid2 = !1, _errs22 = errors;
      if (data7 && typeof data7 == "object" && !Array.isArray(data7)) {
        if (data7.plateId === void 0) {
          let err28 = { instancePath: instancePath + "/cover", schemaPath: "plates.schema.json#/$defs/PlatePicture/required", keyword: "required", params: { missingProperty: "plateId" }, message: "must have required property 'plateId'" };
          vErrors === null ? vErrors = [err28] : vErrors.push(err28), errors++;
        }
        if (data7.thumbUrl === void 0) {
          let err29 = { instancePath: instancePath + "/cover", schemaPath: "plates.schema.json#/$defs/PlatePicture/required", keyword: "required", params: { missingProperty: "thumbUrl" }, message: "must have required property 'thumbUrl'" };
          vErrors === null ? vErrors = [err29] : vErrors.push(err29), errors++;
        }
        if (data7.url2048 === void 0) {
          let err30 = { instancePath: instancePath + "/cover", schemaPath: "plates.schema.json#/$defs/PlatePicture/required", keyword: "required", params: { missingProperty: "url2048" }, message: "must have required property 'url2048'" };
          vErrors === null ? vErrors = [err30] : vErrors.push(err30), errors++;
        }
        for (let key1 in data7)
          if (!(key1 === "plateId" || key1 === "thumbUrl" || key1 === "url2048")) {
            let err31 = { instancePath: instancePath + "/cover", schemaPath: "plates.schema.json#/$defs/PlatePicture/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key1 }, message: "must NOT have additional properties" };
            vErrors === null ? vErrors = [err31] : vErrors.push(err31), errors++;
          }
        if (data7.plateId !== void 0 && typeof data7.plateId != "string") {
          let err32 = { instancePath: instancePath + "/cover/plateId", schemaPath: "plates.schema.json#/$defs/PlatePicture/properties/plateId/type", keyword: "type", params: { type: "string" }, message: "must be string" };
          vErrors === null ? vErrors = [err32] : vErrors.push(err32), errors++;
        }
        if (data7.thumbUrl !== void 0 && typeof data7.thumbUrl != "string") {
          let err33 = { instancePath: instancePath + "/cover/thumbUrl", schemaPath: "plates.schema.json#/$defs/PlatePicture/properties/thumbUrl/type", keyword: "type", params: { type: "string" }, message: "must be string" };
          vErrors === null ? vErrors = [err33] : vErrors.push(err33), errors++;
        }
        if (data7.url2048 !== void 0 && typeof data7.url2048 != "string") {
          let err34 = { instancePath: instancePath + "/cover/url2048", schemaPath: "plates.schema.json#/$defs/PlatePicture/properties/url2048/type", keyword: "type", params: { type: "string" }, message: "must be string" };
          vErrors === null ? vErrors = [err34] : vErrors.push(err34), errors++;
        }
      } else {
        let err35 = { instancePath: instancePath + "/cover", schemaPath: "plates.schema.json#/$defs/PlatePicture/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        vErrors === null ? vErrors = [err35] : vErrors.push(err35), errors++;
      }
      var _valid1 = _errs22 === errors;
      valid2 = valid2 || _valid1;
      let _errs32 = errors;
      if (data7 !== null) {
        let err36 = { instancePath: instancePath + "/cover", schemaPath: "#/properties/cover/anyOf/1/type", keyword: "type", params: { type: "null" }, message: "must be null" };
        vErrors === null ? vErrors = [err36] : vErrors.push(err36), errors++;
      }
      var _valid1 = _errs32 === errors;
      if (valid2 = valid2 || _valid1, valid2)
        errors = _errs21, vErrors !== null && (_errs21 ? vErrors.length = _errs21 : vErrors = null);
      else {
        let err37 = { instancePath: instancePath + "/cover", schemaPath: "#/properties/cover/anyOf", keyword: "anyOf", params: {}, message: "must match a schema in anyOf" };
        vErrors === null ? vErrors = [err37] : vErrors.push(err37), errors++;
      }
    }
    if (data.revision !== void 0) {
      let data11 = data.revision;
      if (!(typeof data11 == "number" && !(data11 % 1) && !isNaN(data11) && isFinite(data11))) {
        let err38 = { instancePath: instancePath + "/revision", schemaPath: "#/properties/revision/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        vErrors === null ? vErrors = [err38] : vErrors.push(err38), errors++;
      }
      if (typeof data11 == "number" && isFinite(data11) && (data11 < 1 || isNaN(data11))) {
        let err39 = { instancePath: instancePath + "/revision", schemaPath: "#/properties/revision/minimum", keyword: "minimum", params: { comparison: ">=", limit: 1 }, message: "must be >= 1" };
        vErrors === null ? vErrors = [err39] : vErrors.push(err39), errors++;
      }
    }
    if (data.createdAt !== void 0 && typeof data.createdAt != "string") {
      let err40 = { instancePath: instancePath + "/createdAt", schemaPath: "#/properties/createdAt/type", keyword: "type", params: { type: "string" }, message: "must be string" };
      vErrors === null ? vErrors = [err40] : vErrors.push(err40), errors++;
    }
    if (data.updatedAt !== void 0 && typeof data.updatedAt != "string") {
      let err41 = { instancePath: instancePath + "/updatedAt", schemaPath: "#/properties/updatedAt/type", keyword: "type", params: { type: "string" }, message: "must be string" };
      vErrors === null ? vErrors = [err41] : vErrors.push(err41), errors++;
    }
  } else {
    let err42 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    vErrors === null ? vErrors = [err42] : vErrors.push(err42), errors++;
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
      if (!(key0 === "shoot" || key0 === "shootDraft" || key0 === "shootChanges" || key0 === "shootPage")) {
        let err0 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        vErrors === null ? vErrors = [err0] : vErrors.push(err0), errors++;
      }
    if (data.shoot !== void 0 && (validate21(data.shoot, { instancePath: instancePath + "/shoot", parentData: data, parentDataProperty: "shoot", rootData, dynamicAnchors }) || (vErrors = vErrors === null ? validate21.errors : vErrors.concat(validate21.errors), errors = vErrors.length)), data.shootDraft !== void 0) {
      let data1 = data.shootDraft;
      if (data1 && typeof data1 == "object" && !Array.isArray(data1)) {
        if (data1.title === void 0) {
          let err1 = { instancePath: instancePath + "/shootDraft", schemaPath: "#/$defs/ShootDraft/required", keyword: "required", params: { missingProperty: "title" }, message: "must have required property 'title'" };
          vErrors === null ? vErrors = [err1] : vErrors.push(err1), errors++;
        }
        for (let key1 in data1)
          if (!(key1 === "title" || key1 === "place" || key1 === "notes" || key1 === "startsOn")) {
            let err2 = { instancePath: instancePath + "/shootDraft", schemaPath: "#/$defs/ShootDraft/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key1 }, message: "must NOT have additional properties" };
            vErrors === null ? vErrors = [err2] : vErrors.push(err2), errors++;
          }
        if (data1.title !== void 0) {
          let data2 = data1.title;
          if (typeof data2 == "string") {
            if (func2(data2) > 200) {
              let err3 = { instancePath: instancePath + "/shootDraft/title", schemaPath: "#/$defs/ShootDraft/properties/title/maxLength", keyword: "maxLength", params: { limit: 200 }, message: "must NOT have more than 200 characters" };
              vErrors === null ? vErrors = [err3] : vErrors.push(err3), errors++;
            }
            if (!pattern4.test(data2)) {
              let err4 = { instancePath: instancePath + "/shootDraft/title", schemaPath: "#/$defs/ShootDraft/properties/title/pattern", keyword: "pattern", params: { pattern: "\\S" }, message: 'must match pattern "\\S"' };
              vErrors === null ? vErrors = [err4] : vErrors.push(err4), errors++;
            }
          } else {
            let err5 = { instancePath: instancePath + "/shootDraft/title", schemaPath: "#/$defs/ShootDraft/properties/title/type", keyword: "type", params: { type: "string" }, message: "must be string" };
            vErrors === null ? vErrors = [err5] : vErrors.push(err5), errors++;
          }
        }
        if (data1.place !== void 0) {
          let data3 = data1.place;
          if (typeof data3 == "string") {
            if (func2(data3) > 200) {
              let err6 = { instancePath: instancePath + "/shootDraft/place", schemaPath: "#/$defs/ShootDraft/properties/place/maxLength", keyword: "maxLength", params: { limit: 200 }, message: "must NOT have more than 200 characters" };
              vErrors === null ? vErrors = [err6] : vErrors.push(err6), errors++;
            }
          } else {
            let err7 = { instancePath: instancePath + "/shootDraft/place", schemaPath: "#/$defs/ShootDraft/properties/place/type", keyword: "type", params: { type: "string" }, message: "must be string" };
            vErrors === null ? vErrors = [err7] : vErrors.push(err7), errors++;
          }
        }
        if (data1.notes !== void 0) {
          let data4 = data1.notes;
          if (typeof data4 == "string") {
            if (func2(data4) > 2e4) {
              let err8 = { instancePath: instancePath + "/shootDraft/notes", schemaPath: "#/$defs/ShootDraft/properties/notes/maxLength", keyword: "maxLength", params: { limit: 2e4 }, message: "must NOT have more than 20000 characters" };
              vErrors === null ? vErrors = [err8] : vErrors.push(err8), errors++;
            }
          } else {
            let err9 = { instancePath: instancePath + "/shootDraft/notes", schemaPath: "#/$defs/ShootDraft/properties/notes/type", keyword: "type", params: { type: "string" }, message: "must be string" };
            vErrors === null ? vErrors = [err9] : vErrors.push(err9), errors++;
          }
        }
        if (data1.startsOn !== void 0) {
          let data5 = data1.startsOn, _errs14 = errors, valid3 = !1, _errs15 = errors;
          if (typeof data5 == "string") {
            if (!pattern5.test(data5)) {
              let err10 = { instancePath: instancePath + "/shootDraft/startsOn", schemaPath: "#/$defs/ShootDraft/properties/startsOn/anyOf/0/pattern", keyword: "pattern", params: { pattern: "^\\d{4}-\\d{2}-\\d{2}$" }, message: 'must match pattern "^\\d{4}-\\d{2}-\\d{2}$"' };
              vErrors === null ? vErrors = [err10] : vErrors.push(err10), errors++;
            }
          } else {
            let err11 = { instancePath: instancePath + "/shootDraft/startsOn", schemaPath: "#/$defs/ShootDraft/properties/startsOn/anyOf/0/type", keyword: "type", params: { type: "string" }, message: "must be string" };
            vErrors === null ? vErrors = [err11] : vErrors.push(err11), errors++;
          }
          var _valid0 = _errs15 === errors;
          valid3 = valid3 || _valid0;
          let _errs17 = errors;
          if (data5 !== null) {
            let err12 = { instancePath: instancePath + "/shootDraft/startsOn", schemaPath: "#/$defs/ShootDraft/properties/startsOn/anyOf/1/type", keyword: "type", params: { type: "null" }, message: "must be null" };
            vErrors === null ? vErrors = [err12] : vErrors.push(err12), errors++;
          }
          var _valid0 = _errs17 === errors;
          if (valid3 = valid3 || _valid0, valid3)
            errors = _errs14, vErrors !== null && (_errs14 ? vErrors.length = _errs14 : vErrors = null);
          else {
            let err13 = { instancePath: instancePath + "/shootDraft/startsOn", schemaPath: "#/$defs/ShootDraft/properties/startsOn/anyOf", keyword: "anyOf", params: {}, message: "must match a schema in anyOf" };
            vErrors === null ? vErrors = [err13] : vErrors.push(err13), errors++;
          }
        }
      } else {
        let err14 = { instancePath: instancePath + "/shootDraft", schemaPath: "#/$defs/ShootDraft/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        vErrors === null ? vErrors = [err14] : vErrors.push(err14), errors++;
      }
    }
    if (data.shootChanges !== void 0) {
      let data6 = data.shootChanges;
      if (data6 && typeof data6 == "object" && !Array.isArray(data6)) {
        if (Object.keys(data6).length < 1) {
          let err15 = { instancePath: instancePath + "/shootChanges", schemaPath: "#/$defs/ShootChanges/minProperties", keyword: "minProperties", params: { limit: 1 }, message: "must NOT have fewer than 1 properties" };
          vErrors === null ? vErrors = [err15] : vErrors.push(err15), errors++;
        }
        for (let key2 in data6)
          if (!(key2 === "title" || key2 === "place" || key2 === "notes" || key2 === "startsOn")) {
            let err16 = { instancePath: instancePath + "/shootChanges", schemaPath: "#/$defs/ShootChanges/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key2 }, message: "must NOT have additional properties" };
            vErrors === null ? vErrors = [err16] : vErrors.push(err16), errors++;
          }
        if (data6.title !== void 0) {
          let data7 = data6.title;
          if (typeof data7 == "string") {
            if (func2(data7) > 200) {
              let err17 = { instancePath: instancePath + "/shootChanges/title", schemaPath: "#/$defs/ShootChanges/properties/title/maxLength", keyword: "maxLength", params: { limit: 200 }, message: "must NOT have more than 200 characters" };
              vErrors === null ? vErrors = [err17] : vErrors.push(err17), errors++;
            }
            if (!pattern4.test(data7)) {
              let err18 = { instancePath: instancePath + "/shootChanges/title", schemaPath: "#/$defs/ShootChanges/properties/title/pattern", keyword: "pattern", params: { pattern: "\\S" }, message: 'must match pattern "\\S"' };
              vErrors === null ? vErrors = [err18] : vErrors.push(err18), errors++;
            }
          } else {
            let err19 = { instancePath: instancePath + "/shootChanges/title", schemaPath: "#/$defs/ShootChanges/properties/title/type", keyword: "type", params: { type: "string" }, message: "must be string" };
            vErrors === null ? vErrors = [err19] : vErrors.push(err19), errors++;
          }
        }
        if (data6.place !== void 0) {
          let data8 = data6.place;
          if (typeof data8 == "string") {
            if (func2(data8) > 200) {
              let err20 = { instancePath: instancePath + "/shootChanges/place", schemaPath: "#/$defs/ShootChanges/properties/place/maxLength", keyword: "maxLength", params: { limit: 200 }, message: "must NOT have more than 200 characters" };
              vErrors === null ? vErrors = [err20] : vErrors.push(err20), errors++;
            }
          } else {
            let err21 = { instancePath: instancePath + "/shootChanges/place", schemaPath: "#/$defs/ShootChanges/properties/place/type", keyword: "type", params: { type: "string" }, message: "must be string" };
            vErrors === null ? vErrors = [err21] : vErrors.push(err21), errors++;
          }
        }
        if (data6.notes !== void 0) {
          let data9 = data6.notes;
          if (typeof data9 == "string") {
            if (func2(data9) > 2e4) {
              let err22 = { instancePath: instancePath + "/shootChanges/notes", schemaPath: "#/$defs/ShootChanges/properties/notes/maxLength", keyword: "maxLength", params: { limit: 2e4 }, message: "must NOT have more than 20000 characters" };
              vErrors === null ? vErrors = [err22] : vErrors.push(err22), errors++;
            }
          } else {
            let err23 = { instancePath: instancePath + "/shootChanges/notes", schemaPath: "#/$defs/ShootChanges/properties/notes/type", keyword: "type", params: { type: "string" }, message: "must be string" };
            vErrors === null ? vErrors = [err23] : vErrors.push(err23), errors++;
          }
        }
        if (data6.startsOn !== void 0) {
          let data10 = data6.startsOn, _errs30 = errors, valid6 = !1, _errs31 = errors;
          if (typeof data10 == "string") {
            if (!pattern5.test(data10)) {
              let err24 = { instancePath: instancePath + "/shootChanges/startsOn", schemaPath: "#/$defs/ShootChanges/properties/startsOn/anyOf/0/pattern", keyword: "pattern", params: { pattern: "^\\d{4}-\\d{2}-\\d{2}$" }, message: 'must match pattern "^\\d{4}-\\d{2}-\\d{2}$"' };
              vErrors === null ? vErrors = [err24] : vErrors.push(err24), errors++;
            }
          } else {
            let err25 = { instancePath: instancePath + "/shootChanges/startsOn", schemaPath: "#/$defs/ShootChanges/properties/startsOn/anyOf/0/type", keyword: "type", params: { type: "string" }, message: "must be string" };
            vErrors === null ? vErrors = [err25] : vErrors.push(err25), errors++;
          }
          var _valid1 = _errs31 === errors;
          valid6 = valid6 || _valid1;
          let _errs33 = errors;
          if (data10 !== null) {
            let err26 = { instancePath: instancePath + "/shootChanges/startsOn", schemaPath: "#/$defs/ShootChanges/properties/startsOn/anyOf/1/type", keyword: "type", params: { type: "null" }, message: "must be null" };
            vErrors === null ? vErrors = [err26] : vErrors.push(err26), errors++;
          }
          var _valid1 = _errs33 === errors;
          if (valid6 = valid6 || _valid1, valid6)
            errors = _errs30, vErrors !== null && (_errs30 ? vErrors.length = _errs30 : vErrors = null);
          else {
            let err27 = { instancePath: instancePath + "/shootChanges/startsOn", schemaPath: "#/$defs/ShootChanges/properties/startsOn/anyOf", keyword: "anyOf", params: {}, message: "must match a schema in anyOf" };
            vErrors === null ? vErrors = [err27] : vErrors.push(err27), errors++;
          }
        }
      } else {
        let err28 = { instancePath: instancePath + "/shootChanges", schemaPath: "#/$defs/ShootChanges/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        vErrors === null ? vErrors = [err28] : vErrors.push(err28), errors++;
      }
    }
    data.shootPage !== void 0 && (validate31(data.shootPage, { instancePath: instancePath + "/shootPage", parentData: data, parentDataProperty: "shootPage", rootData, dynamicAnchors }) || (vErrors = vErrors === null ? validate31.errors : vErrors.concat(validate31.errors), errors = vErrors.length));
  } else {
    let err29 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    vErrors === null ? vErrors = [err29] : vErrors.push(err29), errors++;
  }
  return validate20.errors = vErrors, errors === 0;
}
validate20.evaluated = { props: !0, dynamicProps: !1, dynamicItems: !1 };

export const validate: SchemaValidator<ShootBodies> = machineMade as SchemaValidator<ShootBodies>;
