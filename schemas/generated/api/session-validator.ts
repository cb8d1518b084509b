// Made by `npm run generate` from the JSON Schema of the same name. Not to be edited.
// @ts-nocheck: machine-made code; its type is stated at the end.
import { type SchemaValidator } from '../schema-validator';
import { type SessionBodies } from './session';

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
var func1 = require_ucs2length().default;
var schema36 = { type: "string", enum: ["lead", "operator", "editor", "reviewer"], description: "What the person is in the crew" };
function validate22(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null, errors = 0, evaluated0 = validate22.evaluated;
  if (evaluated0.dynamicProps && (evaluated0.props = void 0), evaluated0.dynamicItems && (evaluated0.items = void 0), data && typeof data == "object" && !Array.isArray(data)) {
    if (data.crewId === void 0) {
      let err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "crewId" }, message: "must have required property 'crewId'" };
      vErrors === null ? vErrors = [err0] : vErrors.push(err0), errors++;
    }
    if (data.crewName === void 0) {
      let err1 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "crewName" }, message: "must have required property 'crewName'" };
      vErrors === null ? vErrors = [err1] : vErrors.push(err1), errors++;
    }
    if (data.role === void 0) {
      let err2 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "role" }, message: "must have required property 'role'" };
      vErrors === null ? vErrors = [err2] : vErrors.push(err2), errors++;
    }
    for (let key0 in data)
      if (!(key0 === "crewId" || key0 === "crewName" || key0 === "role")) {
        let err3 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        vErrors === null ? vErrors = [err3] : vErrors.push(err3), errors++;
      }
    if (data.crewId !== void 0 && typeof data.crewId != "string") {
      let err4 = { instancePath: instancePath + "/crewId", schemaPath: "#/properties/crewId/type", keyword: "type", params: { type: "string" }, message: "must be string" };
      vErrors === null ? vErrors = [err4] : vErrors.push(err4), errors++;
    }
    if (data.crewName !== void 0 && typeof data.crewName != "string") {
      let err5 = { instancePath: instancePath + "/crewName", schemaPath: "#/properties/crewName/type", keyword: "type", params: { type: "string" }, message: "must be string" };
      vErrors === null ? vErrors = [err5] : vErrors.push(err5), errors++;
    }
    if (data.role !== void 0) {
      let data2 = data.role;
      if (typeof data2 != "string") {
        let err6 = { instancePath: instancePath + "/role", schemaPath: "#/$defs/Role/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        vErrors === null ? vErrors = [err6] : vErrors.push(err6), errors++;
      }
      if (!(data2 === "lead" || data2 === "operator" || data2 === "editor" || data2 === "reviewer")) {
        let err7 = { instancePath: instancePath + "/role", schemaPath: "#/$defs/Role/enum", keyword: "enum", params: { allowedValues: schema36.enum }, message: "must be equal to one of the allowed values" };
        vErrors === null ? vErrors = [err7] : vErrors.push(err7), errors++;
      }
    }
  } else {
    let err8 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    vErrors === null ? vErrors = [err8] : vErrors.push(err8), errors++;
  }
  return validate22.errors = vErrors, errors === 0;
}
validate22.evaluated = { props: !0, dynamicProps: !1, dynamicItems: !1 };
function validate21(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null, errors = 0, evaluated0 = validate21.evaluated;
  if (evaluated0.dynamicProps && (evaluated0.props = void 0), evaluated0.dynamicItems && (evaluated0.items = void 0), data && typeof data == "object" && !Array.isArray(data)) {
    if (data.user === void 0) {
      let err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "user" }, message: "must have required property 'user'" };
      vErrors === null ? vErrors = [err0] : vErrors.push(err0), errors++;
    }
    if (data.memberships === void 0) {
      let err1 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "memberships" }, message: "must have required property 'memberships'" };
      vErrors === null ? vErrors = [err1] : vErrors.push(err1), errors++;
    }
    for (let key0 in data)
      if (!(key0 === "user" || key0 === "memberships")) {
        let err2 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        vErrors === null ? vErrors = [err2] : vErrors.push(err2), errors++;
      }
    if (data.user !== void 0) {
      let data0 = data.user, _errs3 = errors, valid1 = !1, _errs4 = errors;
      if (data0 && typeof data0 == "object" && !Array.isArray(data0)) {
        if (data0.id === void 0) {
          let err3 = { instancePath: instancePath + "/user", schemaPath: "#/$defs/User/required", keyword: "required", params: { missingProperty: "id" }, message: "must have required property 'id'" };
          vErrors === null ? vErrors = [err3] : vErrors.push(err3), errors++;
        }
        if (data0.name === void 0) {
          let err4 = { instancePath: instancePath + "/user", schemaPath: "#/$defs/User/required", keyword: "required", params: { missingProperty: "name" }, message: "must have required property 'name'" };
          vErrors === null ? vErrors = [err4] : vErrors.push(err4), errors++;
        }
        if (data0.email === void 0) {
          let err5 = { instancePath: instancePath + "/user", schemaPath: "#/$defs/User/required", keyword: "required", params: { missingProperty: "email" }, message: "must have required property 'email'" };
          vErrors === null ? vErrors = [err5] : vErrors.push(err5), errors++;
        }
        for (let key1 in data0)
          if (!(key1 === "id" || key1 === "name" || key1 === "email")) {
            let err6 = { instancePath: instancePath + "/user", schemaPath: "#/$defs/User/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key1 }, message: "must NOT have additional properties" };
            vErrors === null ? vErrors = [err6] : vErrors.push(err6), errors++;
          }
        if (data0.id !== void 0 && typeof data0.id != "string") {
          let err7 = { instancePath: instancePath + "/user/id", schemaPath: "#/$defs/User/properties/id/type", keyword: "type", params: { type: "string" }, message: "must be string" };
          vErrors === null ? vErrors = [err7] : vErrors.push(err7), errors++;
        }
        if (data0.name !== void 0 && typeof data0.name != "string") {
          let err8 = { instancePath: instancePath + "/user/name", schemaPath: "#/$defs/User/properties/name/type", keyword: "type", params: { type: "string" }, message: "must be string" };
          vErrors === null ? vErrors = [err8] : vErrors.push(err8), errors++;
        }
        if (data0.email !== void 0 && typeof data0.email != "string") {
          let err9 = { instancePath: instancePath + "/user/email", schemaPath: "#/$defs/User/properties/email/type", keyword: "type", params: { type: "string" }, message: "must be string" };
          vErrors === null ? vErrors = [err9] : vErrors.push(err9), errors++;
        }
      } else {
        let err10 = { instancePath: instancePath + "/user", schemaPath: "#/$defs/User/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        vErrors === null ? vErrors = [err10] : vErrors.push(err10), errors++;
      }
      var _valid0 = _errs4 === errors;
      valid1 = valid1 || _valid0;
      let _errs14 = errors;
      if (data0 !== null) {
        let err11 = { instancePath: instancePath + "/user", schemaPath: "#/properties/user/anyOf/1/type", keyword: "type", params: { type: "null" }, message: "must be null" };
        vErrors === null ? vErrors = [err11] : vErrors.push(err11), errors++;
      }
      var _valid0 = _errs14 === errors;
      if (valid1 = valid1 || _valid0, valid1)
        errors = _errs3, vErrors !== null && (_errs3 ? vErrors.length = _errs3 : vErrors = null);
      else {
        let err12 = { instancePath: instancePath + "/user", schemaPath: "#/properties/user/anyOf", keyword: "anyOf", params: {}, message: "must match a schema in anyOf" };
        vErrors === null ? vErrors = [err12] : vErrors.push(err12), errors++;
      }
    }
    if (data.memberships !== void 0) {
      let data4 = data.memberships;
      if (Array.isArray(data4)) {
        let len0 = data4.length;
        for (let i0 = 0; i0 < len0; i0++)
          validate22(data4[i0], { instancePath: instancePath + "/memberships/" + i0, parentData: data4, parentDataProperty: i0, rootData, dynamicAnchors }) || (vErrors = vErrors === null ? validate22.errors : vErrors.concat(validate22.errors), errors = vErrors.length);
      } else {
        let err13 = { instancePath: instancePath + "/memberships", schemaPath: "#/properties/memberships/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        vErrors === null ? vErrors = [err13] : vErrors.push(err13), errors++;
      }
    }
  } else {
    let err14 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    vErrors === null ? vErrors = [err14] : vErrors.push(err14), errors++;
  }
  return validate21.errors = vErrors, errors === 0;
}
validate21.evaluated = { props: !0, dynamicProps: !1, dynamicItems: !1 };
function validate20(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null, errors = 0, evaluated0 = validate20.evaluated;
  if (evaluated0.dynamicProps && (evaluated0.props = void 0), evaluated0.dynamicItems && (evaluated0.items = void 0), data && typeof data == "object" && !Array.isArray(data)) {
    for (let key0 in data)
      if (!(key0 === "signIn" || key0 === "session" || key0 === "health")) {
        let err0 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        vErrors === null ? vErrors = [err0] : vErrors.push(err0), errors++;
      }
    if (data.signIn !== void 0) {
      let data0 = data.signIn;
      if (data0 && typeof data0 == "object" && !Array.isArray(data0)) {
        if (data0.email === void 0) {
          let err1 = { instancePath: instancePath + "/signIn", schemaPath: "#/$defs/SignIn/required", keyword: "required", params: { missingProperty: "email" }, message: "must have required property 'email'" };
          vErrors === null ? vErrors = [err1] : vErrors.push(err1), errors++;
        }
        if (data0.password === void 0) {
          let err2 = { instancePath: instancePath + "/signIn", schemaPath: "#/$defs/SignIn/required", keyword: "required", params: { missingProperty: "password" }, message: "must have required property 'password'" };
          vErrors === null ? vErrors = [err2] : vErrors.push(err2), errors++;
        }
        for (let key1 in data0)
          if (!(key1 === "email" || key1 === "password")) {
            let err3 = { instancePath: instancePath + "/signIn", schemaPath: "#/$defs/SignIn/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key1 }, message: "must NOT have additional properties" };
            vErrors === null ? vErrors = [err3] : vErrors.push(err3), errors++;
          }
        if (data0.email !== void 0) {
          let data1 = data0.email;
          if (typeof data1 == "string") {
            if (func1(data1) > 254) {
              let err4 = { instancePath: instancePath + "/signIn/email", schemaPath: "#/$defs/SignIn/properties/email/maxLength", keyword: "maxLength", params: { limit: 254 }, message: "must NOT have more than 254 characters" };
              vErrors === null ? vErrors = [err4] : vErrors.push(err4), errors++;
            }
            if (func1(data1) < 3) {
              let err5 = { instancePath: instancePath + "/signIn/email", schemaPath: "#/$defs/SignIn/properties/email/minLength", keyword: "minLength", params: { limit: 3 }, message: "must NOT have fewer than 3 characters" };
              vErrors === null ? vErrors = [err5] : vErrors.push(err5), errors++;
            }
          } else {
            let err6 = { instancePath: instancePath + "/signIn/email", schemaPath: "#/$defs/SignIn/properties/email/type", keyword: "type", params: { type: "string" }, message: "must be string" };
            vErrors === null ? vErrors = [err6] : vErrors.push(err6), errors++;
          }
        }
        if (data0.password !== void 0) {
          let data2 = data0.password;
          if (typeof data2 == "string") {
            if (func1(data2) > 200) {
              let err7 = { instancePath: instancePath + "/signIn/password", schemaPath: "#/$defs/SignIn/properties/password/maxLength", keyword: "maxLength", params: { limit: 200 }, message: "must NOT have more than 200 characters" };
              vErrors === null ? vErrors = [err7] : vErrors.push(err7), errors++;
            }
            if (func1(data2) < 1) {
              let err8 = { instancePath: instancePath + "/signIn/password", schemaPath: "#/$defs/SignIn/properties/password/minLength", keyword: "minLength", params: { limit: 1 }, message: "must NOT have fewer than 1 characters" };
              vErrors === null ? vErrors = [err8] : vErrors.push(err8), errors++;
            }
          } else {
            let err9 = { instancePath: instancePath + "/signIn/password", schemaPath: "#/$defs/SignIn/properties/password/type", keyword: "type", params: { type: "string" }, message: "must be string" };
            vErrors === null ? vErrors = [err9] : vErrors.push(err9), errors++;
          }
        }
      } else {
        let err10 = { instancePath: instancePath + "/signIn", schemaPath: "#/$defs/SignIn/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        vErrors === null ? vErrors = [err10] : vErrors.push(err10), errors++;
      }
    }
    if (data.session !== void 0 && (validate21(data.session, { instancePath: instancePath + "/session", parentData: data, parentDataProperty: "session", rootData, dynamicAnchors }) || (vErrors = vErrors === null ? validate21.errors : vErrors.concat(validate21.errors), errors = vErrors.length)), data.health !== void 0) {
      let data4 = data.health;
      if (data4 && typeof data4 == "object" && !Array.isArray(data4)) {
        if (data4.ok === void 0) {
          let err11 = { instancePath: instancePath + "/health", schemaPath: "#/$defs/Health/required", keyword: "required", params: { missingProperty: "ok" }, message: "must have required property 'ok'" };
          vErrors === null ? vErrors = [err11] : vErrors.push(err11), errors++;
        }
        for (let key2 in data4)
          if (key2 !== "ok") {
            let err12 = { instancePath: instancePath + "/health", schemaPath: "#/$defs/Health/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key2 }, message: "must NOT have additional properties" };
            vErrors === null ? vErrors = [err12] : vErrors.push(err12), errors++;
          }
        if (data4.ok !== void 0 && data4.ok !== !0) {
          let err13 = { instancePath: instancePath + "/health/ok", schemaPath: "#/$defs/Health/properties/ok/const", keyword: "const", params: { allowedValue: !0 }, message: "must be equal to constant" };
          vErrors === null ? vErrors = [err13] : vErrors.push(err13), errors++;
        }
      } else {
        let err14 = { instancePath: instancePath + "/health", schemaPath: "#/$defs/Health/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        vErrors === null ? vErrors = [err14] : vErrors.push(err14), errors++;
      }
    }
  } else {
    let err15 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    vErrors === null ? vErrors = [err15] : vErrors.push(err15), errors++;
  }
  return validate20.errors = vErrors, errors === 0;
}
validate20.evaluated = { props: !0, dynamicProps: !1, dynamicItems: !1 };

export const validate: SchemaValidator<SessionBodies> = machineMade as SchemaValidator<SessionBodies>;
