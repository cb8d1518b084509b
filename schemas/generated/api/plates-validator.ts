// Made by `npm run generate` from the JSON Schema of the same name. Not to be edited.
// @ts-nocheck: machine-made code; its type is stated at the end.
import { type SchemaValidator } from '../schema-validator';
import { type PlateBodies } from './plates';

// <stdin>
var machineMade = validate20;
var schema32 = { type: "object", description: "A still of the shot\u2019s panorama", additionalProperties: !1, required: ["id", "shotId", "frame", "fileName", "width", "height", "bytes", "projection", "versions", "createdAt"], properties: { id: { type: "string", description: "The plate: a UUID" }, shotId: { type: "string", description: "Its shot: a UUID" }, frame: { type: "integer", minimum: 0, description: "The source frame at which it stands" }, fileName: { type: "string", description: "The name of the file that was brought" }, width: { type: "integer", minimum: 1, description: "Width of the picture that was brought, pixels" }, height: { type: "integer", minimum: 1, description: "Height of the picture that was brought, pixels" }, bytes: { type: "integer", minimum: 1, description: "Size of the file that was brought, bytes" }, projection: { type: "string", enum: ["stated", "assumed"], description: "Whether the file says that it is a whole equirectangular panorama, or its 2:1 shape is all that tells" }, versions: { type: "array", items: { $ref: "#/$defs/PlateVersion" } }, createdAt: { type: "string", description: "When it was added: an instant, ISO 8601 in UTC" } } }, func1 = Object.prototype.hasOwnProperty;
var schema34 = { type: "string", enum: ["display", "4096", "2048", "thumb"], description: "display: up to 8192 pixels wide; 4096 and 2048: up to that width; thumb: up to 512" };
function validate22(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null, errors = 0, evaluated0 = validate22.evaluated;
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
    if (data.url === void 0) {
      let err3 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "url" }, message: "must have required property 'url'" };
      vErrors === null ? vErrors = [err3] : vErrors.push(err3), errors++;
    }
    for (let key0 in data)
      if (!(key0 === "name" || key0 === "width" || key0 === "height" || key0 === "url")) {
        let err4 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        vErrors === null ? vErrors = [err4] : vErrors.push(err4), errors++;
      }
    if (data.name !== void 0) {
      let data0 = data.name;
      if (typeof data0 != "string") {
        let err5 = { instancePath: instancePath + "/name", schemaPath: "#/$defs/PlateVersionName/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        vErrors === null ? vErrors = [err5] : vErrors.push(err5), errors++;
      }
      if (!(data0 === "display" || data0 === "4096" || data0 === "2048" || data0 === "thumb")) {
        let err6 = { instancePath: instancePath + "/name", schemaPath: "#/$defs/PlateVersionName/enum", keyword: "enum", params: { allowedValues: schema34.enum }, message: "must be equal to one of the allowed values" };
        vErrors === null ? vErrors = [err6] : vErrors.push(err6), errors++;
      }
    }
    if (data.width !== void 0) {
      let data1 = data.width;
      if (!(typeof data1 == "number" && !(data1 % 1) && !isNaN(data1) && isFinite(data1))) {
        let err7 = { instancePath: instancePath + "/width", schemaPath: "#/properties/width/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        vErrors === null ? vErrors = [err7] : vErrors.push(err7), errors++;
      }
      if (typeof data1 == "number" && isFinite(data1) && (data1 < 1 || isNaN(data1))) {
        let err8 = { instancePath: instancePath + "/width", schemaPath: "#/properties/width/minimum", keyword: "minimum", params: { comparison: ">=", limit: 1 }, message: "must be >= 1" };
        vErrors === null ? vErrors = [err8] : vErrors.push(err8), errors++;
      }
    }
    if (data.height !== void 0) {
      let data2 = data.height;
      if (!(typeof data2 == "number" && !(data2 % 1) && !isNaN(data2) && isFinite(data2))) {
        let err9 = { instancePath: instancePath + "/height", schemaPath: "#/properties/height/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        vErrors === null ? vErrors = [err9] : vErrors.push(err9), errors++;
      }
      if (typeof data2 == "number" && isFinite(data2) && (data2 < 1 || isNaN(data2))) {
        let err10 = { instancePath: instancePath + "/height", schemaPath: "#/properties/height/minimum", keyword: "minimum", params: { comparison: ">=", limit: 1 }, message: "must be >= 1" };
        vErrors === null ? vErrors = [err10] : vErrors.push(err10), errors++;
      }
    }
    if (data.url !== void 0 && typeof data.url != "string") {
      let err11 = { instancePath: instancePath + "/url", schemaPath: "#/properties/url/type", keyword: "type", params: { type: "string" }, message: "must be string" };
      vErrors === null ? vErrors = [err11] : vErrors.push(err11), errors++;
    }
  } else {
    let err12 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    vErrors === null ? vErrors = [err12] : vErrors.push(err12), errors++;
  }
  return validate22.errors = vErrors, errors === 0;
}
validate22.evaluated = { props: !0, dynamicProps: !1, dynamicItems: !1 };
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
    if (data.frame === void 0) {
      let err2 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "frame" }, message: "must have required property 'frame'" };
      vErrors === null ? vErrors = [err2] : vErrors.push(err2), errors++;
    }
    if (data.fileName === void 0) {
      let err3 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "fileName" }, message: "must have required property 'fileName'" };
      vErrors === null ? vErrors = [err3] : vErrors.push(err3), errors++;
    }
    if (data.width === void 0) {
      let err4 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "width" }, message: "must have required property 'width'" };
      vErrors === null ? vErrors = [err4] : vErrors.push(err4), errors++;
    }
    if (data.height === void 0) {
      let err5 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "height" }, message: "must have required property 'height'" };
      vErrors === null ? vErrors = [err5] : vErrors.push(err5), errors++;
    }
    if (data.bytes === void 0) {
      let err6 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "bytes" }, message: "must have required property 'bytes'" };
      vErrors === null ? vErrors = [err6] : vErrors.push(err6), errors++;
    }
    if (data.projection === void 0) {
      let err7 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "projection" }, message: "must have required property 'projection'" };
      vErrors === null ? vErrors = [err7] : vErrors.push(err7), errors++;
    }
    if (data.versions === void 0) {
      let err8 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "versions" }, message: "must have required property 'versions'" };
      vErrors === null ? vErrors = [err8] : vErrors.push(err8), errors++;
    }
    if (data.createdAt === void 0) {
      let err9 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "createdAt" }, message: "must have required property 'createdAt'" };
      vErrors === null ? vErrors = [err9] : vErrors.push(err9), errors++;
    }
    for (let key0 in data)
      if (!func1.call(schema32.properties, key0)) {
        let err10 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        vErrors === null ? vErrors = [err10] : vErrors.push(err10), errors++;
      }
    if (data.id !== void 0 && typeof data.id != "string") {
      let err11 = { instancePath: instancePath + "/id", schemaPath: "#/properties/id/type", keyword: "type", params: { type: "string" }, message: "must be string" };
      vErrors === null ? vErrors = [err11] : vErrors.push(err11), errors++;
    }
    if (data.shotId !== void 0 && typeof data.shotId != "string") {
      let err12 = { instancePath: instancePath + "/shotId", schemaPath: "#/properties/shotId/type", keyword: "type", params: { type: "string" }, message: "must be string" };
      vErrors === null ? vErrors = [err12] : vErrors.push(err12), errors++;
    }
    if (data.frame !== void 0) {
      let data2 = data.frame;
      if (!(typeof data2 == "number" && !(data2 % 1) && !isNaN(data2) && isFinite(data2))) {
        let err13 = { instancePath: instancePath + "/frame", schemaPath: "#/properties/frame/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        vErrors === null ? vErrors = [err13] : vErrors.push(err13), errors++;
      }
      if (typeof data2 == "number" && isFinite(data2) && (data2 < 0 || isNaN(data2))) {
        let err14 = { instancePath: instancePath + "/frame", schemaPath: "#/properties/frame/minimum", keyword: "minimum", params: { comparison: ">=", limit: 0 }, message: "must be >= 0" };
        vErrors === null ? vErrors = [err14] : vErrors.push(err14), errors++;
      }
    }
    if (data.fileName !== void 0 && typeof data.fileName != "string") {
      let err15 = { instancePath: instancePath + "/fileName", schemaPath: "#/properties/fileName/type", keyword: "type", params: { type: "string" }, message: "must be string" };
      vErrors === null ? vErrors = [err15] : vErrors.push(err15), errors++;
    }
    if (data.width !== void 0) {
      let data4 = data.width;
      if (!(typeof data4 == "number" && !(data4 % 1) && !isNaN(data4) && isFinite(data4))) {
        let err16 = { instancePath: instancePath + "/width", schemaPath: "#/properties/width/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        vErrors === null ? vErrors = [err16] : vErrors.push(err16), errors++;
      }
      if (typeof data4 == "number" && isFinite(data4) && (data4 < 1 || isNaN(data4))) {
        let err17 = { instancePath: instancePath + "/width", schemaPath: "#/properties/width/minimum", keyword: "minimum", params: { comparison: ">=", limit: 1 }, message: "must be >= 1" };
        vErrors === null ? vErrors = [err17] : vErrors.push(err17), errors++;
      }
    }
    if (data.height !== void 0) {
      let data5 = data.height;
      if (!(typeof data5 == "number" && !(data5 % 1) && !isNaN(data5) && isFinite(data5))) {
        let err18 = { instancePath: instancePath + "/height", schemaPath: "#/properties/height/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        vErrors === null ? vErrors = [err18] : vErrors.push(err18), errors++;
      }
      if (typeof data5 == "number" && isFinite(data5) && (data5 < 1 || isNaN(data5))) {
        let err19 = { instancePath: instancePath + "/height", schemaPath: "#/properties/height/minimum", keyword: "minimum", params: { comparison: ">=", limit: 1 }, message: "must be >= 1" };
        vErrors === null ? vErrors = [err19] : vErrors.push(err19), errors++;
      }
    }
    if (data.bytes !== void 0) {
      let data6 = data.bytes;
      if (!(typeof data6 == "number" && !(data6 % 1) && !isNaN(data6) && isFinite(data6))) {
        let err20 = { instancePath: instancePath + "/bytes", schemaPath: "#/properties/bytes/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        vErrors === null ? vErrors = [err20] : vErrors.push(err20), errors++;
      }
      if (typeof data6 == "number" && isFinite(data6) && (data6 < 1 || isNaN(data6))) {
        let err21 = { instancePath: instancePath + "/bytes", schemaPath: "#/properties/bytes/minimum", keyword: "minimum", params: { comparison: ">=", limit: 1 }, message: "must be >= 1" };
        vErrors === null ? vErrors = [err21] : vErrors.push(err21), errors++;
      }
    }
    if (data.projection !== void 0) {
      let data7 = data.projection;
      if (typeof data7 != "string") {
        let err22 = { instancePath: instancePath + "/projection", schemaPath: "#/properties/projection/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        vErrors === null ? vErrors = [err22] : vErrors.push(err22), errors++;
      }
      if (!(data7 === "stated" || data7 === "assumed")) {
        let err23 = { instancePath: instancePath + "/projection", schemaPath: "#/properties/projection/enum", keyword: "enum", params: { allowedValues: schema32.properties.projection.enum }, message: "must be equal to one of the allowed values" };
        vErrors === null ? vErrors = [err23] : vErrors.push(err23), errors++;
      }
    }
    if (data.versions !== void 0) {
      let data8 = data.versions;
      if (Array.isArray(data8)) {
        let len0 = data8.length;
        for (let i0 = 0; i0 < len0; i0++)
          validate22(data8[i0], { instancePath: instancePath + "/versions/" + i0, parentData: data8, parentDataProperty: i0, rootData, dynamicAnchors }) || (vErrors = vErrors === null ? validate22.errors : vErrors.concat(validate22.errors), errors = vErrors.length);
      } else {
        let err24 = { instancePath: instancePath + "/versions", schemaPath: "#/properties/versions/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        vErrors === null ? vErrors = [err24] : vErrors.push(err24), errors++;
      }
    }
    if (data.createdAt !== void 0 && typeof data.createdAt != "string") {
      let err25 = { instancePath: instancePath + "/createdAt", schemaPath: "#/properties/createdAt/type", keyword: "type", params: { type: "string" }, message: "must be string" };
      vErrors === null ? vErrors = [err25] : vErrors.push(err25), errors++;
    }
  } else {
    let err26 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    vErrors === null ? vErrors = [err26] : vErrors.push(err26), errors++;
  }
  return validate21.errors = vErrors, errors === 0;
}
validate21.evaluated = { props: !0, dynamicProps: !1, dynamicItems: !1 };
function validate25(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null, errors = 0, evaluated0 = validate25.evaluated;
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
          validate21(data0[i0], { instancePath: instancePath + "/items/" + i0, parentData: data0, parentDataProperty: i0, rootData, dynamicAnchors }) || (vErrors = vErrors === null ? validate21.errors : vErrors.concat(validate21.errors), errors = vErrors.length);
      } else {
        let err2 = { instancePath: instancePath + "/items", schemaPath: "#/properties/items/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        vErrors === null ? vErrors = [err2] : vErrors.push(err2), errors++;
      }
    }
  } else {
    let err3 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    vErrors === null ? vErrors = [err3] : vErrors.push(err3), errors++;
  }
  return validate25.errors = vErrors, errors === 0;
}
validate25.evaluated = { props: !0, dynamicProps: !1, dynamicItems: !1 };
function validate20(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null, errors = 0, evaluated0 = validate20.evaluated;
  if (evaluated0.dynamicProps && (evaluated0.props = void 0), evaluated0.dynamicItems && (evaluated0.items = void 0), data && typeof data == "object" && !Array.isArray(data)) {
    for (let key0 in data)
      if (!(key0 === "plate" || key0 === "platePicture" || key0 === "plateList")) {
        let err0 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        vErrors === null ? vErrors = [err0] : vErrors.push(err0), errors++;
      }
    if (data.plate !== void 0 && (validate21(data.plate, { instancePath: instancePath + "/plate", parentData: data, parentDataProperty: "plate", rootData, dynamicAnchors }) || (vErrors = vErrors === null ? validate21.errors : vErrors.concat(validate21.errors), errors = vErrors.length)), data.platePicture !== void 0) {
      let data1 = data.platePicture;
      if (data1 && typeof data1 == "object" && !Array.isArray(data1)) {
        if (data1.plateId === void 0) {
          let err1 = { instancePath: instancePath + "/platePicture", schemaPath: "#/$defs/PlatePicture/required", keyword: "required", params: { missingProperty: "plateId" }, message: "must have required property 'plateId'" };
          vErrors === null ? vErrors = [err1] : vErrors.push(err1), errors++;
        }
        if (data1.thumbUrl === void 0) {
          let err2 = { instancePath: instancePath + "/platePicture", schemaPath: "#/$defs/PlatePicture/required", keyword: "required", params: { missingProperty: "thumbUrl" }, message: "must have required property 'thumbUrl'" };
          vErrors === null ? vErrors = [err2] : vErrors.push(err2), errors++;
        }
        if (data1.url2048 === void 0) {
          let err3 = { instancePath: instancePath + "/platePicture", schemaPath: "#/$defs/PlatePicture/required", keyword: "required", params: { missingProperty: "url2048" }, message: "must have required property 'url2048'" };
          vErrors === null ? vErrors = [err3] : vErrors.push(err3), errors++;
        }
        for (let key1 in data1)
          if (!(key1 === "plateId" || key1 === "thumbUrl" || key1 === "url2048")) {
            let err4 = { instancePath: instancePath + "/platePicture", schemaPath: "#/$defs/PlatePicture/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key1 }, message: "must NOT have additional properties" };
            vErrors === null ? vErrors = [err4] : vErrors.push(err4), errors++;
          }
        if (data1.plateId !== void 0 && typeof data1.plateId != "string") {
          let err5 = { instancePath: instancePath + "/platePicture/plateId", schemaPath: "#/$defs/PlatePicture/properties/plateId/type", keyword: "type", params: { type: "string" }, message: "must be string" };
          vErrors === null ? vErrors = [err5] : vErrors.push(err5), errors++;
        }
        if (data1.thumbUrl !== void 0 && typeof data1.thumbUrl != "string") {
          let err6 = { instancePath: instancePath + "/platePicture/thumbUrl", schemaPath: "#/$defs/PlatePicture/properties/thumbUrl/type", keyword: "type", params: { type: "string" }, message: "must be string" };
          vErrors === null ? vErrors = [err6] : vErrors.push(err6), errors++;
        }
        if (data1.url2048 !== void 0 && typeof data1.url2048 != "string") {
          let err7 = { instancePath: instancePath + "/platePicture/url2048", schemaPath: "#/$defs/PlatePicture/properties/url2048/type", keyword: "type", params: { type: "string" }, message: "must be string" };
          vErrors === null ? vErrors = [err7] : vErrors.push(err7), errors++;
        }
      } else {
        let err8 = { instancePath: instancePath + "/platePicture", schemaPath: "#/$defs/PlatePicture/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        vErrors === null ? vErrors = [err8] : vErrors.push(err8), errors++;
      }
    }
    data.plateList !== void 0 && (validate25(data.plateList, { instancePath: instancePath + "/plateList", parentData: data, parentDataProperty: "plateList", rootData, dynamicAnchors }) || (vErrors = vErrors === null ? validate25.errors : vErrors.concat(validate25.errors), errors = vErrors.length));
  } else {
    let err9 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    vErrors === null ? vErrors = [err9] : vErrors.push(err9), errors++;
  }
  return validate20.errors = vErrors, errors === 0;
}
validate20.evaluated = { props: !0, dynamicProps: !1, dynamicItems: !1 };

export const validate: SchemaValidator<PlateBodies> = machineMade as SchemaValidator<PlateBodies>;
