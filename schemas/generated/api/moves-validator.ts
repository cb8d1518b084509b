// Made by `npm run generate` from the JSON Schema of the same name. Not to be edited.
// @ts-nocheck: machine-made code; its type is stated at the end.
import { type SchemaValidator } from '../schema-validator';
import { type MoveBodies } from './moves';

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
var schema32 = { type: "object", description: "A stored move and its document", additionalProperties: !1, required: ["id", "shotId", "shootId", "crewId", "title", "revision", "document", "updatedAt", "updatedBy"], properties: { id: { type: "string", description: "The move: a UUID" }, shotId: { type: "string", description: "Its shot: a UUID" }, shootId: { type: "string", description: "Its shoot: a UUID" }, crewId: { type: "string", description: "Its crew: a UUID" }, title: { type: "string", description: "The document\u2019s title" }, revision: { type: "integer", minimum: 1, description: "A count, one more after every change; it is also the ETag" }, document: { type: "object", description: 'A move document (move.schema.json); unknown members only under "extensions"' }, updatedAt: { type: "string", description: "When it was last saved: an instant, ISO 8601 in UTC" }, updatedBy: { $ref: "#/$defs/Person" } } };
var func1 = Object.prototype.hasOwnProperty;
function validate21(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null, errors = 0, evaluated0 = validate21.evaluated;
  if (evaluated0.dynamicProps && (evaluated0.props = void 0), evaluated0.dynamicItems && (evaluated0.items = void 0), data && typeof data == "object" && !Array.isArray(data)) {
    if (data.id === void 0) {
      let err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "id" }, message: "must have required property 'id'" };
      vErrors === null ? vErrors = [err0] : vErrors.push(err0), errors++;
    }
    if (data.shotId === void 0) {
      let err1 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "shotId" }, message: "must have required property 'shotId'" };
      vErrors === null ? vErrors = [err1] : vErrors.push(err1), errors++;
    }
    if (data.shootId === void 0) {
      let err2 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "shootId" }, message: "must have required property 'shootId'" };
      vErrors === null ? vErrors = [err2] : vErrors.push(err2), errors++;
    }
    if (data.crewId === void 0) {
      let err3 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "crewId" }, message: "must have required property 'crewId'" };
      vErrors === null ? vErrors = [err3] : vErrors.push(err3), errors++;
    }
    if (data.title === void 0) {
      let err4 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "title" }, message: "must have required property 'title'" };
      vErrors === null ? vErrors = [err4] : vErrors.push(err4), errors++;
    }
    if (data.revision === void 0) {
      let err5 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "revision" }, message: "must have required property 'revision'" };
      vErrors === null ? vErrors = [err5] : vErrors.push(err5), errors++;
    }
    if (data.document === void 0) {
      let err6 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "document" }, message: "must have required property 'document'" };
      vErrors === null ? vErrors = [err6] : vErrors.push(err6), errors++;
    }
    if (data.updatedAt === void 0) {
      let err7 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "updatedAt" }, message: "must have required property 'updatedAt'" };
      vErrors === null ? vErrors = [err7] : vErrors.push(err7), errors++;
    }
    if (data.updatedBy === void 0) {
      let err8 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "updatedBy" }, message: "must have required property 'updatedBy'" };
      vErrors === null ? vErrors = [err8] : vErrors.push(err8), errors++;
    }
    for (let key0 in data)
      if (!func1.call(schema32.properties, key0)) {
        let err9 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        vErrors === null ? vErrors = [err9] : vErrors.push(err9), errors++;
      }
    if (data.id !== void 0 && typeof data.id != "string") {
      let err10 = { instancePath: instancePath + "/id", schemaPath: "#/properties/id/type", keyword: "type", params: { type: "string" }, message: "must be string" };
      vErrors === null ? vErrors = [err10] : vErrors.push(err10), errors++;
    }
    if (data.shotId !== void 0 && typeof data.shotId != "string") {
      let err11 = { instancePath: instancePath + "/shotId", schemaPath: "#/properties/shotId/type", keyword: "type", params: { type: "string" }, message: "must be string" };
      vErrors === null ? vErrors = [err11] : vErrors.push(err11), errors++;
    }
    if (data.shootId !== void 0 && typeof data.shootId != "string") {
      let err12 = { instancePath: instancePath + "/shootId", schemaPath: "#/properties/shootId/type", keyword: "type", params: { type: "string" }, message: "must be string" };
      vErrors === null ? vErrors = [err12] : vErrors.push(err12), errors++;
    }
    if (data.crewId !== void 0 && typeof data.crewId != "string") {
      let err13 = { instancePath: instancePath + "/crewId", schemaPath: "#/properties/crewId/type", keyword: "type", params: { type: "string" }, message: "must be string" };
      vErrors === null ? vErrors = [err13] : vErrors.push(err13), errors++;
    }
    if (data.title !== void 0 && typeof data.title != "string") {
      let err14 = { instancePath: instancePath + "/title", schemaPath: "#/properties/title/type", keyword: "type", params: { type: "string" }, message: "must be string" };
      vErrors === null ? vErrors = [err14] : vErrors.push(err14), errors++;
    }
    if (data.revision !== void 0) {
      let data5 = data.revision;
      if (!(typeof data5 == "number" && !(data5 % 1) && !isNaN(data5) && isFinite(data5))) {
        let err15 = { instancePath: instancePath + "/revision", schemaPath: "#/properties/revision/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        vErrors === null ? vErrors = [err15] : vErrors.push(err15), errors++;
      }
      if (typeof data5 == "number" && isFinite(data5) && (data5 < 1 || isNaN(data5))) {
        let err16 = { instancePath: instancePath + "/revision", schemaPath: "#/properties/revision/minimum", keyword: "minimum", params: { comparison: ">=", limit: 1 }, message: "must be >= 1" };
        vErrors === null ? vErrors = [err16] : vErrors.push(err16), errors++;
      }
    }
    if (data.document !== void 0) {
      let data6 = data.document;
      if (!(data6 && typeof data6 == "object" && !Array.isArray(data6))) {
        let err17 = { instancePath: instancePath + "/document", schemaPath: "#/properties/document/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        vErrors === null ? vErrors = [err17] : vErrors.push(err17), errors++;
      }
    }
    if (data.updatedAt !== void 0 && typeof data.updatedAt != "string") {
      let err18 = { instancePath: instancePath + "/updatedAt", schemaPath: "#/properties/updatedAt/type", keyword: "type", params: { type: "string" }, message: "must be string" };
      vErrors === null ? vErrors = [err18] : vErrors.push(err18), errors++;
    }
    if (data.updatedBy !== void 0) {
      let data8 = data.updatedBy;
      if (data8 && typeof data8 == "object" && !Array.isArray(data8)) {
        if (data8.id === void 0) {
          let err19 = { instancePath: instancePath + "/updatedBy", schemaPath: "#/$defs/Person/required", keyword: "required", params: { missingProperty: "id" }, message: "must have required property 'id'" };
          vErrors === null ? vErrors = [err19] : vErrors.push(err19), errors++;
        }
        if (data8.name === void 0) {
          let err20 = { instancePath: instancePath + "/updatedBy", schemaPath: "#/$defs/Person/required", keyword: "required", params: { missingProperty: "name" }, message: "must have required property 'name'" };
          vErrors === null ? vErrors = [err20] : vErrors.push(err20), errors++;
        }
        for (let key1 in data8)
          if (!(key1 === "id" || key1 === "name")) {
            let err21 = { instancePath: instancePath + "/updatedBy", schemaPath: "#/$defs/Person/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key1 }, message: "must NOT have additional properties" };
            vErrors === null ? vErrors = [err21] : vErrors.push(err21), errors++;
          }
        if (data8.id !== void 0 && typeof data8.id != "string") {
          let err22 = { instancePath: instancePath + "/updatedBy/id", schemaPath: "#/$defs/Person/properties/id/type", keyword: "type", params: { type: "string" }, message: "must be string" };
          vErrors === null ? vErrors = [err22] : vErrors.push(err22), errors++;
        }
        if (data8.name !== void 0 && typeof data8.name != "string") {
          let err23 = { instancePath: instancePath + "/updatedBy/name", schemaPath: "#/$defs/Person/properties/name/type", keyword: "type", params: { type: "string" }, message: "must be string" };
          vErrors === null ? vErrors = [err23] : vErrors.push(err23), errors++;
        }
      } else {
        let err24 = { instancePath: instancePath + "/updatedBy", schemaPath: "#/$defs/Person/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        vErrors === null ? vErrors = [err24] : vErrors.push(err24), errors++;
      }
    }
  } else {
    let err25 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    vErrors === null ? vErrors = [err25] : vErrors.push(err25), errors++;
  }
  return validate21.errors = vErrors, errors === 0;
}
validate21.evaluated = { props: !0, dynamicProps: !1, dynamicItems: !1 };
function validate24(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null, errors = 0, evaluated0 = validate24.evaluated;
  if (evaluated0.dynamicProps && (evaluated0.props = void 0), evaluated0.dynamicItems && (evaluated0.items = void 0), data && typeof data == "object" && !Array.isArray(data)) {
    if (data.id === void 0) {
      let err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "id" }, message: "must have required property 'id'" };
      vErrors === null ? vErrors = [err0] : vErrors.push(err0), errors++;
    }
    if (data.shotId === void 0) {
      let err1 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "shotId" }, message: "must have required property 'shotId'" };
      vErrors === null ? vErrors = [err1] : vErrors.push(err1), errors++;
    }
    if (data.title === void 0) {
      let err2 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "title" }, message: "must have required property 'title'" };
      vErrors === null ? vErrors = [err2] : vErrors.push(err2), errors++;
    }
    if (data.revision === void 0) {
      let err3 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "revision" }, message: "must have required property 'revision'" };
      vErrors === null ? vErrors = [err3] : vErrors.push(err3), errors++;
    }
    if (data.keyCount === void 0) {
      let err4 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "keyCount" }, message: "must have required property 'keyCount'" };
      vErrors === null ? vErrors = [err4] : vErrors.push(err4), errors++;
    }
    if (data.updatedAt === void 0) {
      let err5 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "updatedAt" }, message: "must have required property 'updatedAt'" };
      vErrors === null ? vErrors = [err5] : vErrors.push(err5), errors++;
    }
    if (data.updatedBy === void 0) {
      let err6 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "updatedBy" }, message: "must have required property 'updatedBy'" };
      vErrors === null ? vErrors = [err6] : vErrors.push(err6), errors++;
    }
    for (let key0 in data)
      if (!(key0 === "id" || key0 === "shotId" || key0 === "title" || key0 === "revision" || key0 === "keyCount" || key0 === "updatedAt" || key0 === "updatedBy")) {
        let err7 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        vErrors === null ? vErrors = [err7] : vErrors.push(err7), errors++;
      }
    if (data.id !== void 0 && typeof data.id != "string") {
      let err8 = { instancePath: instancePath + "/id", schemaPath: "#/properties/id/type", keyword: "type", params: { type: "string" }, message: "must be string" };
      vErrors === null ? vErrors = [err8] : vErrors.push(err8), errors++;
    }
    if (data.shotId !== void 0 && typeof data.shotId != "string") {
      let err9 = { instancePath: instancePath + "/shotId", schemaPath: "#/properties/shotId/type", keyword: "type", params: { type: "string" }, message: "must be string" };
      vErrors === null ? vErrors = [err9] : vErrors.push(err9), errors++;
    }
    if (data.title !== void 0 && typeof data.title != "string") {
      let err10 = { instancePath: instancePath + "/title", schemaPath: "#/properties/title/type", keyword: "type", params: { type: "string" }, message: "must be string" };
      vErrors === null ? vErrors = [err10] : vErrors.push(err10), errors++;
    }
    if (data.revision !== void 0) {
      let data3 = data.revision;
      if (!(typeof data3 == "number" && !(data3 % 1) && !isNaN(data3) && isFinite(data3))) {
        let err11 = { instancePath: instancePath + "/revision", schemaPath: "#/properties/revision/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        vErrors === null ? vErrors = [err11] : vErrors.push(err11), errors++;
      }
      if (typeof data3 == "number" && isFinite(data3) && (data3 < 1 || isNaN(data3))) {
        let err12 = { instancePath: instancePath + "/revision", schemaPath: "#/properties/revision/minimum", keyword: "minimum", params: { comparison: ">=", limit: 1 }, message: "must be >= 1" };
        vErrors === null ? vErrors = [err12] : vErrors.push(err12), errors++;
      }
    }
    if (data.keyCount !== void 0) {
      let data4 = data.keyCount;
      if (!(typeof data4 == "number" && !(data4 % 1) && !isNaN(data4) && isFinite(data4))) {
        let err13 = { instancePath: instancePath + "/keyCount", schemaPath: "#/properties/keyCount/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        vErrors === null ? vErrors = [err13] : vErrors.push(err13), errors++;
      }
      if (typeof data4 == "number" && isFinite(data4) && (data4 < 0 || isNaN(data4))) {
        let err14 = { instancePath: instancePath + "/keyCount", schemaPath: "#/properties/keyCount/minimum", keyword: "minimum", params: { comparison: ">=", limit: 0 }, message: "must be >= 0" };
        vErrors === null ? vErrors = [err14] : vErrors.push(err14), errors++;
      }
    }
    if (data.updatedAt !== void 0 && typeof data.updatedAt != "string") {
      let err15 = { instancePath: instancePath + "/updatedAt", schemaPath: "#/properties/updatedAt/type", keyword: "type", params: { type: "string" }, message: "must be string" };
      vErrors === null ? vErrors = [err15] : vErrors.push(err15), errors++;
    }
    if (data.updatedBy !== void 0) {
      let data6 = data.updatedBy;
      if (data6 && typeof data6 == "object" && !Array.isArray(data6)) {
        if (data6.id === void 0) {
          let err16 = { instancePath: instancePath + "/updatedBy", schemaPath: "#/$defs/Person/required", keyword: "required", params: { missingProperty: "id" }, message: "must have required property 'id'" };
          vErrors === null ? vErrors = [err16] : vErrors.push(err16), errors++;
        }
        if (data6.name === void 0) {
          let err17 = { instancePath: instancePath + "/updatedBy", schemaPath: "#/$defs/Person/required", keyword: "required", params: { missingProperty: "name" }, message: "must have required property 'name'" };
          vErrors === null ? vErrors = [err17] : vErrors.push(err17), errors++;
        }
        for (let key1 in data6)
          if (!(key1 === "id" || key1 === "name")) {
            let err18 = { instancePath: instancePath + "/updatedBy", schemaPath: "#/$defs/Person/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key1 }, message: "must NOT have additional properties" };
            vErrors === null ? vErrors = [err18] : vErrors.push(err18), errors++;
          }
        if (data6.id !== void 0 && typeof data6.id != "string") {
          let err19 = { instancePath: instancePath + "/updatedBy/id", schemaPath: "#/$defs/Person/properties/id/type", keyword: "type", params: { type: "string" }, message: "must be string" };
          vErrors === null ? vErrors = [err19] : vErrors.push(err19), errors++;
        }
        if (data6.name !== void 0 && typeof data6.name != "string") {
          let err20 = { instancePath: instancePath + "/updatedBy/name", schemaPath: "#/$defs/Person/properties/name/type", keyword: "type", params: { type: "string" }, message: "must be string" };
          vErrors === null ? vErrors = [err20] : vErrors.push(err20), errors++;
        }
      } else {
        let err21 = { instancePath: instancePath + "/updatedBy", schemaPath: "#/$defs/Person/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        vErrors === null ? vErrors = [err21] : vErrors.push(err21), errors++;
      }
    }
  } else {
    let err22 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    vErrors === null ? vErrors = [err22] : vErrors.push(err22), errors++;
  }
  return validate24.errors = vErrors, errors === 0;
}
validate24.evaluated = { props: !0, dynamicProps: !1, dynamicItems: !1 };
function validate23(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null, errors = 0, evaluated0 = validate23.evaluated;
  if (evaluated0.dynamicProps && (evaluated0.props = void 0), evaluated0.dynamicItems && (evaluated0.items = void 0), data && typeof data == "object" && !Array.isArray(data)) {
    if (data.items === void 0) {
      let err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "items" }, message: "must have required property 'items'" };
      vErrors === null ? vErrors = [err0] : vErrors.push(err0), errors++;
    }
    for (let key0 in data)
      if (key0 !== "items") {
        let err1 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        vErrors === null ? vErrors = [err1] : vErrors.push(err1), errors++;
      }
    if (data.items !== void 0) {
      let data0 = data.items;
      if (Array.isArray(data0)) {
        let len0 = data0.length;
        for (let i0 = 0; i0 < len0; i0++)
          validate24(data0[i0], { instancePath: instancePath + "/items/" + i0, parentData: data0, parentDataProperty: i0, rootData, dynamicAnchors }) || (vErrors = vErrors === null ? validate24.errors : vErrors.concat(validate24.errors), errors = vErrors.length);
      } else {
        let err2 = { instancePath: instancePath + "/items", schemaPath: "#/properties/items/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        vErrors === null ? vErrors = [err2] : vErrors.push(err2), errors++;
      }
    }
  } else {
    let err3 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    vErrors === null ? vErrors = [err3] : vErrors.push(err3), errors++;
  }
  return validate23.errors = vErrors, errors === 0;
}
validate23.evaluated = { props: !0, dynamicProps: !1, dynamicItems: !1 };
var func2 = require_ucs2length().default, pattern4 = new RegExp("\\S", "u");
function validate20(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null, errors = 0, evaluated0 = validate20.evaluated;
  if (evaluated0.dynamicProps && (evaluated0.props = void 0), evaluated0.dynamicItems && (evaluated0.items = void 0), data && typeof data == "object" && !Array.isArray(data)) {
    for (let key0 in data)
      if (!(key0 === "move" || key0 === "moveList" || key0 === "moveDraft" || key0 === "moveSave")) {
        let err0 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        vErrors === null ? vErrors = [err0] : vErrors.push(err0), errors++;
      }
    if (data.move !== void 0 && (validate21(data.move, { instancePath: instancePath + "/move", parentData: data, parentDataProperty: "move", rootData, dynamicAnchors }) || (vErrors = vErrors === null ? validate21.errors : vErrors.concat(validate21.errors), errors = vErrors.length)), data.moveList !== void 0 && (validate23(data.moveList, { instancePath: instancePath + "/moveList", parentData: data, parentDataProperty: "moveList", rootData, dynamicAnchors }) || (vErrors = vErrors === null ? validate23.errors : vErrors.concat(validate23.errors), errors = vErrors.length)), data.moveDraft !== void 0) {
      let data2 = data.moveDraft, _errs6 = errors, valid2 = !1, _errs7 = errors;
      if (data2 && typeof data2 == "object" && !Array.isArray(data2)) {
        if (data2.document === void 0) {
          let err1 = { instancePath: instancePath + "/moveDraft", schemaPath: "#/$defs/MoveDraft/anyOf/0/required", keyword: "required", params: { missingProperty: "document" }, message: "must have required property 'document'" };
          vErrors === null ? vErrors = [err1] : vErrors.push(err1), errors++;
        }
        for (let key1 in data2)
          if (key1 !== "document") {
            let err2 = { instancePath: instancePath + "/moveDraft", schemaPath: "#/$defs/MoveDraft/anyOf/0/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key1 }, message: "must NOT have additional properties" };
            vErrors === null ? vErrors = [err2] : vErrors.push(err2), errors++;
          }
        if (data2.document !== void 0) {
          let data3 = data2.document;
          if (!(data3 && typeof data3 == "object" && !Array.isArray(data3))) {
            let err3 = { instancePath: instancePath + "/moveDraft/document", schemaPath: "#/$defs/MoveDraft/anyOf/0/properties/document/type", keyword: "type", params: { type: "object" }, message: "must be object" };
            vErrors === null ? vErrors = [err3] : vErrors.push(err3), errors++;
          }
        }
      } else {
        let err4 = { instancePath: instancePath + "/moveDraft", schemaPath: "#/$defs/MoveDraft/anyOf/0/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        vErrors === null ? vErrors = [err4] : vErrors.push(err4), errors++;
      }
      var _valid0 = _errs7 === errors;
      if (valid2 = valid2 || _valid0, _valid0)
        var props0 = !0;
      let _errs12 = errors;
      if (data2 && typeof data2 == "object" && !Array.isArray(data2)) {
        if (data2.title === void 0) {
          let err5 = { instancePath: instancePath + "/moveDraft", schemaPath: "#/$defs/MoveDraft/anyOf/1/required", keyword: "required", params: { missingProperty: "title" }, message: "must have required property 'title'" };
          vErrors === null ? vErrors = [err5] : vErrors.push(err5), errors++;
        }
        for (let key2 in data2)
          if (key2 !== "title") {
            let err6 = { instancePath: instancePath + "/moveDraft", schemaPath: "#/$defs/MoveDraft/anyOf/1/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key2 }, message: "must NOT have additional properties" };
            vErrors === null ? vErrors = [err6] : vErrors.push(err6), errors++;
          }
        if (data2.title !== void 0) {
          let data4 = data2.title;
          if (typeof data4 == "string") {
            if (func2(data4) > 200) {
              let err7 = { instancePath: instancePath + "/moveDraft/title", schemaPath: "#/$defs/MoveDraft/anyOf/1/properties/title/maxLength", keyword: "maxLength", params: { limit: 200 }, message: "must NOT have more than 200 characters" };
              vErrors === null ? vErrors = [err7] : vErrors.push(err7), errors++;
            }
            if (!pattern4.test(data4)) {
              let err8 = { instancePath: instancePath + "/moveDraft/title", schemaPath: "#/$defs/MoveDraft/anyOf/1/properties/title/pattern", keyword: "pattern", params: { pattern: "\\S" }, message: 'must match pattern "\\S"' };
              vErrors === null ? vErrors = [err8] : vErrors.push(err8), errors++;
            }
          } else {
            let err9 = { instancePath: instancePath + "/moveDraft/title", schemaPath: "#/$defs/MoveDraft/anyOf/1/properties/title/type", keyword: "type", params: { type: "string" }, message: "must be string" };
            vErrors === null ? vErrors = [err9] : vErrors.push(err9), errors++;
          }
        }
      } else {
        let err10 = { instancePath: instancePath + "/moveDraft", schemaPath: "#/$defs/MoveDraft/anyOf/1/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        vErrors === null ? vErrors = [err10] : vErrors.push(err10), errors++;
      }
      var _valid0 = _errs12 === errors;
      if (valid2 = valid2 || _valid0, _valid0 && props0 !== !0 && (props0 = !0), valid2)
        errors = _errs6, vErrors !== null && (_errs6 ? vErrors.length = _errs6 : vErrors = null);
      else {
        let err11 = { instancePath: instancePath + "/moveDraft", schemaPath: "#/$defs/MoveDraft/anyOf", keyword: "anyOf", params: {}, message: "must match a schema in anyOf" };
        vErrors === null ? vErrors = [err11] : vErrors.push(err11), errors++;
      }
    }
    if (data.moveSave !== void 0) {
      let data5 = data.moveSave;
      if (data5 && typeof data5 == "object" && !Array.isArray(data5)) {
        if (data5.document === void 0) {
          let err12 = { instancePath: instancePath + "/moveSave", schemaPath: "#/$defs/MoveSave/required", keyword: "required", params: { missingProperty: "document" }, message: "must have required property 'document'" };
          vErrors === null ? vErrors = [err12] : vErrors.push(err12), errors++;
        }
        for (let key3 in data5)
          if (key3 !== "document") {
            let err13 = { instancePath: instancePath + "/moveSave", schemaPath: "#/$defs/MoveSave/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key3 }, message: "must NOT have additional properties" };
            vErrors === null ? vErrors = [err13] : vErrors.push(err13), errors++;
          }
        if (data5.document !== void 0) {
          let data6 = data5.document;
          if (!(data6 && typeof data6 == "object" && !Array.isArray(data6))) {
            let err14 = { instancePath: instancePath + "/moveSave/document", schemaPath: "#/$defs/MoveSave/properties/document/type", keyword: "type", params: { type: "object" }, message: "must be object" };
            vErrors === null ? vErrors = [err14] : vErrors.push(err14), errors++;
          }
        }
      } else {
        let err15 = { instancePath: instancePath + "/moveSave", schemaPath: "#/$defs/MoveSave/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        vErrors === null ? vErrors = [err15] : vErrors.push(err15), errors++;
      }
    }
  } else {
    let err16 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    vErrors === null ? vErrors = [err16] : vErrors.push(err16), errors++;
  }
  return validate20.errors = vErrors, errors === 0;
}
validate20.evaluated = { props: !0, dynamicProps: !1, dynamicItems: !1 };

export const validate: SchemaValidator<MoveBodies> = machineMade as SchemaValidator<MoveBodies>;
