// Made by bin/generate.ts from templates/slipway. Change those, not this.
import Handlebars from 'handlebars/runtime.js';

export const templates = {
  "attr": Handlebars.template({"0":function(container,depth0,helpers,partials,data) {
    var stack1;

  return " min="
    + ((stack1 = container.lambda(container.strict(depth0, "min", {"start":{"line":1,"column":71},"end":{"line":1,"column":74}} ), depth0)) != null ? stack1 : "");
},"1":function(container,depth0,helpers,partials,data) {
    var stack1;

  return " max="
    + ((stack1 = container.lambda(container.strict(depth0, "max", {"start":{"line":1,"column":101},"end":{"line":1,"column":104}} ), depth0)) != null ? stack1 : "");
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda, alias3=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "attr "
    + ((stack1 = alias2(alias1(depth0, "quotedName", {"start":{"line":1,"column":7},"end":{"line":1,"column":17}} ), depth0)) != null ? stack1 : "")
    + " name="
    + ((stack1 = alias2(alias1(depth0, "name", {"start":{"line":1,"column":27},"end":{"line":1,"column":31}} ), depth0)) != null ? stack1 : "")
    + " default="
    + ((stack1 = alias2(alias1(depth0, "default", {"start":{"line":1,"column":44},"end":{"line":1,"column":51}} ), depth0)) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias3,lookupProperty(depth0,"min"),{"name":"if","hash":{},"fn":container.program(0, data, 0),"inverse":container.noop,"loc":{"start":{"line":1,"column":53},"end":{"line":1,"column":83}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias3,lookupProperty(depth0,"max"),{"name":"if","hash":{},"fn":container.program(1, data, 0),"inverse":container.noop,"loc":{"start":{"line":1,"column":83},"end":{"line":1,"column":113}}})) != null ? stack1 : "")
    + "\n";
}}),
  "constrain": Handlebars.template({"0":function(container,depth0,helpers,partials,data) {
    var stack1;

  return " blend="
    + ((stack1 = container.lambda(container.strict(depth0, "blend", {"start":{"line":1,"column":156},"end":{"line":1,"column":161}} ), depth0)) != null ? stack1 : "");
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "constrain "
    + ((stack1 = alias2(alias1(depth0, "quotedName", {"start":{"line":1,"column":12},"end":{"line":1,"column":22}} ), depth0)) != null ? stack1 : "")
    + " id="
    + ((stack1 = alias2(alias1(depth0, "id", {"start":{"line":1,"column":30},"end":{"line":1,"column":32}} ), depth0)) != null ? stack1 : "")
    + " kind="
    + ((stack1 = alias2(alias1(depth0, "kind", {"start":{"line":1,"column":42},"end":{"line":1,"column":46}} ), depth0)) != null ? stack1 : "")
    + " target="
    + ((stack1 = alias2(alias1(depth0, "target", {"start":{"line":1,"column":58},"end":{"line":1,"column":64}} ), depth0)) != null ? stack1 : "")
    + " sources="
    + ((stack1 = alias2(alias1(depth0, "sources", {"start":{"line":1,"column":77},"end":{"line":1,"column":84}} ), depth0)) != null ? stack1 : "")
    + " weights="
    + ((stack1 = alias2(alias1(depth0, "weights", {"start":{"line":1,"column":97},"end":{"line":1,"column":104}} ), depth0)) != null ? stack1 : "")
    + " keep_offset="
    + ((stack1 = alias2(alias1(depth0, "keep_offset", {"start":{"line":1,"column":121},"end":{"line":1,"column":132}} ), depth0)) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"blend"),{"name":"if","hash":{},"fn":container.program(0, data, 0),"inverse":container.noop,"loc":{"start":{"line":1,"column":134},"end":{"line":1,"column":170}}})) != null ? stack1 : "")
    + "\n";
}}),
  "control": Handlebars.template({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda;

  return "control "
    + ((stack1 = alias2(alias1(depth0, "quotedName", {"start":{"line":1,"column":10},"end":{"line":1,"column":20}} ), depth0)) != null ? stack1 : "")
    + " id="
    + ((stack1 = alias2(alias1(depth0, "id", {"start":{"line":1,"column":28},"end":{"line":1,"column":30}} ), depth0)) != null ? stack1 : "")
    + " parent="
    + ((stack1 = alias2(alias1(depth0, "parent", {"start":{"line":1,"column":42},"end":{"line":1,"column":48}} ), depth0)) != null ? stack1 : "")
    + " container="
    + ((stack1 = alias2(alias1(depth0, "container", {"start":{"line":1,"column":63},"end":{"line":1,"column":72}} ), depth0)) != null ? stack1 : "")
    + " role="
    + ((stack1 = alias2(alias1(depth0, "role", {"start":{"line":1,"column":82},"end":{"line":1,"column":86}} ), depth0)) != null ? stack1 : "")
    + " side="
    + ((stack1 = alias2(alias1(depth0, "side", {"start":{"line":1,"column":96},"end":{"line":1,"column":100}} ), depth0)) != null ? stack1 : "")
    + " at="
    + ((stack1 = alias2(alias1(depth0, "at", {"start":{"line":1,"column":108},"end":{"line":1,"column":110}} ), depth0)) != null ? stack1 : "")
    + " turn="
    + ((stack1 = alias2(alias1(depth0, "turn", {"start":{"line":1,"column":120},"end":{"line":1,"column":124}} ), depth0)) != null ? stack1 : "")
    + " order="
    + ((stack1 = alias2(alias1(depth0, "order", {"start":{"line":1,"column":135},"end":{"line":1,"column":140}} ), depth0)) != null ? stack1 : "")
    + " shape="
    + ((stack1 = alias2(alias1(depth0, "shape", {"start":{"line":1,"column":151},"end":{"line":1,"column":156}} ), depth0)) != null ? stack1 : "")
    + " size="
    + ((stack1 = alias2(alias1(depth0, "size", {"start":{"line":1,"column":166},"end":{"line":1,"column":170}} ), depth0)) != null ? stack1 : "")
    + "\n";
}}),
  "entry": Handlebars.template({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda;

  return "entry "
    + ((stack1 = alias2(alias1(depth0, "quotedName", {"start":{"line":1,"column":8},"end":{"line":1,"column":18}} ), depth0)) != null ? stack1 : "")
    + " key="
    + ((stack1 = alias2(alias1(depth0, "key", {"start":{"line":1,"column":27},"end":{"line":1,"column":30}} ), depth0)) != null ? stack1 : "")
    + " value="
    + ((stack1 = alias2(alias1(depth0, "value", {"start":{"line":1,"column":41},"end":{"line":1,"column":46}} ), depth0)) != null ? stack1 : "")
    + "\n";
}}),
  "group": Handlebars.template({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda;

  return "group "
    + ((stack1 = alias2(alias1(depth0, "quotedName", {"start":{"line":1,"column":8},"end":{"line":1,"column":18}} ), depth0)) != null ? stack1 : "")
    + " id="
    + ((stack1 = alias2(alias1(depth0, "id", {"start":{"line":1,"column":26},"end":{"line":1,"column":28}} ), depth0)) != null ? stack1 : "")
    + " parent="
    + ((stack1 = alias2(alias1(depth0, "parent", {"start":{"line":1,"column":40},"end":{"line":1,"column":46}} ), depth0)) != null ? stack1 : "")
    + " container="
    + ((stack1 = alias2(alias1(depth0, "container", {"start":{"line":1,"column":61},"end":{"line":1,"column":70}} ), depth0)) != null ? stack1 : "")
    + " role="
    + ((stack1 = alias2(alias1(depth0, "role", {"start":{"line":1,"column":80},"end":{"line":1,"column":84}} ), depth0)) != null ? stack1 : "")
    + " side="
    + ((stack1 = alias2(alias1(depth0, "side", {"start":{"line":1,"column":94},"end":{"line":1,"column":98}} ), depth0)) != null ? stack1 : "")
    + " at="
    + ((stack1 = alias2(alias1(depth0, "at", {"start":{"line":1,"column":106},"end":{"line":1,"column":108}} ), depth0)) != null ? stack1 : "")
    + " turn="
    + ((stack1 = alias2(alias1(depth0, "turn", {"start":{"line":1,"column":118},"end":{"line":1,"column":122}} ), depth0)) != null ? stack1 : "")
    + "\n";
}}),
  "joint": Handlebars.template({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda;

  return "joint "
    + ((stack1 = alias2(alias1(depth0, "quotedName", {"start":{"line":1,"column":8},"end":{"line":1,"column":18}} ), depth0)) != null ? stack1 : "")
    + " id="
    + ((stack1 = alias2(alias1(depth0, "id", {"start":{"line":1,"column":26},"end":{"line":1,"column":28}} ), depth0)) != null ? stack1 : "")
    + " parent="
    + ((stack1 = alias2(alias1(depth0, "parent", {"start":{"line":1,"column":40},"end":{"line":1,"column":46}} ), depth0)) != null ? stack1 : "")
    + " container="
    + ((stack1 = alias2(alias1(depth0, "container", {"start":{"line":1,"column":61},"end":{"line":1,"column":70}} ), depth0)) != null ? stack1 : "")
    + " role="
    + ((stack1 = alias2(alias1(depth0, "role", {"start":{"line":1,"column":80},"end":{"line":1,"column":84}} ), depth0)) != null ? stack1 : "")
    + " side="
    + ((stack1 = alias2(alias1(depth0, "side", {"start":{"line":1,"column":94},"end":{"line":1,"column":98}} ), depth0)) != null ? stack1 : "")
    + " at="
    + ((stack1 = alias2(alias1(depth0, "at", {"start":{"line":1,"column":106},"end":{"line":1,"column":108}} ), depth0)) != null ? stack1 : "")
    + " turn="
    + ((stack1 = alias2(alias1(depth0, "turn", {"start":{"line":1,"column":118},"end":{"line":1,"column":122}} ), depth0)) != null ? stack1 : "")
    + " order="
    + ((stack1 = alias2(alias1(depth0, "order", {"start":{"line":1,"column":133},"end":{"line":1,"column":138}} ), depth0)) != null ? stack1 : "")
    + "\n";
}}),
  "limit": Handlebars.template({"0":function(container,depth0,helpers,partials,data) {
    var stack1;

  return " min="
    + ((stack1 = container.lambda(container.strict(depth0, "min", {"start":{"line":1,"column":58},"end":{"line":1,"column":61}} ), depth0)) != null ? stack1 : "");
},"1":function(container,depth0,helpers,partials,data) {
    var stack1;

  return " max="
    + ((stack1 = container.lambda(container.strict(depth0, "max", {"start":{"line":1,"column":88},"end":{"line":1,"column":91}} ), depth0)) != null ? stack1 : "");
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda, alias3=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "limit "
    + ((stack1 = alias2(alias1(depth0, "quotedName", {"start":{"line":1,"column":8},"end":{"line":1,"column":18}} ), depth0)) != null ? stack1 : "")
    + " channel="
    + ((stack1 = alias2(alias1(depth0, "channel", {"start":{"line":1,"column":31},"end":{"line":1,"column":38}} ), depth0)) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias3,lookupProperty(depth0,"min"),{"name":"if","hash":{},"fn":container.program(0, data, 0),"inverse":container.noop,"loc":{"start":{"line":1,"column":40},"end":{"line":1,"column":70}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias3,lookupProperty(depth0,"max"),{"name":"if","hash":{},"fn":container.program(1, data, 0),"inverse":container.noop,"loc":{"start":{"line":1,"column":70},"end":{"line":1,"column":100}}})) != null ? stack1 : "")
    + "\n";
}}),
  "line": Handlebars.template({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda;

  return "line "
    + ((stack1 = alias2(alias1(depth0, "quotedName", {"start":{"line":1,"column":7},"end":{"line":1,"column":17}} ), depth0)) != null ? stack1 : "")
    + " id="
    + ((stack1 = alias2(alias1(depth0, "id", {"start":{"line":1,"column":25},"end":{"line":1,"column":27}} ), depth0)) != null ? stack1 : "")
    + " parent="
    + ((stack1 = alias2(alias1(depth0, "parent", {"start":{"line":1,"column":39},"end":{"line":1,"column":45}} ), depth0)) != null ? stack1 : "")
    + " container="
    + ((stack1 = alias2(alias1(depth0, "container", {"start":{"line":1,"column":60},"end":{"line":1,"column":69}} ), depth0)) != null ? stack1 : "")
    + " role="
    + ((stack1 = alias2(alias1(depth0, "role", {"start":{"line":1,"column":79},"end":{"line":1,"column":83}} ), depth0)) != null ? stack1 : "")
    + " side="
    + ((stack1 = alias2(alias1(depth0, "side", {"start":{"line":1,"column":93},"end":{"line":1,"column":97}} ), depth0)) != null ? stack1 : "")
    + " at="
    + ((stack1 = alias2(alias1(depth0, "at", {"start":{"line":1,"column":105},"end":{"line":1,"column":107}} ), depth0)) != null ? stack1 : "")
    + " turn="
    + ((stack1 = alias2(alias1(depth0, "turn", {"start":{"line":1,"column":117},"end":{"line":1,"column":121}} ), depth0)) != null ? stack1 : "")
    + " from="
    + ((stack1 = alias2(alias1(depth0, "from", {"start":{"line":1,"column":131},"end":{"line":1,"column":135}} ), depth0)) != null ? stack1 : "")
    + " to="
    + ((stack1 = alias2(alias1(depth0, "to", {"start":{"line":1,"column":143},"end":{"line":1,"column":145}} ), depth0)) != null ? stack1 : "")
    + " style="
    + ((stack1 = alias2(alias1(depth0, "style", {"start":{"line":1,"column":156},"end":{"line":1,"column":161}} ), depth0)) != null ? stack1 : "")
    + "\n";
}}),
  "lock": Handlebars.template({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda;

  return "lock "
    + ((stack1 = alias2(alias1(depth0, "quotedName", {"start":{"line":1,"column":7},"end":{"line":1,"column":17}} ), depth0)) != null ? stack1 : "")
    + " channels="
    + ((stack1 = alias2(alias1(depth0, "channels", {"start":{"line":1,"column":31},"end":{"line":1,"column":39}} ), depth0)) != null ? stack1 : "")
    + "\n";
}}),
  "note": Handlebars.template({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda;

  return "note "
    + ((stack1 = alias2(alias1(depth0, "quotedName", {"start":{"line":1,"column":7},"end":{"line":1,"column":17}} ), depth0)) != null ? stack1 : "")
    + " id="
    + ((stack1 = alias2(alias1(depth0, "id", {"start":{"line":1,"column":25},"end":{"line":1,"column":27}} ), depth0)) != null ? stack1 : "")
    + " parent="
    + ((stack1 = alias2(alias1(depth0, "parent", {"start":{"line":1,"column":39},"end":{"line":1,"column":45}} ), depth0)) != null ? stack1 : "")
    + " container="
    + ((stack1 = alias2(alias1(depth0, "container", {"start":{"line":1,"column":60},"end":{"line":1,"column":69}} ), depth0)) != null ? stack1 : "")
    + " role="
    + ((stack1 = alias2(alias1(depth0, "role", {"start":{"line":1,"column":79},"end":{"line":1,"column":83}} ), depth0)) != null ? stack1 : "")
    + " side="
    + ((stack1 = alias2(alias1(depth0, "side", {"start":{"line":1,"column":93},"end":{"line":1,"column":97}} ), depth0)) != null ? stack1 : "")
    + " at="
    + ((stack1 = alias2(alias1(depth0, "at", {"start":{"line":1,"column":105},"end":{"line":1,"column":107}} ), depth0)) != null ? stack1 : "")
    + " turn="
    + ((stack1 = alias2(alias1(depth0, "turn", {"start":{"line":1,"column":117},"end":{"line":1,"column":121}} ), depth0)) != null ? stack1 : "")
    + "\n";
}}),
  "scene": Handlebars.template({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda;

  return "scene "
    + ((stack1 = alias2(alias1(depth0, "quotedName", {"start":{"line":1,"column":8},"end":{"line":1,"column":18}} ), depth0)) != null ? stack1 : "")
    + " recipe="
    + ((stack1 = alias2(alias1(depth0, "recipe", {"start":{"line":1,"column":30},"end":{"line":1,"column":36}} ), depth0)) != null ? stack1 : "")
    + " house="
    + ((stack1 = alias2(alias1(depth0, "house", {"start":{"line":1,"column":47},"end":{"line":1,"column":52}} ), depth0)) != null ? stack1 : "")
    + " up="
    + ((stack1 = alias2(alias1(depth0, "up", {"start":{"line":1,"column":60},"end":{"line":1,"column":62}} ), depth0)) != null ? stack1 : "")
    + " forward="
    + ((stack1 = alias2(alias1(depth0, "forward", {"start":{"line":1,"column":75},"end":{"line":1,"column":82}} ), depth0)) != null ? stack1 : "")
    + " unit="
    + ((stack1 = alias2(alias1(depth0, "unit", {"start":{"line":1,"column":92},"end":{"line":1,"column":96}} ), depth0)) != null ? stack1 : "")
    + " recipe_hash="
    + ((stack1 = alias2(alias1(depth0, "recipe_hash", {"start":{"line":1,"column":113},"end":{"line":1,"column":124}} ), depth0)) != null ? stack1 : "")
    + " house_hash="
    + ((stack1 = alias2(alias1(depth0, "house_hash", {"start":{"line":1,"column":140},"end":{"line":1,"column":150}} ), depth0)) != null ? stack1 : "")
    + " compiler="
    + ((stack1 = alias2(alias1(depth0, "compiler", {"start":{"line":1,"column":164},"end":{"line":1,"column":172}} ), depth0)) != null ? stack1 : "")
    + "\n";
}}),
  "show": Handlebars.template({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda;

  return "show "
    + ((stack1 = alias2(alias1(depth0, "quotedName", {"start":{"line":1,"column":7},"end":{"line":1,"column":17}} ), depth0)) != null ? stack1 : "")
    + " shown="
    + ((stack1 = alias2(alias1(depth0, "shown", {"start":{"line":1,"column":28},"end":{"line":1,"column":33}} ), depth0)) != null ? stack1 : "")
    + " selectable="
    + ((stack1 = alias2(alias1(depth0, "selectable", {"start":{"line":1,"column":49},"end":{"line":1,"column":59}} ), depth0)) != null ? stack1 : "")
    + "\n";
}}),
  "solve": Handlebars.template({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda;

  return "solve "
    + ((stack1 = alias2(alias1(depth0, "quotedName", {"start":{"line":1,"column":8},"end":{"line":1,"column":18}} ), depth0)) != null ? stack1 : "")
    + " id="
    + ((stack1 = alias2(alias1(depth0, "id", {"start":{"line":1,"column":26},"end":{"line":1,"column":28}} ), depth0)) != null ? stack1 : "")
    + " kind="
    + ((stack1 = alias2(alias1(depth0, "kind", {"start":{"line":1,"column":38},"end":{"line":1,"column":42}} ), depth0)) != null ? stack1 : "")
    + " start="
    + ((stack1 = alias2(alias1(depth0, "start", {"start":{"line":1,"column":53},"end":{"line":1,"column":58}} ), depth0)) != null ? stack1 : "")
    + " mid="
    + ((stack1 = alias2(alias1(depth0, "mid", {"start":{"line":1,"column":67},"end":{"line":1,"column":70}} ), depth0)) != null ? stack1 : "")
    + " end="
    + ((stack1 = alias2(alias1(depth0, "end", {"start":{"line":1,"column":79},"end":{"line":1,"column":82}} ), depth0)) != null ? stack1 : "")
    + " goal="
    + ((stack1 = alias2(alias1(depth0, "goal", {"start":{"line":1,"column":92},"end":{"line":1,"column":96}} ), depth0)) != null ? stack1 : "")
    + " pole="
    + ((stack1 = alias2(alias1(depth0, "pole", {"start":{"line":1,"column":106},"end":{"line":1,"column":110}} ), depth0)) != null ? stack1 : "")
    + " blend="
    + ((stack1 = alias2(alias1(depth0, "blend", {"start":{"line":1,"column":121},"end":{"line":1,"column":126}} ), depth0)) != null ? stack1 : "")
    + "\n";
}}),
};
