// Made by bin/generate.ts from templates/slipway. Change those, not this.
import Handlebars from 'handlebars/runtime.js';

export const templates = {
  "aim": Handlebars.template({"0":function(container,depth0,helpers,partials,data) {
    var stack1;

  return " pole="
    + ((stack1 = container.lambda(container.strict(depth0, "pole", {"start":{"line":1,"column":78},"end":{"line":1,"column":82}} ), depth0)) != null ? stack1 : "");
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "aim "
    + ((stack1 = alias2(alias1(depth0, "quotedName", {"start":{"line":1,"column":6},"end":{"line":1,"column":16}} ), depth0)) != null ? stack1 : "")
    + " id="
    + ((stack1 = alias2(alias1(depth0, "id", {"start":{"line":1,"column":24},"end":{"line":1,"column":26}} ), depth0)) != null ? stack1 : "")
    + " joint="
    + ((stack1 = alias2(alias1(depth0, "joint", {"start":{"line":1,"column":37},"end":{"line":1,"column":42}} ), depth0)) != null ? stack1 : "")
    + " goal="
    + ((stack1 = alias2(alias1(depth0, "goal", {"start":{"line":1,"column":52},"end":{"line":1,"column":56}} ), depth0)) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"pole"),{"name":"if","hash":{},"fn":container.program(0, data, 0),"inverse":container.noop,"loc":{"start":{"line":1,"column":58},"end":{"line":1,"column":91}}})) != null ? stack1 : "")
    + " blend="
    + ((stack1 = alias2(alias1(depth0, "blend", {"start":{"line":1,"column":100},"end":{"line":1,"column":105}} ), depth0)) != null ? stack1 : "")
    + "\n";
}}),
  "attr": Handlebars.template({"0":function(container,depth0,helpers,partials,data) {
    var stack1;

  return " min="
    + ((stack1 = container.lambda(container.strict(depth0, "min", {"start":{"line":1,"column":71},"end":{"line":1,"column":74}} ), depth0)) != null ? stack1 : "");
},"1":function(container,depth0,helpers,partials,data) {
    var stack1;

  return " max="
    + ((stack1 = container.lambda(container.strict(depth0, "max", {"start":{"line":1,"column":101},"end":{"line":1,"column":104}} ), depth0)) != null ? stack1 : "");
},"2":function(container,depth0,helpers,partials,data) {
    var stack1;

  return " labels="
    + ((stack1 = container.lambda(container.strict(depth0, "labels", {"start":{"line":1,"column":137},"end":{"line":1,"column":143}} ), depth0)) != null ? stack1 : "");
},"3":function(container,depth0,helpers,partials,data) {
    var stack1;

  return " note="
    + ((stack1 = container.lambda(container.strict(depth0, "note", {"start":{"line":1,"column":172},"end":{"line":1,"column":176}} ), depth0)) != null ? stack1 : "");
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
    + ((stack1 = lookupProperty(helpers,"if").call(alias3,lookupProperty(depth0,"labels"),{"name":"if","hash":{},"fn":container.program(2, data, 0),"inverse":container.noop,"loc":{"start":{"line":1,"column":113},"end":{"line":1,"column":152}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias3,lookupProperty(depth0,"note"),{"name":"if","hash":{},"fn":container.program(3, data, 0),"inverse":container.noop,"loc":{"start":{"line":1,"column":152},"end":{"line":1,"column":185}}})) != null ? stack1 : "")
    + "\n";
}}),
  "constrain": Handlebars.template({"0":function(container,depth0,helpers,partials,data) {
    var stack1;

  return " blend="
    + ((stack1 = container.lambda(container.strict(depth0, "blend", {"start":{"line":1,"column":156},"end":{"line":1,"column":161}} ), depth0)) != null ? stack1 : "");
},"1":function(container,depth0,helpers,partials,data) {
    var stack1;

  return " axis="
    + ((stack1 = container.lambda(container.strict(depth0, "axis", {"start":{"line":1,"column":190},"end":{"line":1,"column":194}} ), depth0)) != null ? stack1 : "");
},"2":function(container,depth0,helpers,partials,data) {
    var stack1;

  return " up_axis="
    + ((stack1 = container.lambda(container.strict(depth0, "up_axis", {"start":{"line":1,"column":229},"end":{"line":1,"column":236}} ), depth0)) != null ? stack1 : "");
},"3":function(container,depth0,helpers,partials,data) {
    var stack1;

  return " up="
    + ((stack1 = container.lambda(container.strict(depth0, "up", {"start":{"line":1,"column":261},"end":{"line":1,"column":263}} ), depth0)) != null ? stack1 : "");
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda, alias3=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
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
    + ((stack1 = lookupProperty(helpers,"if").call(alias3,lookupProperty(depth0,"blend"),{"name":"if","hash":{},"fn":container.program(0, data, 0),"inverse":container.noop,"loc":{"start":{"line":1,"column":134},"end":{"line":1,"column":170}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias3,lookupProperty(depth0,"axis"),{"name":"if","hash":{},"fn":container.program(1, data, 0),"inverse":container.noop,"loc":{"start":{"line":1,"column":170},"end":{"line":1,"column":203}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias3,lookupProperty(depth0,"up_axis"),{"name":"if","hash":{},"fn":container.program(2, data, 0),"inverse":container.noop,"loc":{"start":{"line":1,"column":203},"end":{"line":1,"column":245}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias3,lookupProperty(depth0,"up"),{"name":"if","hash":{},"fn":container.program(3, data, 0),"inverse":container.noop,"loc":{"start":{"line":1,"column":245},"end":{"line":1,"column":272}}})) != null ? stack1 : "")
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
  "drive": Handlebars.template({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda;

  return "drive "
    + ((stack1 = alias2(alias1(depth0, "quotedName", {"start":{"line":1,"column":8},"end":{"line":1,"column":18}} ), depth0)) != null ? stack1 : "")
    + " id="
    + ((stack1 = alias2(alias1(depth0, "id", {"start":{"line":1,"column":26},"end":{"line":1,"column":28}} ), depth0)) != null ? stack1 : "")
    + " control="
    + ((stack1 = alias2(alias1(depth0, "control", {"start":{"line":1,"column":41},"end":{"line":1,"column":48}} ), depth0)) != null ? stack1 : "")
    + " input="
    + ((stack1 = alias2(alias1(depth0, "input", {"start":{"line":1,"column":59},"end":{"line":1,"column":64}} ), depth0)) != null ? stack1 : "")
    + " target="
    + ((stack1 = alias2(alias1(depth0, "target", {"start":{"line":1,"column":76},"end":{"line":1,"column":82}} ), depth0)) != null ? stack1 : "")
    + " channel="
    + ((stack1 = alias2(alias1(depth0, "channel", {"start":{"line":1,"column":95},"end":{"line":1,"column":102}} ), depth0)) != null ? stack1 : "")
    + " inputs="
    + ((stack1 = alias2(alias1(depth0, "inputs", {"start":{"line":1,"column":114},"end":{"line":1,"column":120}} ), depth0)) != null ? stack1 : "")
    + " outputs="
    + ((stack1 = alias2(alias1(depth0, "outputs", {"start":{"line":1,"column":133},"end":{"line":1,"column":140}} ), depth0)) != null ? stack1 : "")
    + " curve="
    + ((stack1 = alias2(alias1(depth0, "curve", {"start":{"line":1,"column":151},"end":{"line":1,"column":156}} ), depth0)) != null ? stack1 : "")
    + " beyond="
    + ((stack1 = alias2(alias1(depth0, "beyond", {"start":{"line":1,"column":168},"end":{"line":1,"column":174}} ), depth0)) != null ? stack1 : "")
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
  "foot_roll": Handlebars.template({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda;

  return "foot_roll "
    + ((stack1 = alias2(alias1(depth0, "quotedName", {"start":{"line":1,"column":12},"end":{"line":1,"column":22}} ), depth0)) != null ? stack1 : "")
    + " id="
    + ((stack1 = alias2(alias1(depth0, "id", {"start":{"line":1,"column":30},"end":{"line":1,"column":32}} ), depth0)) != null ? stack1 : "")
    + " foot="
    + ((stack1 = alias2(alias1(depth0, "foot", {"start":{"line":1,"column":42},"end":{"line":1,"column":46}} ), depth0)) != null ? stack1 : "")
    + " ankle="
    + ((stack1 = alias2(alias1(depth0, "ankle", {"start":{"line":1,"column":57},"end":{"line":1,"column":62}} ), depth0)) != null ? stack1 : "")
    + " toes="
    + ((stack1 = alias2(alias1(depth0, "toes", {"start":{"line":1,"column":72},"end":{"line":1,"column":76}} ), depth0)) != null ? stack1 : "")
    + " heel="
    + ((stack1 = alias2(alias1(depth0, "heel", {"start":{"line":1,"column":86},"end":{"line":1,"column":90}} ), depth0)) != null ? stack1 : "")
    + " ball="
    + ((stack1 = alias2(alias1(depth0, "ball", {"start":{"line":1,"column":100},"end":{"line":1,"column":104}} ), depth0)) != null ? stack1 : "")
    + " toe="
    + ((stack1 = alias2(alias1(depth0, "toe", {"start":{"line":1,"column":113},"end":{"line":1,"column":116}} ), depth0)) != null ? stack1 : "")
    + " inner="
    + ((stack1 = alias2(alias1(depth0, "inner", {"start":{"line":1,"column":127},"end":{"line":1,"column":132}} ), depth0)) != null ? stack1 : "")
    + " outer="
    + ((stack1 = alias2(alias1(depth0, "outer", {"start":{"line":1,"column":143},"end":{"line":1,"column":148}} ), depth0)) != null ? stack1 : "")
    + " hinge="
    + ((stack1 = alias2(alias1(depth0, "hinge", {"start":{"line":1,"column":159},"end":{"line":1,"column":164}} ), depth0)) != null ? stack1 : "")
    + " forward="
    + ((stack1 = alias2(alias1(depth0, "forward", {"start":{"line":1,"column":177},"end":{"line":1,"column":184}} ), depth0)) != null ? stack1 : "")
    + " roll="
    + ((stack1 = alias2(alias1(depth0, "roll", {"start":{"line":1,"column":194},"end":{"line":1,"column":198}} ), depth0)) != null ? stack1 : "")
    + " bank="
    + ((stack1 = alias2(alias1(depth0, "bank", {"start":{"line":1,"column":208},"end":{"line":1,"column":212}} ), depth0)) != null ? stack1 : "")
    + " break="
    + ((stack1 = alias2(alias1(depth0, "break", {"start":{"line":1,"column":223},"end":{"line":1,"column":228}} ), depth0)) != null ? stack1 : "")
    + "\n";
}}),
  "geometry": Handlebars.template({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda;

  return "geometry "
    + ((stack1 = alias2(alias1(depth0, "quotedName", {"start":{"line":1,"column":11},"end":{"line":1,"column":21}} ), depth0)) != null ? stack1 : "")
    + " id="
    + ((stack1 = alias2(alias1(depth0, "id", {"start":{"line":1,"column":29},"end":{"line":1,"column":31}} ), depth0)) != null ? stack1 : "")
    + " parent="
    + ((stack1 = alias2(alias1(depth0, "parent", {"start":{"line":1,"column":43},"end":{"line":1,"column":49}} ), depth0)) != null ? stack1 : "")
    + " container="
    + ((stack1 = alias2(alias1(depth0, "container", {"start":{"line":1,"column":64},"end":{"line":1,"column":73}} ), depth0)) != null ? stack1 : "")
    + " role="
    + ((stack1 = alias2(alias1(depth0, "role", {"start":{"line":1,"column":83},"end":{"line":1,"column":87}} ), depth0)) != null ? stack1 : "")
    + " side="
    + ((stack1 = alias2(alias1(depth0, "side", {"start":{"line":1,"column":97},"end":{"line":1,"column":101}} ), depth0)) != null ? stack1 : "")
    + " at="
    + ((stack1 = alias2(alias1(depth0, "at", {"start":{"line":1,"column":109},"end":{"line":1,"column":111}} ), depth0)) != null ? stack1 : "")
    + " turn="
    + ((stack1 = alias2(alias1(depth0, "turn", {"start":{"line":1,"column":121},"end":{"line":1,"column":125}} ), depth0)) != null ? stack1 : "")
    + " mesh="
    + ((stack1 = alias2(alias1(depth0, "mesh", {"start":{"line":1,"column":135},"end":{"line":1,"column":139}} ), depth0)) != null ? stack1 : "")
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
  "reach": Handlebars.template({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda;

  return "reach "
    + ((stack1 = alias2(alias1(depth0, "quotedName", {"start":{"line":1,"column":8},"end":{"line":1,"column":18}} ), depth0)) != null ? stack1 : "")
    + " id="
    + ((stack1 = alias2(alias1(depth0, "id", {"start":{"line":1,"column":26},"end":{"line":1,"column":28}} ), depth0)) != null ? stack1 : "")
    + " joints="
    + ((stack1 = alias2(alias1(depth0, "joints", {"start":{"line":1,"column":40},"end":{"line":1,"column":46}} ), depth0)) != null ? stack1 : "")
    + " goal="
    + ((stack1 = alias2(alias1(depth0, "goal", {"start":{"line":1,"column":56},"end":{"line":1,"column":60}} ), depth0)) != null ? stack1 : "")
    + " pole="
    + ((stack1 = alias2(alias1(depth0, "pole", {"start":{"line":1,"column":70},"end":{"line":1,"column":74}} ), depth0)) != null ? stack1 : "")
    + " blend="
    + ((stack1 = alias2(alias1(depth0, "blend", {"start":{"line":1,"column":85},"end":{"line":1,"column":90}} ), depth0)) != null ? stack1 : "")
    + " stretch="
    + ((stack1 = alias2(alias1(depth0, "stretch", {"start":{"line":1,"column":103},"end":{"line":1,"column":110}} ), depth0)) != null ? stack1 : "")
    + " stretch_limit="
    + ((stack1 = alias2(alias1(depth0, "stretch_limit", {"start":{"line":1,"column":129},"end":{"line":1,"column":142}} ), depth0)) != null ? stack1 : "")
    + " soft="
    + ((stack1 = alias2(alias1(depth0, "soft", {"start":{"line":1,"column":152},"end":{"line":1,"column":156}} ), depth0)) != null ? stack1 : "")
    + " swing="
    + ((stack1 = alias2(alias1(depth0, "swing", {"start":{"line":1,"column":167},"end":{"line":1,"column":172}} ), depth0)) != null ? stack1 : "")
    + " bias="
    + ((stack1 = alias2(alias1(depth0, "bias", {"start":{"line":1,"column":182},"end":{"line":1,"column":186}} ), depth0)) != null ? stack1 : "")
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
  "shape": Handlebars.template({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda;

  return "shape "
    + ((stack1 = alias2(alias1(depth0, "quotedName", {"start":{"line":1,"column":8},"end":{"line":1,"column":18}} ), depth0)) != null ? stack1 : "")
    + " id="
    + ((stack1 = alias2(alias1(depth0, "id", {"start":{"line":1,"column":26},"end":{"line":1,"column":28}} ), depth0)) != null ? stack1 : "")
    + " geometry="
    + ((stack1 = alias2(alias1(depth0, "geometry", {"start":{"line":1,"column":42},"end":{"line":1,"column":50}} ), depth0)) != null ? stack1 : "")
    + " morph="
    + ((stack1 = alias2(alias1(depth0, "morph", {"start":{"line":1,"column":61},"end":{"line":1,"column":66}} ), depth0)) != null ? stack1 : "")
    + " weight="
    + ((stack1 = alias2(alias1(depth0, "weight", {"start":{"line":1,"column":78},"end":{"line":1,"column":84}} ), depth0)) != null ? stack1 : "")
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
  "skin": Handlebars.template({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda;

  return "skin "
    + ((stack1 = alias2(alias1(depth0, "quotedName", {"start":{"line":1,"column":7},"end":{"line":1,"column":17}} ), depth0)) != null ? stack1 : "")
    + " id="
    + ((stack1 = alias2(alias1(depth0, "id", {"start":{"line":1,"column":25},"end":{"line":1,"column":27}} ), depth0)) != null ? stack1 : "")
    + " geometry="
    + ((stack1 = alias2(alias1(depth0, "geometry", {"start":{"line":1,"column":41},"end":{"line":1,"column":49}} ), depth0)) != null ? stack1 : "")
    + " joints="
    + ((stack1 = alias2(alias1(depth0, "joints", {"start":{"line":1,"column":61},"end":{"line":1,"column":67}} ), depth0)) != null ? stack1 : "")
    + " influences="
    + ((stack1 = alias2(alias1(depth0, "influences", {"start":{"line":1,"column":83},"end":{"line":1,"column":93}} ), depth0)) != null ? stack1 : "")
    + "\n";
}}),
  "space": Handlebars.template({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda;

  return "space "
    + ((stack1 = alias2(alias1(depth0, "quotedName", {"start":{"line":1,"column":8},"end":{"line":1,"column":18}} ), depth0)) != null ? stack1 : "")
    + " id="
    + ((stack1 = alias2(alias1(depth0, "id", {"start":{"line":1,"column":26},"end":{"line":1,"column":28}} ), depth0)) != null ? stack1 : "")
    + " control="
    + ((stack1 = alias2(alias1(depth0, "control", {"start":{"line":1,"column":41},"end":{"line":1,"column":48}} ), depth0)) != null ? stack1 : "")
    + " attribute="
    + ((stack1 = alias2(alias1(depth0, "attribute", {"start":{"line":1,"column":63},"end":{"line":1,"column":72}} ), depth0)) != null ? stack1 : "")
    + " sources="
    + ((stack1 = alias2(alias1(depth0, "sources", {"start":{"line":1,"column":85},"end":{"line":1,"column":92}} ), depth0)) != null ? stack1 : "")
    + " follow="
    + ((stack1 = alias2(alias1(depth0, "follow", {"start":{"line":1,"column":104},"end":{"line":1,"column":110}} ), depth0)) != null ? stack1 : "")
    + "\n";
}}),
  "spline": Handlebars.template({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda;

  return "spline "
    + ((stack1 = alias2(alias1(depth0, "quotedName", {"start":{"line":1,"column":9},"end":{"line":1,"column":19}} ), depth0)) != null ? stack1 : "")
    + " id="
    + ((stack1 = alias2(alias1(depth0, "id", {"start":{"line":1,"column":27},"end":{"line":1,"column":29}} ), depth0)) != null ? stack1 : "")
    + " joints="
    + ((stack1 = alias2(alias1(depth0, "joints", {"start":{"line":1,"column":41},"end":{"line":1,"column":47}} ), depth0)) != null ? stack1 : "")
    + " controls="
    + ((stack1 = alias2(alias1(depth0, "controls", {"start":{"line":1,"column":61},"end":{"line":1,"column":69}} ), depth0)) != null ? stack1 : "")
    + " stretch="
    + ((stack1 = alias2(alias1(depth0, "stretch", {"start":{"line":1,"column":82},"end":{"line":1,"column":89}} ), depth0)) != null ? stack1 : "")
    + " volume="
    + ((stack1 = alias2(alias1(depth0, "volume", {"start":{"line":1,"column":101},"end":{"line":1,"column":107}} ), depth0)) != null ? stack1 : "")
    + "\n";
}}),
  "twist": Handlebars.template({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda;

  return "twist "
    + ((stack1 = alias2(alias1(depth0, "quotedName", {"start":{"line":1,"column":8},"end":{"line":1,"column":18}} ), depth0)) != null ? stack1 : "")
    + " id="
    + ((stack1 = alias2(alias1(depth0, "id", {"start":{"line":1,"column":26},"end":{"line":1,"column":28}} ), depth0)) != null ? stack1 : "")
    + " joints="
    + ((stack1 = alias2(alias1(depth0, "joints", {"start":{"line":1,"column":40},"end":{"line":1,"column":46}} ), depth0)) != null ? stack1 : "")
    + " shares="
    + ((stack1 = alias2(alias1(depth0, "shares", {"start":{"line":1,"column":58},"end":{"line":1,"column":64}} ), depth0)) != null ? stack1 : "")
    + " bone="
    + ((stack1 = alias2(alias1(depth0, "bone", {"start":{"line":1,"column":74},"end":{"line":1,"column":78}} ), depth0)) != null ? stack1 : "")
    + " tip="
    + ((stack1 = alias2(alias1(depth0, "tip", {"start":{"line":1,"column":87},"end":{"line":1,"column":90}} ), depth0)) != null ? stack1 : "")
    + " base="
    + ((stack1 = alias2(alias1(depth0, "base", {"start":{"line":1,"column":100},"end":{"line":1,"column":104}} ), depth0)) != null ? stack1 : "")
    + " driver="
    + ((stack1 = alias2(alias1(depth0, "driver", {"start":{"line":1,"column":116},"end":{"line":1,"column":122}} ), depth0)) != null ? stack1 : "")
    + "\n";
}}),
  "two_bone": Handlebars.template({"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda;

  return "two_bone "
    + ((stack1 = alias2(alias1(depth0, "quotedName", {"start":{"line":1,"column":11},"end":{"line":1,"column":21}} ), depth0)) != null ? stack1 : "")
    + " id="
    + ((stack1 = alias2(alias1(depth0, "id", {"start":{"line":1,"column":29},"end":{"line":1,"column":31}} ), depth0)) != null ? stack1 : "")
    + " start="
    + ((stack1 = alias2(alias1(depth0, "start", {"start":{"line":1,"column":42},"end":{"line":1,"column":47}} ), depth0)) != null ? stack1 : "")
    + " mid="
    + ((stack1 = alias2(alias1(depth0, "mid", {"start":{"line":1,"column":56},"end":{"line":1,"column":59}} ), depth0)) != null ? stack1 : "")
    + " end="
    + ((stack1 = alias2(alias1(depth0, "end", {"start":{"line":1,"column":68},"end":{"line":1,"column":71}} ), depth0)) != null ? stack1 : "")
    + " goal="
    + ((stack1 = alias2(alias1(depth0, "goal", {"start":{"line":1,"column":81},"end":{"line":1,"column":85}} ), depth0)) != null ? stack1 : "")
    + " pole="
    + ((stack1 = alias2(alias1(depth0, "pole", {"start":{"line":1,"column":95},"end":{"line":1,"column":99}} ), depth0)) != null ? stack1 : "")
    + " blend="
    + ((stack1 = alias2(alias1(depth0, "blend", {"start":{"line":1,"column":110},"end":{"line":1,"column":115}} ), depth0)) != null ? stack1 : "")
    + " stretch="
    + ((stack1 = alias2(alias1(depth0, "stretch", {"start":{"line":1,"column":128},"end":{"line":1,"column":135}} ), depth0)) != null ? stack1 : "")
    + " stretch_limit="
    + ((stack1 = alias2(alias1(depth0, "stretch_limit", {"start":{"line":1,"column":154},"end":{"line":1,"column":167}} ), depth0)) != null ? stack1 : "")
    + " soft="
    + ((stack1 = alias2(alias1(depth0, "soft", {"start":{"line":1,"column":177},"end":{"line":1,"column":181}} ), depth0)) != null ? stack1 : "")
    + " swing="
    + ((stack1 = alias2(alias1(depth0, "swing", {"start":{"line":1,"column":192},"end":{"line":1,"column":197}} ), depth0)) != null ? stack1 : "")
    + "\n";
}}),
};
