// Made by `npm run generate` from the JSON Schema of the same name. Not to be edited.
// @ts-nocheck: machine-made code; its type is stated at the end.
import { type SchemaValidator } from '../schema-validator';
import { type ProblemBodies } from './problem';

// <stdin>
var machineMade = validate20;
function validate21(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null, errors = 0, evaluated0 = validate21.evaluated;
  if (evaluated0.dynamicProps && (evaluated0.props = void 0), evaluated0.dynamicItems && (evaluated0.items = void 0), data && typeof data == "object" && !Array.isArray(data)) {
    if (data.type === void 0) {
      let err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "type" }, message: "must have required property 'type'" };
      vErrors === null ? vErrors = [err0] : vErrors.push(err0), errors++;
    }
    if (data.title === void 0) {
      let err1 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "title" }, message: "must have required property 'title'" };
      vErrors === null ? vErrors = [err1] : vErrors.push(err1), errors++;
    }
    if (data.status === void 0) {
      let err2 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "status" }, message: "must have required property 'status'" };
      vErrors === null ? vErrors = [err2] : vErrors.push(err2), errors++;
    }
    if (data.detail === void 0) {
      let err3 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "detail" }, message: "must have required property 'detail'" };
      vErrors === null ? vErrors = [err3] : vErrors.push(err3), errors++;
    }
    if (data.instance === void 0) {
      let err4 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "instance" }, message: "must have required property 'instance'" };
      vErrors === null ? vErrors = [err4] : vErrors.push(err4), errors++;
    }
    if (data.type !== void 0 && typeof data.type != "string") {
      let err5 = { instancePath: instancePath + "/type", schemaPath: "#/properties/type/type", keyword: "type", params: { type: "string" }, message: "must be string" };
      vErrors === null ? vErrors = [err5] : vErrors.push(err5), errors++;
    }
    if (data.title !== void 0 && typeof data.title != "string") {
      let err6 = { instancePath: instancePath + "/title", schemaPath: "#/properties/title/type", keyword: "type", params: { type: "string" }, message: "must be string" };
      vErrors === null ? vErrors = [err6] : vErrors.push(err6), errors++;
    }
    if (data.status !== void 0) {
      let data2 = data.status;
      if (!(typeof data2 == "number" && !(data2 % 1) && !isNaN(data2) && isFinite(data2))) {
        let err7 = { instancePath: instancePath + "/status", schemaPath: "#/properties/status/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        vErrors === null ? vErrors = [err7] : vErrors.push(err7), errors++;
      }
      if (typeof data2 == "number" && isFinite(data2)) {
        if (data2 > 599 || isNaN(data2)) {
          let err8 = { instancePath: instancePath + "/status", schemaPath: "#/properties/status/maximum", keyword: "maximum", params: { comparison: "<=", limit: 599 }, message: "must be <= 599" };
          vErrors === null ? vErrors = [err8] : vErrors.push(err8), errors++;
        }
        if (data2 < 400 || isNaN(data2)) {
          let err9 = { instancePath: instancePath + "/status", schemaPath: "#/properties/status/minimum", keyword: "minimum", params: { comparison: ">=", limit: 400 }, message: "must be >= 400" };
          vErrors === null ? vErrors = [err9] : vErrors.push(err9), errors++;
        }
      }
    }
    if (data.detail !== void 0 && typeof data.detail != "string") {
      let err10 = { instancePath: instancePath + "/detail", schemaPath: "#/properties/detail/type", keyword: "type", params: { type: "string" }, message: "must be string" };
      vErrors === null ? vErrors = [err10] : vErrors.push(err10), errors++;
    }
    if (data.instance !== void 0 && typeof data.instance != "string") {
      let err11 = { instancePath: instancePath + "/instance", schemaPath: "#/properties/instance/type", keyword: "type", params: { type: "string" }, message: "must be string" };
      vErrors === null ? vErrors = [err11] : vErrors.push(err11), errors++;
    }
    if (data.errors !== void 0) {
      let data5 = data.errors;
      if (Array.isArray(data5)) {
        let len0 = data5.length;
        for (let i0 = 0; i0 < len0; i0++) {
          let data6 = data5[i0];
          if (data6 && typeof data6 == "object" && !Array.isArray(data6)) {
            if (data6.pointer === void 0) {
              let err12 = { instancePath: instancePath + "/errors/" + i0, schemaPath: "#/$defs/Fault/required", keyword: "required", params: { missingProperty: "pointer" }, message: "must have required property 'pointer'" };
              vErrors === null ? vErrors = [err12] : vErrors.push(err12), errors++;
            }
            if (data6.detail === void 0) {
              let err13 = { instancePath: instancePath + "/errors/" + i0, schemaPath: "#/$defs/Fault/required", keyword: "required", params: { missingProperty: "detail" }, message: "must have required property 'detail'" };
              vErrors === null ? vErrors = [err13] : vErrors.push(err13), errors++;
            }
            for (let key0 in data6)
              if (!(key0 === "pointer" || key0 === "detail")) {
                let err14 = { instancePath: instancePath + "/errors/" + i0, schemaPath: "#/$defs/Fault/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
                vErrors === null ? vErrors = [err14] : vErrors.push(err14), errors++;
              }
            if (data6.pointer !== void 0 && typeof data6.pointer != "string") {
              let err15 = { instancePath: instancePath + "/errors/" + i0 + "/pointer", schemaPath: "#/$defs/Fault/properties/pointer/type", keyword: "type", params: { type: "string" }, message: "must be string" };
              vErrors === null ? vErrors = [err15] : vErrors.push(err15), errors++;
            }
            if (data6.detail !== void 0 && typeof data6.detail != "string") {
              let err16 = { instancePath: instancePath + "/errors/" + i0 + "/detail", schemaPath: "#/$defs/Fault/properties/detail/type", keyword: "type", params: { type: "string" }, message: "must be string" };
              vErrors === null ? vErrors = [err16] : vErrors.push(err16), errors++;
            }
          } else {
            let err17 = { instancePath: instancePath + "/errors/" + i0, schemaPath: "#/$defs/Fault/type", keyword: "type", params: { type: "object" }, message: "must be object" };
            vErrors === null ? vErrors = [err17] : vErrors.push(err17), errors++;
          }
        }
      } else {
        let err18 = { instancePath: instancePath + "/errors", schemaPath: "#/properties/errors/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        vErrors === null ? vErrors = [err18] : vErrors.push(err18), errors++;
      }
    }
  } else {
    let err19 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    vErrors === null ? vErrors = [err19] : vErrors.push(err19), errors++;
  }
  return validate21.errors = vErrors, errors === 0;
}
validate21.evaluated = { props: { type: !0, title: !0, status: !0, detail: !0, instance: !0, errors: !0 }, dynamicProps: !1, dynamicItems: !1 };
function validate20(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null, errors = 0, evaluated0 = validate20.evaluated;
  if (evaluated0.dynamicProps && (evaluated0.props = void 0), evaluated0.dynamicItems && (evaluated0.items = void 0), data && typeof data == "object" && !Array.isArray(data)) {
    for (let key0 in data)
      if (key0 !== "problem") {
        let err0 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        vErrors === null ? vErrors = [err0] : vErrors.push(err0), errors++;
      }
    data.problem !== void 0 && (validate21(data.problem, { instancePath: instancePath + "/problem", parentData: data, parentDataProperty: "problem", rootData, dynamicAnchors }) || (vErrors = vErrors === null ? validate21.errors : vErrors.concat(validate21.errors), errors = vErrors.length));
  } else {
    let err1 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    vErrors === null ? vErrors = [err1] : vErrors.push(err1), errors++;
  }
  return validate20.errors = vErrors, errors === 0;
}
validate20.evaluated = { props: !0, dynamicProps: !1, dynamicItems: !1 };

export const validate: SchemaValidator<ProblemBodies> = machineMade as SchemaValidator<ProblemBodies>;
