// Made from templates/ by scripts/templates.ts; do not edit.
export const TEMPLATES_VERSION = '21d08a82d082';
export const notes = {
  "operative-note": {"0":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(alias1,"operation",{"name":"statement","hash":{},"fn":container.program(1, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":2,"column":0},"end":{"line":2,"column":211}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"when",{"name":"statement","hash":{},"fn":container.program(5, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":3,"column":0},"end":{"line":3,"column":276}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"changed",{"name":"statement","hash":{},"fn":container.program(10, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":4,"column":0},"end":{"line":4,"column":123}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"sides",{"name":"statement","hash":{},"fn":container.program(12, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":5,"column":0},"end":{"line":5,"column":276}}})) != null ? stack1 : "")
    + "\n";
},"1":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"performed") : stack1),{"name":"if","hash":{},"fn":container.program(2, data, 0),"inverse":container.program(3, data, 0),"data":data,"loc":{"start":{"line":2,"column":26},"end":{"line":2,"column":197}}})) != null ? stack1 : "");
},"2":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.lambda(((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"eye") : stack1), depth0)) != null ? stack1 : "")
    + " "
    + ((stack1 = lookupProperty(helpers,"labels").call(depth0 != null ? depth0 : (container.nullContext || {}),"who.performed",((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"performed") : stack1),{"name":"labels","hash":{},"data":data,"loc":{"start":{"line":2,"column":59},"end":{"line":2,"column":99}}})) != null ? stack1 : "");
},"3":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"planned") : stack1),{"name":"if","hash":{},"fn":container.program(4, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":2,"column":107},"end":{"line":2,"column":190}}})) != null ? stack1 : "");
},"4":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "planned: "
    + ((stack1 = container.lambda(((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"eye") : stack1), depth0)) != null ? stack1 : "")
    + " "
    + ((stack1 = lookupProperty(helpers,"labels").call(depth0 != null ? depth0 : (container.nullContext || {}),"who.planned",((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"planned") : stack1),{"name":"labels","hash":{},"data":data,"loc":{"start":{"line":2,"column":147},"end":{"line":2,"column":183}}})) != null ? stack1 : "");
},"5":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"startedAt") : stack1),{"name":"if","hash":{},"fn":container.program(6, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":3,"column":21},"end":{"line":3,"column":262}}})) != null ? stack1 : "");
},"6":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "operated on "
    + ((stack1 = lookupProperty(helpers,"date").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"startedAt") : stack1),{"name":"date","hash":{},"data":data,"loc":{"start":{"line":3,"column":54},"end":{"line":3,"column":76}}})) != null ? stack1 : "")
    + ", from "
    + ((stack1 = lookupProperty(helpers,"time").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"startedAt") : stack1),{"name":"time","hash":{},"data":data,"loc":{"start":{"line":3,"column":83},"end":{"line":3,"column":105}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"endedAt") : stack1),{"name":"if","hash":{},"fn":container.program(7, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":3,"column":105},"end":{"line":3,"column":155}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"urgency") : stack1),{"name":"if","hash":{},"fn":container.program(8, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":3,"column":155},"end":{"line":3,"column":209}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"theatre") : stack1),{"name":"if","hash":{},"fn":container.program(9, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":3,"column":209},"end":{"line":3,"column":255}}})) != null ? stack1 : "");
},"7":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " to "
    + ((stack1 = lookupProperty(helpers,"time").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"endedAt") : stack1),{"name":"time","hash":{},"data":data,"loc":{"start":{"line":3,"column":128},"end":{"line":3,"column":148}}})) != null ? stack1 : "");
},"8":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", as "
    + ((stack1 = lookupProperty(helpers,"an").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"urgency") : stack1),{"name":"an","hash":{},"data":data,"loc":{"start":{"line":3,"column":179},"end":{"line":3,"column":197}}})) != null ? stack1 : "")
    + " case";
},"9":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", in "
    + ((stack1 = container.lambda(((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"theatre") : stack1), depth0)) != null ? stack1 : "");
},"10":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"whyChanged") : stack1),{"name":"if","hash":{},"fn":container.program(11, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":4,"column":24},"end":{"line":4,"column":109}}})) != null ? stack1 : "");
},"11":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "the operation differed from the plan: "
    + ((stack1 = container.lambda(((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"whyChanged") : stack1), depth0)) != null ? stack1 : "");
},"12":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"all").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"eye") : stack1),((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"consentEye") : stack1),((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"markedEye") : stack1),((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"timeOutEye") : stack1),{"name":"all","hash":{},"data":data,"loc":{"start":{"line":5,"column":28},"end":{"line":5,"column":85}}}),{"name":"if","hash":{},"fn":container.program(13, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":5,"column":22},"end":{"line":5,"column":262}}})) != null ? stack1 : "");
},"13":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.lambda, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "the "
    + ((stack1 = alias1(((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"eye") : stack1), depth0)) != null ? stack1 : "")
    + " eye was confirmed: consent "
    + ((stack1 = alias1(((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"consentEye") : stack1), depth0)) != null ? stack1 : "")
    + ", mark "
    + ((stack1 = alias1(((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"markedEye") : stack1), depth0)) != null ? stack1 : "")
    + ", time-out "
    + ((stack1 = alias1(((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"timeOutEye") : stack1), depth0)) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"timeOutAt") : stack1),{"name":"if","hash":{},"fn":container.program(14, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":5,"column":201},"end":{"line":5,"column":255}}})) != null ? stack1 : "");
},"14":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " at "
    + ((stack1 = lookupProperty(helpers,"time").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"timeOutAt") : stack1),{"name":"time","hash":{},"data":data,"loc":{"start":{"line":5,"column":226},"end":{"line":5,"column":248}}})) != null ? stack1 : "");
},"15":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(alias1,"surgeon",{"name":"statement","hash":{},"fn":container.program(16, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":8,"column":0},"end":{"line":8,"column":157}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"supervisor",{"name":"statement","hash":{},"fn":container.program(19, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":9,"column":0},"end":{"line":9,"column":160}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"assistants") : stack1),"none",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":10,"column":6},"end":{"line":10,"column":32}}}),{"name":"if","hash":{},"fn":container.program(22, data, 0),"inverse":container.program(25, data, 0),"data":data,"loc":{"start":{"line":10,"column":0},"end":{"line":10,"column":339}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"anaesthetist",{"name":"statement","hash":{},"fn":container.program(31, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":11,"column":0},"end":{"line":11,"column":184}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"scrub-nurse",{"name":"statement","hash":{},"fn":container.program(35, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":12,"column":0},"end":{"line":12,"column":102}}})) != null ? stack1 : "")
    + "\n";
},"16":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"surgeon") : stack1)) != null ? lookupProperty(stack1,"name") : stack1),{"name":"if","hash":{},"fn":container.program(17, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":8,"column":24},"end":{"line":8,"column":143}}})) != null ? stack1 : "");
},"17":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "surgeon: "
    + ((stack1 = container.lambda(((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"surgeon") : stack1)) != null ? lookupProperty(stack1,"name") : stack1), depth0)) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"surgeon") : stack1)) != null ? lookupProperty(stack1,"role") : stack1),{"name":"if","hash":{},"fn":container.program(18, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":8,"column":77},"end":{"line":8,"column":136}}})) != null ? stack1 : "");
},"18":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", "
    + ((stack1 = lookupProperty(helpers,"lower").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"surgeon") : stack1)) != null ? lookupProperty(stack1,"role") : stack1),{"name":"lower","hash":{},"data":data,"loc":{"start":{"line":8,"column":103},"end":{"line":8,"column":129}}})) != null ? stack1 : "");
},"19":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"supervisor") : stack1)) != null ? lookupProperty(stack1,"name") : stack1),{"name":"if","hash":{},"fn":container.program(20, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":9,"column":27},"end":{"line":9,"column":146}}})) != null ? stack1 : "");
},"20":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "supervised by "
    + ((stack1 = container.lambda(((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"supervisor") : stack1)) != null ? lookupProperty(stack1,"name") : stack1), depth0)) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"supervisor") : stack1)) != null ? lookupProperty(stack1,"scrubbed") : stack1),{"name":"if","hash":{},"fn":container.program(21, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":9,"column":91},"end":{"line":9,"column":139}}})) != null ? stack1 : "");
},"21":function(container,depth0,helpers,partials,data) {
    return ", scrubbed";
},"22":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(depth0 != null ? depth0 : (container.nullContext || {}),"no-assistant",{"name":"statement","hash":{},"fn":container.program(23, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":10,"column":34},"end":{"line":10,"column":140}}})) != null ? stack1 : "");
},"23":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"assistants") : stack1),"none",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":10,"column":69},"end":{"line":10,"column":95}}}),{"name":"if","hash":{},"fn":container.program(24, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":10,"column":63},"end":{"line":10,"column":126}}})) != null ? stack1 : "");
},"24":function(container,depth0,helpers,partials,data) {
    return "there was no assistant";
},"25":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"assistants") : stack1),{"name":"each","hash":{},"fn":container.program(26, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":10,"column":148},"end":{"line":10,"column":332}}})) != null ? stack1 : "");
},"26":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(depth0 != null ? depth0 : (container.nullContext || {}),"assistant",(data && lookupProperty(data,"index")),{"name":"statement","hash":{},"fn":container.program(27, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":10,"column":172},"end":{"line":10,"column":323}}})) != null ? stack1 : "");
},"27":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"name") : depth0),{"name":"if","hash":{},"fn":container.program(28, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":10,"column":205},"end":{"line":10,"column":309}}})) != null ? stack1 : "");
},"28":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "assistant: "
    + ((stack1 = container.lambda((depth0 != null ? lookupProperty(depth0,"name") : depth0), depth0)) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"role") : depth0),{"name":"if","hash":{},"fn":container.program(29, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":10,"column":236},"end":{"line":10,"column":271}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"did") : depth0),{"name":"if","hash":{},"fn":container.program(30, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":10,"column":271},"end":{"line":10,"column":302}}})) != null ? stack1 : "");
},"29":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", "
    + ((stack1 = lookupProperty(helpers,"lower").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"role") : depth0),{"name":"lower","hash":{},"data":data,"loc":{"start":{"line":10,"column":250},"end":{"line":10,"column":264}}})) != null ? stack1 : "");
},"30":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", who "
    + ((stack1 = container.lambda((depth0 != null ? lookupProperty(depth0,"did") : depth0), depth0)) != null ? stack1 : "");
},"31":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"anaesthetist") : stack1),"none",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":11,"column":35},"end":{"line":11,"column":63}}}),{"name":"if","hash":{},"fn":container.program(32, data, 0),"inverse":container.program(33, data, 0),"data":data,"loc":{"start":{"line":11,"column":29},"end":{"line":11,"column":170}}})) != null ? stack1 : "");
},"32":function(container,depth0,helpers,partials,data) {
    return "there was no anaesthetist";
},"33":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"anaesthetist") : stack1),{"name":"if","hash":{},"fn":container.program(34, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":11,"column":98},"end":{"line":11,"column":163}}})) != null ? stack1 : "");
},"34":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "anaesthetist: "
    + ((stack1 = container.lambda(((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"anaesthetist") : stack1), depth0)) != null ? stack1 : "");
},"35":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"scrubNurse") : stack1),{"name":"if","hash":{},"fn":container.program(36, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":12,"column":28},"end":{"line":12,"column":88}}})) != null ? stack1 : "");
},"36":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "scrub nurse: "
    + ((stack1 = container.lambda(((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"scrubNurse") : stack1), depth0)) != null ? stack1 : "");
},"37":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(alias1,"preoperative",{"name":"statement","hash":{},"fn":container.program(38, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":15,"column":0},"end":{"line":15,"column":348}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"postoperative",{"name":"statement","hash":{},"fn":container.program(43, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":16,"column":0},"end":{"line":16,"column":274}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"indication",{"name":"statement","hash":{},"fn":container.program(47, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":17,"column":0},"end":{"line":17,"column":106}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"symptoms",{"name":"statement","hash":{},"fn":container.program(49, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":18,"column":0},"end":{"line":18,"column":118}}})) != null ? stack1 : "")
    + "\n";
},"38":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"diagnosis") : stack1),{"name":"if","hash":{},"fn":container.program(39, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":15,"column":29},"end":{"line":15,"column":334}}})) != null ? stack1 : "");
},"39":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "preoperative diagnosis: "
    + ((stack1 = container.lambda(((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"eye") : stack1), depth0)) != null ? stack1 : "")
    + " "
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"recurrent") : stack1),{"name":"if","hash":{},"fn":container.program(40, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":15,"column":89},"end":{"line":15,"column":130}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"label").call(alias1,"before.diagnosis",((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"diagnosis") : stack1),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":15,"column":130},"end":{"line":15,"column":175}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"macula") : stack1),{"name":"if","hash":{},"fn":container.program(41, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":15,"column":175},"end":{"line":15,"column":327}}})) != null ? stack1 : "");
},"40":function(container,depth0,helpers,partials,data) {
    return "recurrent ";
},"41":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", macula "
    + ((stack1 = container.lambda(((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"macula") : stack1), depth0)) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"moreThan").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"maculaOffDays") : stack1),0,{"name":"moreThan","hash":{},"data":data,"loc":{"start":{"line":15,"column":228},"end":{"line":15,"column":261}}}),{"name":"if","hash":{},"fn":container.program(42, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":15,"column":222},"end":{"line":15,"column":320}}})) != null ? stack1 : "");
},"42":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " for "
    + ((stack1 = lookupProperty(helpers,"countOf").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"maculaOffDays") : stack1),"day","days",{"name":"countOf","hash":{},"data":data,"loc":{"start":{"line":15,"column":268},"end":{"line":15,"column":313}}})) != null ? stack1 : "");
},"43":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"postoperativeDiagnosis") : stack1),{"name":"if","hash":{},"fn":container.program(44, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":16,"column":30},"end":{"line":16,"column":260}}})) != null ? stack1 : "");
},"44":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "postoperative diagnosis: "
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"postoperativeDiagnosis") : stack1),((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"diagnosis") : stack1),{"name":"is","hash":{},"data":data,"loc":{"start":{"line":16,"column":101},"end":{"line":16,"column":155}}}),{"name":"if","hash":{},"fn":container.program(45, data, 0),"inverse":container.program(46, data, 0),"data":data,"loc":{"start":{"line":16,"column":95},"end":{"line":16,"column":253}}})) != null ? stack1 : "");
},"45":function(container,depth0,helpers,partials,data) {
    return "the same";
},"46":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.lambda(((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"eye") : stack1), depth0)) != null ? stack1 : "")
    + " "
    + ((stack1 = lookupProperty(helpers,"label").call(depth0 != null ? depth0 : (container.nullContext || {}),"before.diagnosis",((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"postoperativeDiagnosis") : stack1),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":16,"column":185},"end":{"line":16,"column":246}}})) != null ? stack1 : "");
},"47":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"indication") : stack1),{"name":"if","hash":{},"fn":container.program(48, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":17,"column":27},"end":{"line":17,"column":92}}})) != null ? stack1 : "");
},"48":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "indication: "
    + ((stack1 = container.lambda(((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"indication") : stack1), depth0)) != null ? stack1 : "");
},"49":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"symptomsSince") : stack1),{"name":"if","hash":{},"fn":container.program(50, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":18,"column":25},"end":{"line":18,"column":104}}})) != null ? stack1 : "");
},"50":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "symptoms since "
    + ((stack1 = lookupProperty(helpers,"date").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"symptomsSince") : stack1),{"name":"date","hash":{},"data":data,"loc":{"start":{"line":18,"column":68},"end":{"line":18,"column":97}}})) != null ? stack1 : "");
},"51":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(alias1,"kind",{"name":"statement","hash":{},"fn":container.program(52, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":21,"column":0},"end":{"line":21,"column":356}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"anaesthesia") : depth0)) != null ? lookupProperty(stack1,"agents") : stack1),{"name":"each","hash":{},"fn":container.program(58, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":22,"column":0},"end":{"line":22,"column":240}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"nitrous-oxide",{"name":"statement","hash":{},"fn":container.program(63, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":23,"column":0},"end":{"line":23,"column":371}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"antisepsis",{"name":"statement","hash":{},"fn":container.program(69, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":24,"column":0},"end":{"line":24,"column":176}}})) != null ? stack1 : "")
    + "\n";
},"52":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"anaesthesia") : depth0)) != null ? lookupProperty(stack1,"kind") : stack1),{"name":"if","hash":{},"fn":container.program(53, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":21,"column":21},"end":{"line":21,"column":342}}})) != null ? stack1 : "");
},"53":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"anaesthesia") : depth0)) != null ? lookupProperty(stack1,"kind") : stack1),"general",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":21,"column":51},"end":{"line":21,"column":82}}}),{"name":"if","hash":{},"fn":container.program(54, data, 0),"inverse":container.program(55, data, 0),"data":data,"loc":{"start":{"line":21,"column":45},"end":{"line":21,"column":286}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"anaesthesia") : depth0)) != null ? lookupProperty(stack1,"sedation") : stack1),{"name":"if","hash":{},"fn":container.program(57, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":21,"column":286},"end":{"line":21,"column":335}}})) != null ? stack1 : "");
},"54":function(container,depth0,helpers,partials,data) {
    return "general anaesthesia";
},"55":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"label").call(alias1,"anaesthesia.kind",((stack1 = (depth0 != null ? lookupProperty(depth0,"anaesthesia") : depth0)) != null ? lookupProperty(stack1,"kind") : stack1),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":21,"column":111},"end":{"line":21,"column":156}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"any").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"anaesthesia") : depth0)) != null ? lookupProperty(stack1,"blockEye") : stack1),"right",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":21,"column":167},"end":{"line":21,"column":200}}}),lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"anaesthesia") : depth0)) != null ? lookupProperty(stack1,"blockEye") : stack1),"left",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":21,"column":201},"end":{"line":21,"column":233}}}),{"name":"any","hash":{},"data":data,"loc":{"start":{"line":21,"column":162},"end":{"line":21,"column":234}}}),{"name":"if","hash":{},"fn":container.program(56, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":21,"column":156},"end":{"line":21,"column":279}}})) != null ? stack1 : "");
},"56":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " to the "
    + ((stack1 = container.lambda(((stack1 = (depth0 != null ? lookupProperty(depth0,"anaesthesia") : depth0)) != null ? lookupProperty(stack1,"blockEye") : stack1), depth0)) != null ? stack1 : "")
    + " eye";
},"57":function(container,depth0,helpers,partials,data) {
    return " with sedation";
},"58":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(depth0 != null ? depth0 : (container.nullContext || {}),"agent",(data && lookupProperty(data,"index")),{"name":"statement","hash":{},"fn":container.program(59, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":22,"column":28},"end":{"line":22,"column":231}}})) != null ? stack1 : "");
},"59":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"drug") : depth0),{"name":"if","hash":{},"fn":container.program(60, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":22,"column":57},"end":{"line":22,"column":217}}})) != null ? stack1 : "");
},"60":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"volumeMl") : depth0),{"name":"if","hash":{},"fn":container.program(61, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":22,"column":69},"end":{"line":22,"column":118}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"concentrationPercent") : depth0),{"name":"if","hash":{},"fn":container.program(62, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":22,"column":118},"end":{"line":22,"column":186}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"lower").call(alias1,(depth0 != null ? lookupProperty(depth0,"drug") : depth0),{"name":"lower","hash":{},"data":data,"loc":{"start":{"line":22,"column":186},"end":{"line":22,"column":200}}})) != null ? stack1 : "")
    + " was given";
},"61":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"number").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"volumeMl") : depth0),{"name":"number","hash":{},"data":data,"loc":{"start":{"line":22,"column":85},"end":{"line":22,"column":104}}})) != null ? stack1 : "")
    + " mL of ";
},"62":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"number").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"concentrationPercent") : depth0),{"name":"number","hash":{},"data":data,"loc":{"start":{"line":22,"column":146},"end":{"line":22,"column":177}}})) != null ? stack1 : "")
    + "% ";
},"63":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"anaesthesia") : depth0)) != null ? lookupProperty(stack1,"nitrousOxideUsed") : stack1),{"name":"if","hash":{},"fn":container.program(64, data, 0),"inverse":container.program(67, data, 0),"data":data,"loc":{"start":{"line":23,"column":30},"end":{"line":23,"column":357}}})) != null ? stack1 : "");
},"64":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "nitrous oxide was used"
    + ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"anaesthesia") : depth0)) != null ? lookupProperty(stack1,"nitrousOxideStoppedAt") : stack1),{"name":"if","hash":{},"fn":container.program(65, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":23,"column":88},"end":{"line":23,"column":267}}})) != null ? stack1 : "");
},"65":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"isNot").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"anaesthesia") : depth0)) != null ? lookupProperty(stack1,"nitrousOxideStoppedAt") : stack1),"not-applicable",{"name":"isNot","hash":{},"data":data,"loc":{"start":{"line":23,"column":135},"end":{"line":23,"column":193}}}),{"name":"if","hash":{},"fn":container.program(66, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":23,"column":129},"end":{"line":23,"column":260}}})) != null ? stack1 : "");
},"66":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " and stopped at "
    + ((stack1 = lookupProperty(helpers,"time").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"anaesthesia") : depth0)) != null ? lookupProperty(stack1,"nitrousOxideStoppedAt") : stack1),{"name":"time","hash":{},"data":data,"loc":{"start":{"line":23,"column":211},"end":{"line":23,"column":253}}})) != null ? stack1 : "");
},"67":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"isNo").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"anaesthesia") : depth0)) != null ? lookupProperty(stack1,"nitrousOxideUsed") : stack1),{"name":"isNo","hash":{},"data":data,"loc":{"start":{"line":23,"column":281},"end":{"line":23,"column":316}}}),{"name":"if","hash":{},"fn":container.program(68, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":23,"column":275},"end":{"line":23,"column":350}}})) != null ? stack1 : "");
},"68":function(container,depth0,helpers,partials,data) {
    return "no nitrous oxide was used";
},"69":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"isNot").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"anaesthesia") : depth0)) != null ? lookupProperty(stack1,"antisepsis") : stack1),"none",{"name":"isNot","hash":{},"data":data,"loc":{"start":{"line":24,"column":33},"end":{"line":24,"column":70}}}),{"name":"if","hash":{},"fn":container.program(70, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":24,"column":27},"end":{"line":24,"column":162}}})) != null ? stack1 : "");
},"70":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "the eye was prepared with "
    + ((stack1 = lookupProperty(helpers,"label").call(depth0 != null ? depth0 : (container.nullContext || {}),"anaesthesia.antisepsis",((stack1 = (depth0 != null ? lookupProperty(depth0,"anaesthesia") : depth0)) != null ? lookupProperty(stack1,"antisepsis") : stack1),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":24,"column":98},"end":{"line":24,"column":155}}})) != null ? stack1 : "");
},"71":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(alias1,"detachment",{"name":"statement","hash":{},"fn":container.program(72, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":27,"column":0},"end":{"line":27,"column":346}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"pvd",{"name":"statement","hash":{},"fn":container.program(77, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":28,"column":0},"end":{"line":28,"column":468}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"pvr",{"name":"statement","hash":{},"fn":container.program(82, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":29,"column":0},"end":{"line":29,"column":429}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"haemorrhage",{"name":"statement","hash":{},"fn":container.program(88, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":30,"column":0},"end":{"line":30,"column":113}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"choroidals",{"name":"statement","hash":{},"fn":container.program(90, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":31,"column":0},"end":{"line":31,"column":112}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"breaks") : depth0)) != null ? lookupProperty(stack1,"found") : stack1),"none",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":32,"column":6},"end":{"line":32,"column":30}}}),{"name":"if","hash":{},"fn":container.program(92, data, 0),"inverse":container.program(95, data, 0),"data":data,"loc":{"start":{"line":32,"column":0},"end":{"line":32,"column":926}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"breaks") : depth0)) != null ? lookupProperty(stack1,"lattice") : stack1),"none",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":33,"column":6},"end":{"line":33,"column":32}}}),{"name":"if","hash":{},"fn":container.program(111, data, 0),"inverse":container.program(114, data, 0),"data":data,"loc":{"start":{"line":33,"column":0},"end":{"line":33,"column":388}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"lens",{"name":"statement","hash":{},"fn":container.program(119, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":34,"column":0},"end":{"line":34,"column":250}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"biometry",{"name":"statement","hash":{},"fn":container.program(125, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":35,"column":0},"end":{"line":35,"column":129}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"note",{"name":"statement","hash":{},"fn":container.program(127, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":36,"column":0},"end":{"line":36,"column":76}}})) != null ? stack1 : "")
    + "\n";
},"72":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"totalDetachment") : stack1),{"name":"if","hash":{},"fn":container.program(73, data, 0),"inverse":container.program(74, data, 0),"data":data,"loc":{"start":{"line":27,"column":27},"end":{"line":27,"column":332}}})) != null ? stack1 : "");
},"73":function(container,depth0,helpers,partials,data) {
    return "the retina was totally detached";
},"74":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"all").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"detachmentFromClock") : stack1),((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"detachmentToClock") : stack1),{"name":"all","hash":{},"data":data,"loc":{"start":{"line":27,"column":102},"end":{"line":27,"column":159}}}),{"name":"if","hash":{},"fn":container.program(75, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":27,"column":96},"end":{"line":27,"column":325}}})) != null ? stack1 : "");
},"75":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "the retina was detached from "
    + ((stack1 = lookupProperty(helpers,"clock").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"detachmentFromClock") : stack1),{"name":"clock","hash":{},"data":data,"loc":{"start":{"line":27,"column":190},"end":{"line":27,"column":226}}})) != null ? stack1 : "")
    + " to "
    + ((stack1 = lookupProperty(helpers,"clock").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"detachmentToClock") : stack1),{"name":"clock","hash":{},"data":data,"loc":{"start":{"line":27,"column":230},"end":{"line":27,"column":264}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"macula") : stack1),{"name":"if","hash":{},"fn":container.program(76, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":27,"column":264},"end":{"line":27,"column":318}}})) != null ? stack1 : "");
},"76":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", macula "
    + ((stack1 = container.lambda(((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"macula") : stack1), depth0)) != null ? stack1 : "");
},"77":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"posteriorVitreousDetachment") : stack1),"complete",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":28,"column":26},"end":{"line":28,"column":76}}}),{"name":"if","hash":{},"fn":container.program(78, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":28,"column":20},"end":{"line":28,"column":120}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"posteriorVitreousDetachment") : stack1),"partial",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":28,"column":126},"end":{"line":28,"column":175}}}),{"name":"if","hash":{},"fn":container.program(79, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":28,"column":120},"end":{"line":28,"column":226}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"posteriorVitreousDetachment") : stack1),"none",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":28,"column":232},"end":{"line":28,"column":278}}}),{"name":"if","hash":{},"fn":container.program(80, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":28,"column":226},"end":{"line":28,"column":329}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"posteriorVitreousDetachment") : stack1),"unknown",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":28,"column":335},"end":{"line":28,"column":384}}}),{"name":"if","hash":{},"fn":container.program(81, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":28,"column":329},"end":{"line":28,"column":454}}})) != null ? stack1 : "");
},"78":function(container,depth0,helpers,partials,data) {
    return "the posterior vitreous was detached";
},"79":function(container,depth0,helpers,partials,data) {
    return "the posterior vitreous was partly detached";
},"80":function(container,depth0,helpers,partials,data) {
    return "there was no posterior vitreous detachment";
},"81":function(container,depth0,helpers,partials,data) {
    return "whether the posterior vitreous was detached could not be told";
},"82":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"pvr") : stack1)) != null ? lookupProperty(stack1,"grade") : stack1),"none",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":29,"column":26},"end":{"line":29,"column":54}}}),{"name":"if","hash":{},"fn":container.program(83, data, 0),"inverse":container.program(84, data, 0),"data":data,"loc":{"start":{"line":29,"column":20},"end":{"line":29,"column":415}}})) != null ? stack1 : "");
},"83":function(container,depth0,helpers,partials,data) {
    return "there was no proliferative vitreoretinopathy";
},"84":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"pvr") : stack1)) != null ? lookupProperty(stack1,"grade") : stack1),{"name":"if","hash":{},"fn":container.program(85, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":29,"column":108},"end":{"line":29,"column":408}}})) != null ? stack1 : "");
},"85":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "there was proliferative vitreoretinopathy, grade "
    + ((stack1 = container.lambda(((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"pvr") : stack1)) != null ? lookupProperty(stack1,"grade") : stack1), depth0)) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"moreThan").call(alias1,((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"pvr") : stack1)) != null ? lookupProperty(stack1,"clockHours") : stack1),0,{"name":"moreThan","hash":{},"data":data,"loc":{"start":{"line":29,"column":207},"end":{"line":29,"column":241}}}),{"name":"if","hash":{},"fn":container.program(86, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":29,"column":201},"end":{"line":29,"column":316}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"pvr") : stack1)) != null ? lookupProperty(stack1,"edition") : stack1),{"name":"if","hash":{},"fn":container.program(87, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":29,"column":316},"end":{"line":29,"column":401}}})) != null ? stack1 : "");
},"86":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " over "
    + ((stack1 = lookupProperty(helpers,"countOf").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"pvr") : stack1)) != null ? lookupProperty(stack1,"clockHours") : stack1),"clock hour","clock hours",{"name":"countOf","hash":{},"data":data,"loc":{"start":{"line":29,"column":249},"end":{"line":29,"column":309}}})) != null ? stack1 : "");
},"87":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " ("
    + ((stack1 = lookupProperty(helpers,"label").call(depth0 != null ? depth0 : (container.nullContext || {}),"before.pvr.edition",((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"pvr") : stack1)) != null ? lookupProperty(stack1,"edition") : stack1),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":29,"column":344},"end":{"line":29,"column":393}}})) != null ? stack1 : "")
    + ")";
},"88":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"vitreousHaemorrhage") : stack1),{"name":"if","hash":{},"fn":container.program(89, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":30,"column":28},"end":{"line":30,"column":99}}})) != null ? stack1 : "");
},"89":function(container,depth0,helpers,partials,data) {
    return "there was vitreous haemorrhage";
},"90":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"choroidalDetachment") : stack1),{"name":"if","hash":{},"fn":container.program(91, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":31,"column":27},"end":{"line":31,"column":98}}})) != null ? stack1 : "");
},"91":function(container,depth0,helpers,partials,data) {
    return "there was choroidal detachment";
},"92":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(depth0 != null ? depth0 : (container.nullContext || {}),"no-break",{"name":"statement","hash":{},"fn":container.program(93, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":32,"column":32},"end":{"line":32,"column":128}}})) != null ? stack1 : "");
},"93":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"breaks") : depth0)) != null ? lookupProperty(stack1,"found") : stack1),"none",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":32,"column":63},"end":{"line":32,"column":87}}}),{"name":"if","hash":{},"fn":container.program(94, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":32,"column":57},"end":{"line":32,"column":114}}})) != null ? stack1 : "");
},"94":function(container,depth0,helpers,partials,data) {
    return "no break was found";
},"95":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"breaks") : depth0)) != null ? lookupProperty(stack1,"found") : stack1),{"name":"each","hash":{},"fn":container.program(96, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":32,"column":136},"end":{"line":32,"column":919}}})) != null ? stack1 : "");
},"96":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(depth0 != null ? depth0 : (container.nullContext || {}),"break",(data && lookupProperty(data,"index")),{"name":"statement","hash":{},"fn":container.program(97, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":32,"column":158},"end":{"line":32,"column":910}}})) != null ? stack1 : "");
},"97":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"any").call(alias1,(depth0 != null ? lookupProperty(depth0,"kind") : depth0),(depth0 != null ? lookupProperty(depth0,"clock") : depth0),{"name":"any","hash":{},"data":data,"loc":{"start":{"line":32,"column":193},"end":{"line":32,"column":209}}}),{"name":"if","hash":{},"fn":container.program(98, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":32,"column":187},"end":{"line":32,"column":896}}})) != null ? stack1 : "");
},"98":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"kind") : depth0),{"name":"if","hash":{},"fn":container.program(99, data, 0),"inverse":container.program(100, data, 0),"data":data,"loc":{"start":{"line":32,"column":211},"end":{"line":32,"column":284}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"moreThan").call(alias1,(depth0 != null ? lookupProperty(depth0,"extentClockHours") : depth0),0,{"name":"moreThan","hash":{},"data":data,"loc":{"start":{"line":32,"column":290},"end":{"line":32,"column":319}}}),{"name":"if","hash":{},"fn":container.program(101, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":32,"column":284},"end":{"line":32,"column":388}}})) != null ? stack1 : "")
    + " lay"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"clock") : depth0),{"name":"if","hash":{},"fn":container.program(102, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":32,"column":392},"end":{"line":32,"column":431}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"zone") : depth0),{"name":"if","hash":{},"fn":container.program(103, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":32,"column":431},"end":{"line":32,"column":486}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"frontEdgeMm") : depth0),{"name":"if","hash":{},"fn":container.program(104, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":32,"column":486},"end":{"line":32,"column":675}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"onDetachedRetina") : depth0),{"name":"if","hash":{},"fn":container.program(107, data, 0),"inverse":container.program(108, data, 0),"data":data,"loc":{"start":{"line":32,"column":675},"end":{"line":32,"column":792}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"localizedBy") : depth0),{"name":"if","hash":{},"fn":container.program(110, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":32,"column":792},"end":{"line":32,"column":889}}})) != null ? stack1 : "");
},"99":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"an").call(alias1,lookupProperty(helpers,"label").call(alias1,"breaks.found.kind",(depth0 != null ? lookupProperty(depth0,"kind") : depth0),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":32,"column":228},"end":{"line":32,"column":260}}}),{"name":"an","hash":{},"data":data,"loc":{"start":{"line":32,"column":223},"end":{"line":32,"column":262}}})) != null ? stack1 : "");
},"100":function(container,depth0,helpers,partials,data) {
    return "a break";
},"101":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " of "
    + ((stack1 = lookupProperty(helpers,"figureOf").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"extentClockHours") : depth0),"clock hour","clock hours",{"name":"figureOf","hash":{},"data":data,"loc":{"start":{"line":32,"column":325},"end":{"line":32,"column":381}}})) != null ? stack1 : "");
},"102":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " at "
    + ((stack1 = lookupProperty(helpers,"clock").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"clock") : depth0),{"name":"clock","hash":{},"data":data,"loc":{"start":{"line":32,"column":409},"end":{"line":32,"column":424}}})) != null ? stack1 : "");
},"103":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", "
    + ((stack1 = lookupProperty(helpers,"label").call(depth0 != null ? depth0 : (container.nullContext || {}),"breaks.found.zone",(depth0 != null ? lookupProperty(depth0,"zone") : depth0),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":32,"column":445},"end":{"line":32,"column":479}}})) != null ? stack1 : "");
},"104":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"backEdgeMm") : depth0),{"name":"if","hash":{},"fn":container.program(105, data, 0),"inverse":container.program(106, data, 0),"data":data,"loc":{"start":{"line":32,"column":505},"end":{"line":32,"column":668}}})) != null ? stack1 : "");
},"105":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", "
    + ((stack1 = lookupProperty(helpers,"number").call(alias1,(depth0 != null ? lookupProperty(depth0,"frontEdgeMm") : depth0),{"name":"number","hash":{},"data":data,"loc":{"start":{"line":32,"column":525},"end":{"line":32,"column":547}}})) != null ? stack1 : "")
    + " to "
    + ((stack1 = lookupProperty(helpers,"number").call(alias1,(depth0 != null ? lookupProperty(depth0,"backEdgeMm") : depth0),{"name":"number","hash":{},"data":data,"loc":{"start":{"line":32,"column":551},"end":{"line":32,"column":572}}})) != null ? stack1 : "")
    + " mm behind the limbus";
},"106":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", its front edge "
    + ((stack1 = lookupProperty(helpers,"number").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"frontEdgeMm") : depth0),{"name":"number","hash":{},"data":data,"loc":{"start":{"line":32,"column":618},"end":{"line":32,"column":640}}})) != null ? stack1 : "")
    + " mm behind the limbus";
},"107":function(container,depth0,helpers,partials,data) {
    return ", on detached retina";
},"108":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"isNo").call(alias1,(depth0 != null ? lookupProperty(depth0,"onDetachedRetina") : depth0),{"name":"isNo","hash":{},"data":data,"loc":{"start":{"line":32,"column":733},"end":{"line":32,"column":756}}}),{"name":"if","hash":{},"fn":container.program(109, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":32,"column":727},"end":{"line":32,"column":785}}})) != null ? stack1 : "");
},"109":function(container,depth0,helpers,partials,data) {
    return ", on attached retina";
},"110":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "; it was localized by "
    + ((stack1 = lookupProperty(helpers,"labels").call(depth0 != null ? depth0 : (container.nullContext || {}),"breaks.found.localizedBy",(depth0 != null ? lookupProperty(depth0,"localizedBy") : depth0),{"name":"labels","hash":{},"data":data,"loc":{"start":{"line":32,"column":833},"end":{"line":32,"column":882}}})) != null ? stack1 : "");
},"111":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(depth0 != null ? depth0 : (container.nullContext || {}),"no-lattice",{"name":"statement","hash":{},"fn":container.program(112, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":33,"column":34},"end":{"line":33,"column":149}}})) != null ? stack1 : "");
},"112":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"breaks") : depth0)) != null ? lookupProperty(stack1,"lattice") : stack1),"none",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":33,"column":67},"end":{"line":33,"column":93}}}),{"name":"if","hash":{},"fn":container.program(113, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":33,"column":61},"end":{"line":33,"column":135}}})) != null ? stack1 : "");
},"113":function(container,depth0,helpers,partials,data) {
    return "there was no lattice degeneration";
},"114":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"breaks") : depth0)) != null ? lookupProperty(stack1,"lattice") : stack1),{"name":"each","hash":{},"fn":container.program(115, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":33,"column":157},"end":{"line":33,"column":381}}})) != null ? stack1 : "");
},"115":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(depth0 != null ? depth0 : (container.nullContext || {}),"lattice",(data && lookupProperty(data,"index")),{"name":"statement","hash":{},"fn":container.program(116, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":33,"column":181},"end":{"line":33,"column":372}}})) != null ? stack1 : "");
},"116":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"all").call(alias1,(depth0 != null ? lookupProperty(depth0,"fromClock") : depth0),(depth0 != null ? lookupProperty(depth0,"toClock") : depth0),{"name":"all","hash":{},"data":data,"loc":{"start":{"line":33,"column":218},"end":{"line":33,"column":241}}}),{"name":"if","hash":{},"fn":container.program(117, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":33,"column":212},"end":{"line":33,"column":358}}})) != null ? stack1 : "");
},"117":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "lattice degeneration lay from "
    + ((stack1 = lookupProperty(helpers,"clock").call(alias1,(depth0 != null ? lookupProperty(depth0,"fromClock") : depth0),{"name":"clock","hash":{},"data":data,"loc":{"start":{"line":33,"column":273},"end":{"line":33,"column":292}}})) != null ? stack1 : "")
    + " to "
    + ((stack1 = lookupProperty(helpers,"clock").call(alias1,(depth0 != null ? lookupProperty(depth0,"toClock") : depth0),{"name":"clock","hash":{},"data":data,"loc":{"start":{"line":33,"column":296},"end":{"line":33,"column":313}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"treated") : depth0),{"name":"if","hash":{},"fn":container.program(118, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":33,"column":313},"end":{"line":33,"column":351}}})) != null ? stack1 : "");
},"118":function(container,depth0,helpers,partials,data) {
    return " and was treated";
},"119":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"lens") : stack1),{"name":"if","hash":{},"fn":container.program(120, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":34,"column":21},"end":{"line":34,"column":236}}})) != null ? stack1 : "");
},"120":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "the eye was "
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"lens") : stack1),"cataract",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":34,"column":58},"end":{"line":34,"column":85}}}),{"name":"if","hash":{},"fn":container.program(121, data, 0),"inverse":container.program(122, data, 0),"data":data,"loc":{"start":{"line":34,"column":52},"end":{"line":34,"column":229}}})) != null ? stack1 : "");
},"121":function(container,depth0,helpers,partials,data) {
    return "phakic with cataract";
},"122":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"lens") : stack1),"phakic",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":34,"column":121},"end":{"line":34,"column":146}}}),{"name":"if","hash":{},"fn":container.program(123, data, 0),"inverse":container.program(124, data, 0),"data":data,"loc":{"start":{"line":34,"column":115},"end":{"line":34,"column":222}}})) != null ? stack1 : "");
},"123":function(container,depth0,helpers,partials,data) {
    return "phakic with a clear lens";
},"124":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"label").call(depth0 != null ? depth0 : (container.nullContext || {}),"before.lens",((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"lens") : stack1),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":34,"column":180},"end":{"line":34,"column":215}}})) != null ? stack1 : "");
},"125":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"axialLengthMm") : stack1),{"name":"if","hash":{},"fn":container.program(126, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":35,"column":25},"end":{"line":35,"column":115}}})) != null ? stack1 : "");
},"126":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "its axial length was "
    + ((stack1 = lookupProperty(helpers,"number").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"axialLengthMm") : stack1),{"name":"number","hash":{},"data":data,"loc":{"start":{"line":35,"column":74},"end":{"line":35,"column":105}}})) != null ? stack1 : "")
    + " mm";
},"127":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"breaks") : depth0)) != null ? lookupProperty(stack1,"note") : stack1),{"name":"if","hash":{},"fn":container.program(128, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":36,"column":21},"end":{"line":36,"column":62}}})) != null ? stack1 : "");
},"128":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.lambda(((stack1 = (depth0 != null ? lookupProperty(depth0,"breaks") : depth0)) != null ? lookupProperty(stack1,"note") : stack1), depth0)) != null ? stack1 : "");
},"129":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(alias1,"opening",{"name":"statement","hash":{},"fn":container.program(130, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":39,"column":0},"end":{"line":39,"column":472}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"buckle") : depth0)) != null ? lookupProperty(stack1,"elements") : stack1),{"name":"each","hash":{},"fn":container.program(139, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":40,"column":0},"end":{"line":45,"column":114}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"vitrectomy",{"name":"statement","hash":{},"fn":container.program(172, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":46,"column":0},"end":{"line":46,"column":412}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"hyaloid",{"name":"statement","hash":{},"fn":container.program(178, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":47,"column":0},"end":{"line":47,"column":202}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"base",{"name":"statement","hash":{},"fn":container.program(182, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":48,"column":0},"end":{"line":48,"column":142}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"dyes") : stack1),{"name":"each","hash":{},"fn":container.program(184, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":49,"column":0},"end":{"line":49,"column":174}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"membranes",{"name":"statement","hash":{},"fn":container.program(188, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":50,"column":0},"end":{"line":50,"column":465}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"retinotomies") : stack1),{"name":"each","hash":{},"fn":container.program(194, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":51,"column":0},"end":{"line":51,"column":442}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"heavy-liquid",{"name":"statement","hash":{},"fn":container.program(202, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":52,"column":0},"end":{"line":52,"column":512}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"lens-work",{"name":"statement","hash":{},"fn":container.program(208, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":53,"column":0},"end":{"line":53,"column":234}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"lens-implant",{"name":"statement","hash":{},"fn":container.program(212, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":54,"column":0},"end":{"line":54,"column":358}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"drainage",{"name":"statement","hash":{},"fn":container.program(216, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":55,"column":0},"end":{"line":55,"column":694}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"retinopexy") : depth0)) != null ? lookupProperty(stack1,"treatments") : stack1),"none",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":56,"column":6},"end":{"line":56,"column":39}}}),{"name":"if","hash":{},"fn":container.program(227, data, 0),"inverse":container.program(230, data, 0),"data":data,"loc":{"start":{"line":56,"column":0},"end":{"line":56,"column":891}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"tamponade",{"name":"statement","hash":{},"fn":container.program(244, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":57,"column":0},"end":{"line":57,"column":1098}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"paracentesis",{"name":"statement","hash":{},"fn":container.program(260, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":58,"column":0},"end":{"line":58,"column":196}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"iridectomy",{"name":"statement","hash":{},"fn":container.program(263, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":59,"column":0},"end":{"line":59,"column":193}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"closing",{"name":"statement","hash":{},"fn":container.program(265, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":60,"column":0},"end":{"line":60,"column":353}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"conjunctiva",{"name":"statement","hash":{},"fn":container.program(270, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":61,"column":0},"end":{"line":61,"column":205}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"extra",{"name":"statement","hash":{},"fn":container.program(272, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":62,"column":0},"end":{"line":62,"column":108}}})) != null ? stack1 : "")
    + "\n";
},"130":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"buckle") : depth0)) != null ? lookupProperty(stack1,"peritomy") : stack1),"full-circle",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":39,"column":30},"end":{"line":39,"column":64}}}),{"name":"if","hash":{},"fn":container.program(131, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":39,"column":24},"end":{"line":39,"column":97}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"buckle") : depth0)) != null ? lookupProperty(stack1,"peritomy") : stack1),"limited",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":39,"column":103},"end":{"line":39,"column":133}}}),{"name":"if","hash":{},"fn":container.program(132, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":39,"column":97},"end":{"line":39,"column":169}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"isNot").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"buckle") : depth0)) != null ? lookupProperty(stack1,"peritomy") : stack1),"none",{"name":"isNot","hash":{},"data":data,"loc":{"start":{"line":39,"column":175},"end":{"line":39,"column":205}}}),{"name":"if","hash":{},"fn":container.program(133, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":39,"column":169},"end":{"line":39,"column":458}}})) != null ? stack1 : "");
},"131":function(container,depth0,helpers,partials,data) {
    return "a 360° peritomy was made";
},"132":function(container,depth0,helpers,partials,data) {
    return "a limited peritomy was made";
},"133":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"isList").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"buckle") : depth0)) != null ? lookupProperty(stack1,"muscleSlings") : stack1),{"name":"isList","hash":{},"data":data,"loc":{"start":{"line":39,"column":213},"end":{"line":39,"column":241}}}),{"name":"if","hash":{},"fn":container.program(134, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":39,"column":207},"end":{"line":39,"column":451}}})) != null ? stack1 : "");
},"134":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " and "
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"buckle") : depth0)) != null ? lookupProperty(stack1,"muscleSlings") : stack1)) != null ? lookupProperty(stack1,"length") : stack1),4,{"name":"is","hash":{},"data":data,"loc":{"start":{"line":39,"column":254},"end":{"line":39,"column":287}}}),{"name":"if","hash":{},"fn":container.program(135, data, 0),"inverse":container.program(136, data, 0),"data":data,"loc":{"start":{"line":39,"column":248},"end":{"line":39,"column":374}}})) != null ? stack1 : "")
    + " "
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"buckle") : depth0)) != null ? lookupProperty(stack1,"muscleSlings") : stack1)) != null ? lookupProperty(stack1,"length") : stack1),1,{"name":"is","hash":{},"data":data,"loc":{"start":{"line":39,"column":381},"end":{"line":39,"column":414}}}),{"name":"if","hash":{},"fn":container.program(137, data, 0),"inverse":container.program(138, data, 0),"data":data,"loc":{"start":{"line":39,"column":375},"end":{"line":39,"column":438}}})) != null ? stack1 : "")
    + " slung";
},"135":function(container,depth0,helpers,partials,data) {
    return "all four recti";
},"136":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "the "
    + ((stack1 = lookupProperty(helpers,"labels").call(depth0 != null ? depth0 : (container.nullContext || {}),"buckle.muscleSlings",((stack1 = (depth0 != null ? lookupProperty(depth0,"buckle") : depth0)) != null ? lookupProperty(stack1,"muscleSlings") : stack1),{"name":"labels","hash":{},"data":data,"loc":{"start":{"line":39,"column":315},"end":{"line":39,"column":367}}})) != null ? stack1 : "");
},"137":function(container,depth0,helpers,partials,data) {
    return "was";
},"138":function(container,depth0,helpers,partials,data) {
    return "were";
},"139":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(alias1,"element",(data && lookupProperty(data,"index")),{"name":"statement","hash":{},"fn":container.program(140, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":40,"column":25},"end":{"line":40,"column":899}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"ends",(data && lookupProperty(data,"index")),{"name":"statement","hash":{},"fn":container.program(154, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":41,"column":0},"end":{"line":41,"column":338}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"tension",(data && lookupProperty(data,"index")),{"name":"statement","hash":{},"fn":container.program(160, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":42,"column":0},"end":{"line":42,"column":404}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"height",(data && lookupProperty(data,"index")),{"name":"statement","hash":{},"fn":container.program(166, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":43,"column":0},"end":{"line":43,"column":122}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"imbrication",(data && lookupProperty(data,"index")),{"name":"statement","hash":{},"fn":container.program(168, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":44,"column":0},"end":{"line":44,"column":119}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"intention",(data && lookupProperty(data,"index")),{"name":"statement","hash":{},"fn":container.program(170, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":45,"column":0},"end":{"line":45,"column":105}}})) != null ? stack1 : "");
},"140":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"any").call(alias1,(depth0 != null ? lookupProperty(depth0,"role") : depth0),(depth0 != null ? lookupProperty(depth0,"form") : depth0),(depth0 != null ? lookupProperty(depth0,"widthMm") : depth0),{"name":"any","hash":{},"data":data,"loc":{"start":{"line":40,"column":62},"end":{"line":40,"column":85}}}),{"name":"if","hash":{},"fn":container.program(141, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":40,"column":56},"end":{"line":40,"column":885}}})) != null ? stack1 : "");
},"141":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"an").call(alias1,lookupProperty(helpers,"element").call(alias1,depth0,{"name":"element","hash":{},"data":data,"loc":{"start":{"line":40,"column":92},"end":{"line":40,"column":106}}}),{"name":"an","hash":{},"data":data,"loc":{"start":{"line":40,"column":87},"end":{"line":40,"column":108}}})) != null ? stack1 : "")
    + " was "
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,(depth0 != null ? lookupProperty(depth0,"role") : depth0),"encircling",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":40,"column":119},"end":{"line":40,"column":141}}}),{"name":"if","hash":{},"fn":container.program(142, data, 0),"inverse":container.program(143, data, 0),"data":data,"loc":{"start":{"line":40,"column":113},"end":{"line":40,"column":288}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"underMuscles") : depth0),{"name":"if","hash":{},"fn":container.program(146, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":40,"column":288},"end":{"line":40,"column":445}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"all").call(alias1,(depth0 != null ? lookupProperty(depth0,"fromClock") : depth0),(depth0 != null ? lookupProperty(depth0,"toClock") : depth0),{"name":"all","hash":{},"data":data,"loc":{"start":{"line":40,"column":451},"end":{"line":40,"column":474}}}),{"name":"if","hash":{},"fn":container.program(148, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":40,"column":445},"end":{"line":40,"column":529}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"meridianClock") : depth0),{"name":"if","hash":{},"fn":container.program(149, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":40,"column":529},"end":{"line":40,"column":584}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"all").call(alias1,(depth0 != null ? lookupProperty(depth0,"frontEdgeMm") : depth0),(depth0 != null ? lookupProperty(depth0,"frontEdgeReference") : depth0),{"name":"all","hash":{},"data":data,"loc":{"start":{"line":40,"column":590},"end":{"line":40,"column":626}}}),{"name":"if","hash":{},"fn":container.program(150, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":40,"column":584},"end":{"line":40,"column":750}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"isList").call(alias1,(depth0 != null ? lookupProperty(depth0,"fixation") : depth0),{"name":"isList","hash":{},"data":data,"loc":{"start":{"line":40,"column":756},"end":{"line":40,"column":773}}}),{"name":"if","hash":{},"fn":container.program(151, data, 0),"inverse":container.program(152, data, 0),"data":data,"loc":{"start":{"line":40,"column":750},"end":{"line":40,"column":878}}})) != null ? stack1 : "");
},"142":function(container,depth0,helpers,partials,data) {
    return "passed round the globe";
},"143":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "placed"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,(depth0 != null ? lookupProperty(depth0,"role") : depth0),"meridional",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":40,"column":185},"end":{"line":40,"column":207}}}),{"name":"if","hash":{},"fn":container.program(144, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":40,"column":179},"end":{"line":40,"column":229}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,(depth0 != null ? lookupProperty(depth0,"role") : depth0),"under-band",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":40,"column":235},"end":{"line":40,"column":257}}}),{"name":"if","hash":{},"fn":container.program(145, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":40,"column":229},"end":{"line":40,"column":281}}})) != null ? stack1 : "");
},"144":function(container,depth0,helpers,partials,data) {
    return " meridionally";
},"145":function(container,depth0,helpers,partials,data) {
    return " under the band";
},"146":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " beneath "
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"underMuscles") : depth0)) != null ? lookupProperty(stack1,"length") : stack1),4,{"name":"is","hash":{},"data":data,"loc":{"start":{"line":40,"column":323},"end":{"line":40,"column":349}}}),{"name":"if","hash":{},"fn":container.program(135, data, 0),"inverse":container.program(147, data, 0),"data":data,"loc":{"start":{"line":40,"column":317},"end":{"line":40,"column":438}}})) != null ? stack1 : "");
},"147":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "the "
    + ((stack1 = lookupProperty(helpers,"labels").call(depth0 != null ? depth0 : (container.nullContext || {}),"buckle.elements.underMuscles",(depth0 != null ? lookupProperty(depth0,"underMuscles") : depth0),{"name":"labels","hash":{},"data":data,"loc":{"start":{"line":40,"column":377},"end":{"line":40,"column":431}}})) != null ? stack1 : "");
},"148":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " from "
    + ((stack1 = lookupProperty(helpers,"clock").call(alias1,(depth0 != null ? lookupProperty(depth0,"fromClock") : depth0),{"name":"clock","hash":{},"data":data,"loc":{"start":{"line":40,"column":482},"end":{"line":40,"column":501}}})) != null ? stack1 : "")
    + " to "
    + ((stack1 = lookupProperty(helpers,"clock").call(alias1,(depth0 != null ? lookupProperty(depth0,"toClock") : depth0),{"name":"clock","hash":{},"data":data,"loc":{"start":{"line":40,"column":505},"end":{"line":40,"column":522}}})) != null ? stack1 : "");
},"149":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " at "
    + ((stack1 = lookupProperty(helpers,"clock").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"meridianClock") : depth0),{"name":"clock","hash":{},"data":data,"loc":{"start":{"line":40,"column":554},"end":{"line":40,"column":577}}})) != null ? stack1 : "");
},"150":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", its front edge "
    + ((stack1 = lookupProperty(helpers,"number").call(alias1,(depth0 != null ? lookupProperty(depth0,"frontEdgeMm") : depth0),{"name":"number","hash":{},"data":data,"loc":{"start":{"line":40,"column":645},"end":{"line":40,"column":667}}})) != null ? stack1 : "")
    + " mm behind "
    + ((stack1 = lookupProperty(helpers,"label").call(alias1,"buckle.elements.frontEdgeReference",(depth0 != null ? lookupProperty(depth0,"frontEdgeReference") : depth0),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":40,"column":678},"end":{"line":40,"column":743}}})) != null ? stack1 : "");
},"151":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", and held by "
    + ((stack1 = lookupProperty(helpers,"fixation").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"fixation") : depth0),{"name":"fixation","hash":{},"data":data,"loc":{"start":{"line":40,"column":789},"end":{"line":40,"column":810}}})) != null ? stack1 : "");
},"152":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,(depth0 != null ? lookupProperty(depth0,"fixation") : depth0),"none",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":40,"column":824},"end":{"line":40,"column":844}}}),{"name":"if","hash":{},"fn":container.program(153, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":40,"column":818},"end":{"line":40,"column":871}}})) != null ? stack1 : "");
},"153":function(container,depth0,helpers,partials,data) {
    return ", without fixation";
},"154":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"closure") : depth0)) != null ? lookupProperty(stack1,"kind") : stack1),{"name":"if","hash":{},"fn":container.program(155, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":41,"column":28},"end":{"line":41,"column":324}}})) != null ? stack1 : "");
},"155":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "the ends were joined "
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"closure") : depth0)) != null ? lookupProperty(stack1,"kind") : stack1),"sleeve",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":41,"column":75},"end":{"line":41,"column":101}}}),{"name":"if","hash":{},"fn":container.program(156, data, 0),"inverse":container.program(157, data, 0),"data":data,"loc":{"start":{"line":41,"column":69},"end":{"line":41,"column":165}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"closure") : depth0)) != null ? lookupProperty(stack1,"quadrant") : stack1),{"name":"if","hash":{},"fn":container.program(158, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":41,"column":165},"end":{"line":41,"column":233}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"closure") : depth0)) != null ? lookupProperty(stack1,"endsMatch") : stack1),{"name":"if","hash":{},"fn":container.program(159, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":41,"column":233},"end":{"line":41,"column":317}}})) != null ? stack1 : "");
},"156":function(container,depth0,helpers,partials,data) {
    return "in a silicone sleeve";
},"157":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "by "
    + ((stack1 = lookupProperty(helpers,"an").call(alias1,lookupProperty(helpers,"closing").call(alias1,(depth0 != null ? lookupProperty(depth0,"closure") : depth0),{"name":"closing","hash":{},"data":data,"loc":{"start":{"line":41,"column":139},"end":{"line":41,"column":156}}}),{"name":"an","hash":{},"data":data,"loc":{"start":{"line":41,"column":134},"end":{"line":41,"column":158}}})) != null ? stack1 : "");
},"158":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " in the "
    + ((stack1 = container.lambda(((stack1 = (depth0 != null ? lookupProperty(depth0,"closure") : depth0)) != null ? lookupProperty(stack1,"quadrant") : stack1), depth0)) != null ? stack1 : "")
    + " quadrant";
},"159":function(container,depth0,helpers,partials,data) {
    return "; their cut ends matched, so that it was not twisted";
},"160":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"moreThan").call(alias1,(depth0 != null ? lookupProperty(depth0,"shortenedMm") : depth0),0,{"name":"moreThan","hash":{},"data":data,"loc":{"start":{"line":42,"column":37},"end":{"line":42,"column":61}}}),{"name":"if","hash":{},"fn":container.program(161, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":42,"column":31},"end":{"line":42,"column":390}}})) != null ? stack1 : "");
},"161":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "the "
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,(depth0 != null ? lookupProperty(depth0,"role") : depth0),"encircling",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":42,"column":73},"end":{"line":42,"column":95}}}),{"name":"if","hash":{},"fn":container.program(162, data, 0),"inverse":container.program(163, data, 0),"data":data,"loc":{"start":{"line":42,"column":67},"end":{"line":42,"column":123}}})) != null ? stack1 : "")
    + " was shortened by "
    + ((stack1 = lookupProperty(helpers,"number").call(alias1,(depth0 != null ? lookupProperty(depth0,"shortenedMm") : depth0),{"name":"number","hash":{},"data":data,"loc":{"start":{"line":42,"column":141},"end":{"line":42,"column":163}}})) != null ? stack1 : "")
    + " mm"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"moreThan").call(alias1,(depth0 != null ? lookupProperty(depth0,"pressureWhileTensioningMmHg") : depth0),0,{"name":"moreThan","hash":{},"data":data,"loc":{"start":{"line":42,"column":172},"end":{"line":42,"column":212}}}),{"name":"if","hash":{},"fn":container.program(164, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":42,"column":166},"end":{"line":42,"column":383}}})) != null ? stack1 : "");
},"162":function(container,depth0,helpers,partials,data) {
    return "band";
},"163":function(container,depth0,helpers,partials,data) {
    return "element";
},"164":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " while the pressure was held at "
    + ((stack1 = lookupProperty(helpers,"number").call(alias1,(depth0 != null ? lookupProperty(depth0,"pressureWhileTensioningMmHg") : depth0),{"name":"number","hash":{},"data":data,"loc":{"start":{"line":42,"column":246},"end":{"line":42,"column":284}}})) != null ? stack1 : "")
    + " mmHg"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"pressureSetBy") : depth0),{"name":"if","hash":{},"fn":container.program(165, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":42,"column":289},"end":{"line":42,"column":376}}})) != null ? stack1 : "");
},"165":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " by "
    + ((stack1 = lookupProperty(helpers,"label").call(depth0 != null ? depth0 : (container.nullContext || {}),"buckle.elements.pressureSetBy",(depth0 != null ? lookupProperty(depth0,"pressureSetBy") : depth0),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":42,"column":314},"end":{"line":42,"column":369}}})) != null ? stack1 : "");
},"166":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"heightMm") : depth0),{"name":"if","hash":{},"fn":container.program(167, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":43,"column":30},"end":{"line":43,"column":108}}})) != null ? stack1 : "");
},"167":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "the height seen inside was about "
    + ((stack1 = lookupProperty(helpers,"number").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"heightMm") : depth0),{"name":"number","hash":{},"data":data,"loc":{"start":{"line":43,"column":79},"end":{"line":43,"column":98}}})) != null ? stack1 : "")
    + " mm";
},"168":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"imbricatedOver") : depth0),{"name":"if","hash":{},"fn":container.program(169, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":44,"column":35},"end":{"line":44,"column":105}}})) != null ? stack1 : "");
},"169":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "it was imbricated over "
    + ((stack1 = container.lambda((depth0 != null ? lookupProperty(depth0,"imbricatedOver") : depth0), depth0)) != null ? stack1 : "");
},"170":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"intention") : depth0),{"name":"if","hash":{},"fn":container.program(171, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":45,"column":33},"end":{"line":45,"column":91}}})) != null ? stack1 : "");
},"171":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "it is intended to be "
    + ((stack1 = container.lambda((depth0 != null ? lookupProperty(depth0,"intention") : depth0), depth0)) != null ? stack1 : "");
},"172":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"vitrectomy") : stack1),{"name":"if","hash":{},"fn":container.program(173, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":46,"column":27},"end":{"line":46,"column":398}}})) != null ? stack1 : "");
},"173":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"an").call(alias1,"pars plana vitrectomy",{"name":"an","hash":{},"data":data,"loc":{"start":{"line":46,"column":54},"end":{"line":46,"column":84}}})) != null ? stack1 : "")
    + " was done"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"moreThan").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"ports") : stack1),0,{"name":"moreThan","hash":{},"data":data,"loc":{"start":{"line":46,"column":99},"end":{"line":46,"column":126}}}),{"name":"if","hash":{},"fn":container.program(174, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":46,"column":93},"end":{"line":46,"column":185}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"isNot").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"gauge") : stack1),"not-applicable",{"name":"isNot","hash":{},"data":data,"loc":{"start":{"line":46,"column":191},"end":{"line":46,"column":230}}}),{"name":"if","hash":{},"fn":container.program(175, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":46,"column":185},"end":{"line":46,"column":296}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"sclerotomiesMm") : stack1),{"name":"if","hash":{},"fn":container.program(177, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":46,"column":296},"end":{"line":46,"column":391}}})) != null ? stack1 : "");
},"174":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " through "
    + ((stack1 = lookupProperty(helpers,"countOf").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"ports") : stack1),"port","ports",{"name":"countOf","hash":{},"data":data,"loc":{"start":{"line":46,"column":137},"end":{"line":46,"column":178}}})) != null ? stack1 : "");
},"175":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"gauge") : stack1),{"name":"if","hash":{},"fn":container.program(176, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":46,"column":232},"end":{"line":46,"column":289}}})) != null ? stack1 : "");
},"176":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " of "
    + ((stack1 = container.lambda(((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"gauge") : stack1), depth0)) != null ? stack1 : "")
    + " gauge";
},"177":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", "
    + ((stack1 = lookupProperty(helpers,"number").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"sclerotomiesMm") : stack1),{"name":"number","hash":{},"data":data,"loc":{"start":{"line":46,"column":329},"end":{"line":46,"column":363}}})) != null ? stack1 : "")
    + " mm behind the limbus";
},"178":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"hyaloid") : stack1),{"name":"if","hash":{},"fn":container.program(179, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":47,"column":24},"end":{"line":47,"column":188}}})) != null ? stack1 : "");
},"179":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "the posterior hyaloid was "
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"hyaloid") : stack1),"induced",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":47,"column":80},"end":{"line":47,"column":111}}}),{"name":"if","hash":{},"fn":container.program(180, data, 0),"inverse":container.program(181, data, 0),"data":data,"loc":{"start":{"line":47,"column":74},"end":{"line":47,"column":181}}})) != null ? stack1 : "");
},"180":function(container,depth0,helpers,partials,data) {
    return "detached";
},"181":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"label").call(depth0 != null ? depth0 : (container.nullContext || {}),"vitreous.hyaloid",((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"hyaloid") : stack1),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":47,"column":129},"end":{"line":47,"column":174}}})) != null ? stack1 : "");
},"182":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"baseShaved") : stack1),{"name":"if","hash":{},"fn":container.program(183, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":48,"column":21},"end":{"line":48,"column":128}}})) != null ? stack1 : "");
},"183":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "the vitreous base was "
    + ((stack1 = lookupProperty(helpers,"label").call(depth0 != null ? depth0 : (container.nullContext || {}),"vitreous.baseShaved",((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"baseShaved") : stack1),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":48,"column":70},"end":{"line":48,"column":121}}})) != null ? stack1 : "");
},"184":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(depth0 != null ? depth0 : (container.nullContext || {}),"dye",(data && lookupProperty(data,"index")),{"name":"statement","hash":{},"fn":container.program(185, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":49,"column":23},"end":{"line":49,"column":165}}})) != null ? stack1 : "");
},"185":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"kind") : depth0),{"name":"if","hash":{},"fn":container.program(186, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":49,"column":50},"end":{"line":49,"column":151}}})) != null ? stack1 : "");
},"186":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"label").call(alias1,"vitreous.dyes.kind",(depth0 != null ? lookupProperty(depth0,"kind") : depth0),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":49,"column":62},"end":{"line":49,"column":97}}})) != null ? stack1 : "")
    + " was used"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"purpose") : depth0),{"name":"if","hash":{},"fn":container.program(187, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":49,"column":106},"end":{"line":49,"column":144}}})) != null ? stack1 : "");
},"187":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " for "
    + ((stack1 = container.lambda((depth0 != null ? lookupProperty(depth0,"purpose") : depth0), depth0)) != null ? stack1 : "");
},"188":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"includes").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"membranesPeeled") : stack1),"none",{"name":"includes","hash":{},"data":data,"loc":{"start":{"line":50,"column":32},"end":{"line":50,"column":74}}}),{"name":"if","hash":{},"fn":container.program(189, data, 0),"inverse":container.program(191, data, 0),"data":data,"loc":{"start":{"line":50,"column":26},"end":{"line":50,"column":451}}})) != null ? stack1 : "");
},"189":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"vitrectomy") : stack1),{"name":"if","hash":{},"fn":container.program(190, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":50,"column":76},"end":{"line":50,"column":132}}})) != null ? stack1 : "");
},"190":function(container,depth0,helpers,partials,data) {
    return "no membrane was peeled";
},"191":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"membranesPeeled") : stack1),{"name":"if","hash":{},"fn":container.program(192, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":50,"column":140},"end":{"line":50,"column":444}}})) != null ? stack1 : "");
},"192":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "the "
    + ((stack1 = lookupProperty(helpers,"labels").call(alias1,"vitreous.membranesPeeled",((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"membranesPeeled") : stack1),{"name":"labels","hash":{},"data":data,"loc":{"start":{"line":50,"column":176},"end":{"line":50,"column":238}}})) != null ? stack1 : "")
    + " "
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"membranesPeeled") : stack1)) != null ? lookupProperty(stack1,"length") : stack1),1,{"name":"is","hash":{},"data":data,"loc":{"start":{"line":50,"column":245},"end":{"line":50,"column":283}}}),{"name":"if","hash":{},"fn":container.program(193, data, 0),"inverse":container.program(138, data, 0),"data":data,"loc":{"start":{"line":50,"column":239},"end":{"line":50,"column":430}}})) != null ? stack1 : "")
    + " peeled";
},"193":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"any").call(alias1,lookupProperty(helpers,"includes").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"membranesPeeled") : stack1),"epiretinal",{"name":"includes","hash":{},"data":data,"loc":{"start":{"line":50,"column":296},"end":{"line":50,"column":344}}}),lookupProperty(helpers,"includes").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"membranesPeeled") : stack1),"ilm",{"name":"includes","hash":{},"data":data,"loc":{"start":{"line":50,"column":345},"end":{"line":50,"column":386}}}),{"name":"any","hash":{},"data":data,"loc":{"start":{"line":50,"column":291},"end":{"line":50,"column":387}}}),{"name":"if","hash":{},"fn":container.program(137, data, 0),"inverse":container.program(138, data, 0),"data":data,"loc":{"start":{"line":50,"column":285},"end":{"line":50,"column":411}}})) != null ? stack1 : "");
},"194":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(depth0 != null ? depth0 : (container.nullContext || {}),"retinotomy",(data && lookupProperty(data,"index")),{"name":"statement","hash":{},"fn":container.program(195, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":51,"column":31},"end":{"line":51,"column":433}}})) != null ? stack1 : "");
},"195":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"kind") : depth0),{"name":"if","hash":{},"fn":container.program(196, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":51,"column":65},"end":{"line":51,"column":419}}})) != null ? stack1 : "");
},"196":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"an").call(alias1,lookupProperty(helpers,"label").call(alias1,"vitreous.retinotomies.kind",(depth0 != null ? lookupProperty(depth0,"kind") : depth0),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":51,"column":82},"end":{"line":51,"column":123}}}),{"name":"an","hash":{},"data":data,"loc":{"start":{"line":51,"column":77},"end":{"line":51,"column":125}}})) != null ? stack1 : "")
    + " was made"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"fromClock") : depth0),{"name":"if","hash":{},"fn":container.program(197, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":51,"column":134},"end":{"line":51,"column":257}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"treatedBy") : depth0),{"name":"if","hash":{},"fn":container.program(199, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":51,"column":257},"end":{"line":51,"column":412}}})) != null ? stack1 : "");
},"197":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"toClock") : depth0),{"name":"if","hash":{},"fn":container.program(148, data, 0),"inverse":container.program(198, data, 0),"data":data,"loc":{"start":{"line":51,"column":151},"end":{"line":51,"column":250}}})) != null ? stack1 : "");
},"198":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " at "
    + ((stack1 = lookupProperty(helpers,"clock").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"fromClock") : depth0),{"name":"clock","hash":{},"data":data,"loc":{"start":{"line":51,"column":224},"end":{"line":51,"column":243}}})) != null ? stack1 : "");
},"199":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,(depth0 != null ? lookupProperty(depth0,"treatedBy") : depth0),"none",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":51,"column":280},"end":{"line":51,"column":301}}}),{"name":"if","hash":{},"fn":container.program(200, data, 0),"inverse":container.program(201, data, 0),"data":data,"loc":{"start":{"line":51,"column":274},"end":{"line":51,"column":405}}})) != null ? stack1 : "");
},"200":function(container,depth0,helpers,partials,data) {
    return " and not treated";
},"201":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " and treated with "
    + ((stack1 = lookupProperty(helpers,"label").call(depth0 != null ? depth0 : (container.nullContext || {}),"vitreous.retinotomies.treatedBy",(depth0 != null ? lookupProperty(depth0,"treatedBy") : depth0),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":51,"column":345},"end":{"line":51,"column":398}}})) != null ? stack1 : "");
},"202":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"heavyLiquid") : stack1),"removed",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":52,"column":35},"end":{"line":52,"column":70}}}),{"name":"if","hash":{},"fn":container.program(203, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":52,"column":29},"end":{"line":52,"column":200}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"heavyLiquid") : stack1),"left",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":52,"column":206},"end":{"line":52,"column":238}}}),{"name":"if","hash":{},"fn":container.program(205, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":52,"column":200},"end":{"line":52,"column":405}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"heavyLiquid") : stack1),"not-removed",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":52,"column":411},"end":{"line":52,"column":450}}}),{"name":"if","hash":{},"fn":container.program(207, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":52,"column":405},"end":{"line":52,"column":498}}})) != null ? stack1 : "");
},"203":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "heavy liquid"
    + ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"heavyLiquidVolumeMl") : stack1),{"name":"if","hash":{},"fn":container.program(204, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":52,"column":84},"end":{"line":52,"column":172}}})) != null ? stack1 : "")
    + " was used and removed";
},"204":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " ("
    + ((stack1 = lookupProperty(helpers,"number").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"heavyLiquidVolumeMl") : stack1),{"name":"number","hash":{},"data":data,"loc":{"start":{"line":52,"column":122},"end":{"line":52,"column":161}}})) != null ? stack1 : "")
    + " mL)";
},"205":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "heavy liquid was left in the eye on purpose"
    + ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"heavyLiquidRemovalPlannedOn") : stack1),{"name":"if","hash":{},"fn":container.program(206, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":52,"column":283},"end":{"line":52,"column":398}}})) != null ? stack1 : "");
},"206":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", to be removed on "
    + ((stack1 = lookupProperty(helpers,"date").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"heavyLiquidRemovalPlannedOn") : stack1),{"name":"date","hash":{},"data":data,"loc":{"start":{"line":52,"column":346},"end":{"line":52,"column":391}}})) != null ? stack1 : "");
},"207":function(container,depth0,helpers,partials,data) {
    return "heavy liquid could not be removed fully";
},"208":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"isNot").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"lensWork") : stack1),"none",{"name":"isNot","hash":{},"data":data,"loc":{"start":{"line":53,"column":32},"end":{"line":53,"column":64}}}),{"name":"if","hash":{},"fn":container.program(209, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":53,"column":26},"end":{"line":53,"column":220}}})) != null ? stack1 : "");
},"209":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"lensWork") : stack1),"implant-removed",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":53,"column":72},"end":{"line":53,"column":112}}}),{"name":"if","hash":{},"fn":container.program(210, data, 0),"inverse":container.program(211, data, 0),"data":data,"loc":{"start":{"line":53,"column":66},"end":{"line":53,"column":213}}})) != null ? stack1 : "");
},"210":function(container,depth0,helpers,partials,data) {
    return "the lens implant was removed";
},"211":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"label").call(depth0 != null ? depth0 : (container.nullContext || {}),"vitreous.lensWork",((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"lensWork") : stack1),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":53,"column":150},"end":{"line":53,"column":197}}})) != null ? stack1 : "")
    + " was done";
},"212":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"lensImplant") : stack1)) != null ? lookupProperty(stack1,"form") : stack1),{"name":"if","hash":{},"fn":container.program(213, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":54,"column":29},"end":{"line":54,"column":344}}})) != null ? stack1 : "");
},"213":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"an").call(alias1,((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"lensImplant") : stack1)) != null ? lookupProperty(stack1,"form") : stack1),{"name":"an","hash":{},"data":data,"loc":{"start":{"line":54,"column":62},"end":{"line":54,"column":94}}})) != null ? stack1 : "")
    + " lens"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"known").call(alias1,((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"lensImplant") : stack1)) != null ? lookupProperty(stack1,"powerDioptres") : stack1),{"name":"known","hash":{},"data":data,"loc":{"start":{"line":54,"column":105},"end":{"line":54,"column":147}}}),{"name":"if","hash":{},"fn":container.program(214, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":54,"column":99},"end":{"line":54,"column":207}}})) != null ? stack1 : "")
    + " was implanted"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"lensImplant") : stack1)) != null ? lookupProperty(stack1,"position") : stack1),{"name":"if","hash":{},"fn":container.program(215, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":54,"column":221},"end":{"line":54,"column":337}}})) != null ? stack1 : "");
},"214":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " of "
    + ((stack1 = lookupProperty(helpers,"number").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"lensImplant") : stack1)) != null ? lookupProperty(stack1,"powerDioptres") : stack1),{"name":"number","hash":{},"data":data,"loc":{"start":{"line":54,"column":153},"end":{"line":54,"column":198}}})) != null ? stack1 : "")
    + " D";
},"215":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " "
    + ((stack1 = lookupProperty(helpers,"label").call(depth0 != null ? depth0 : (container.nullContext || {}),"vitreous.lensImplant.position",((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"lensImplant") : stack1)) != null ? lookupProperty(stack1,"position") : stack1),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":54,"column":259},"end":{"line":54,"column":330}}})) != null ? stack1 : "");
},"216":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"drainage") : depth0)) != null ? lookupProperty(stack1,"kind") : stack1),"none",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":55,"column":31},"end":{"line":55,"column":56}}}),{"name":"if","hash":{},"fn":container.program(217, data, 0),"inverse":container.program(218, data, 0),"data":data,"loc":{"start":{"line":55,"column":25},"end":{"line":55,"column":680}}})) != null ? stack1 : "");
},"217":function(container,depth0,helpers,partials,data) {
    return "subretinal fluid was not drained";
},"218":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"drainage") : depth0)) != null ? lookupProperty(stack1,"kind") : stack1),{"name":"if","hash":{},"fn":container.program(219, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":55,"column":98},"end":{"line":55,"column":673}}})) != null ? stack1 : "");
},"219":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "subretinal fluid was drained "
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"drainage") : depth0)) != null ? lookupProperty(stack1,"kind") : stack1),"external",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":55,"column":154},"end":{"line":55,"column":183}}}),{"name":"if","hash":{},"fn":container.program(220, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":55,"column":148},"end":{"line":55,"column":202}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"drainage") : depth0)) != null ? lookupProperty(stack1,"kind") : stack1),"internal",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":55,"column":208},"end":{"line":55,"column":237}}}),{"name":"if","hash":{},"fn":container.program(221, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":55,"column":202},"end":{"line":55,"column":256}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"drainage") : depth0)) != null ? lookupProperty(stack1,"kind") : stack1),"both",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":55,"column":262},"end":{"line":55,"column":287}}}),{"name":"if","hash":{},"fn":container.program(222, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":55,"column":256},"end":{"line":55,"column":321}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"drainage") : depth0)) != null ? lookupProperty(stack1,"externalMethod") : stack1),{"name":"if","hash":{},"fn":container.program(223, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":55,"column":321},"end":{"line":55,"column":422}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"drainage") : depth0)) != null ? lookupProperty(stack1,"internalThrough") : stack1),{"name":"if","hash":{},"fn":container.program(224, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":55,"column":422},"end":{"line":55,"column":531}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"drainage") : depth0)) != null ? lookupProperty(stack1,"clock") : stack1),{"name":"if","hash":{},"fn":container.program(225, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":55,"column":531},"end":{"line":55,"column":588}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"drainage") : depth0)) != null ? lookupProperty(stack1,"outcome") : stack1),{"name":"if","hash":{},"fn":container.program(226, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":55,"column":588},"end":{"line":55,"column":666}}})) != null ? stack1 : "");
},"220":function(container,depth0,helpers,partials,data) {
    return "externally";
},"221":function(container,depth0,helpers,partials,data) {
    return "internally";
},"222":function(container,depth0,helpers,partials,data) {
    return "externally and internally";
},"223":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " by "
    + ((stack1 = lookupProperty(helpers,"label").call(depth0 != null ? depth0 : (container.nullContext || {}),"drainage.externalMethod",((stack1 = (depth0 != null ? lookupProperty(depth0,"drainage") : depth0)) != null ? lookupProperty(stack1,"externalMethod") : stack1),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":55,"column":356},"end":{"line":55,"column":415}}})) != null ? stack1 : "");
},"224":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " through "
    + ((stack1 = lookupProperty(helpers,"label").call(depth0 != null ? depth0 : (container.nullContext || {}),"drainage.internalThrough",((stack1 = (depth0 != null ? lookupProperty(depth0,"drainage") : depth0)) != null ? lookupProperty(stack1,"internalThrough") : stack1),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":55,"column":463},"end":{"line":55,"column":524}}})) != null ? stack1 : "");
},"225":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " at "
    + ((stack1 = lookupProperty(helpers,"clock").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"drainage") : depth0)) != null ? lookupProperty(stack1,"clock") : stack1),{"name":"clock","hash":{},"data":data,"loc":{"start":{"line":55,"column":557},"end":{"line":55,"column":581}}})) != null ? stack1 : "");
},"226":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "; "
    + ((stack1 = lookupProperty(helpers,"label").call(depth0 != null ? depth0 : (container.nullContext || {}),"drainage.outcome",((stack1 = (depth0 != null ? lookupProperty(depth0,"drainage") : depth0)) != null ? lookupProperty(stack1,"outcome") : stack1),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":55,"column":614},"end":{"line":55,"column":659}}})) != null ? stack1 : "");
},"227":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(depth0 != null ? depth0 : (container.nullContext || {}),"no-retinopexy",{"name":"statement","hash":{},"fn":container.program(228, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":56,"column":41},"end":{"line":56,"column":158}}})) != null ? stack1 : "");
},"228":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"retinopexy") : depth0)) != null ? lookupProperty(stack1,"treatments") : stack1),"none",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":56,"column":77},"end":{"line":56,"column":110}}}),{"name":"if","hash":{},"fn":container.program(229, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":56,"column":71},"end":{"line":56,"column":144}}})) != null ? stack1 : "");
},"229":function(container,depth0,helpers,partials,data) {
    return "no retinopexy was applied";
},"230":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"retinopexy") : depth0)) != null ? lookupProperty(stack1,"treatments") : stack1),{"name":"each","hash":{},"fn":container.program(231, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":56,"column":166},"end":{"line":56,"column":884}}})) != null ? stack1 : "");
},"231":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(depth0 != null ? depth0 : (container.nullContext || {}),"retinopexy",(data && lookupProperty(data,"index")),{"name":"statement","hash":{},"fn":container.program(232, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":56,"column":197},"end":{"line":56,"column":875}}})) != null ? stack1 : "");
},"232":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"modality") : depth0),{"name":"if","hash":{},"fn":container.program(233, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":56,"column":231},"end":{"line":56,"column":861}}})) != null ? stack1 : "");
},"233":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"label").call(alias1,"retinopexy.treatments.modality",(depth0 != null ? lookupProperty(depth0,"modality") : depth0),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":56,"column":247},"end":{"line":56,"column":298}}})) != null ? stack1 : "")
    + " was applied"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"targets") : depth0),{"name":"if","hash":{},"fn":container.program(234, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":56,"column":310},"end":{"line":56,"column":499}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"moreThan").call(alias1,(depth0 != null ? lookupProperty(depth0,"rows") : depth0),0,{"name":"moreThan","hash":{},"data":data,"loc":{"start":{"line":56,"column":505},"end":{"line":56,"column":522}}}),{"name":"if","hash":{},"fn":container.program(239, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":56,"column":499},"end":{"line":56,"column":564}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"moreThan").call(alias1,(depth0 != null ? lookupProperty(depth0,"applications") : depth0),0,{"name":"moreThan","hash":{},"data":data,"loc":{"start":{"line":56,"column":570},"end":{"line":56,"column":595}}}),{"name":"if","hash":{},"fn":container.program(240, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":56,"column":564},"end":{"line":56,"column":659}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"endpointFirstWhitening") : depth0),{"name":"if","hash":{},"fn":container.program(241, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":56,"column":659},"end":{"line":56,"column":716}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"powerMilliwatts") : depth0),{"name":"if","hash":{},"fn":container.program(242, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":56,"column":716},"end":{"line":56,"column":854}}})) != null ? stack1 : "");
},"234":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " "
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,(depth0 != null ? lookupProperty(depth0,"targets") : depth0),"all-breaks",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":56,"column":332},"end":{"line":56,"column":357}}}),{"name":"if","hash":{},"fn":container.program(235, data, 0),"inverse":container.program(236, data, 0),"data":data,"loc":{"start":{"line":56,"column":326},"end":{"line":56,"column":492}}})) != null ? stack1 : "");
},"235":function(container,depth0,helpers,partials,data) {
    return "to all breaks";
},"236":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,(depth0 != null ? lookupProperty(depth0,"targets") : depth0),"circumferential",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":56,"column":386},"end":{"line":56,"column":416}}}),{"name":"if","hash":{},"fn":container.program(237, data, 0),"inverse":container.program(238, data, 0),"data":data,"loc":{"start":{"line":56,"column":380},"end":{"line":56,"column":485}}})) != null ? stack1 : "");
},"237":function(container,depth0,helpers,partials,data) {
    return "through 360°";
},"238":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "to "
    + ((stack1 = lookupProperty(helpers,"numbered").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"targets") : depth0),"break","breaks",{"name":"numbered","hash":{},"data":data,"loc":{"start":{"line":56,"column":441},"end":{"line":56,"column":478}}})) != null ? stack1 : "");
},"239":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " in "
    + ((stack1 = lookupProperty(helpers,"countOf").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"rows") : depth0),"row","rows",{"name":"countOf","hash":{},"data":data,"loc":{"start":{"line":56,"column":528},"end":{"line":56,"column":557}}})) != null ? stack1 : "");
},"240":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", "
    + ((stack1 = lookupProperty(helpers,"countOf").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"applications") : depth0),"application","applications",{"name":"countOf","hash":{},"data":data,"loc":{"start":{"line":56,"column":599},"end":{"line":56,"column":652}}})) != null ? stack1 : "");
},"241":function(container,depth0,helpers,partials,data) {
    return ", to first whitening";
},"242":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", at "
    + ((stack1 = lookupProperty(helpers,"number").call(alias1,(depth0 != null ? lookupProperty(depth0,"powerMilliwatts") : depth0),{"name":"number","hash":{},"data":data,"loc":{"start":{"line":56,"column":744},"end":{"line":56,"column":770}}})) != null ? stack1 : "")
    + " mW"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"durationMilliseconds") : depth0),{"name":"if","hash":{},"fn":container.program(243, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":56,"column":773},"end":{"line":56,"column":847}}})) != null ? stack1 : "");
},"243":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " for "
    + ((stack1 = lookupProperty(helpers,"number").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"durationMilliseconds") : depth0),{"name":"number","hash":{},"data":data,"loc":{"start":{"line":56,"column":806},"end":{"line":56,"column":837}}})) != null ? stack1 : "")
    + " ms";
},"244":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"agent") : stack1),"none",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":57,"column":32},"end":{"line":57,"column":59}}}),{"name":"if","hash":{},"fn":container.program(245, data, 0),"inverse":container.program(246, data, 0),"data":data,"loc":{"start":{"line":57,"column":26},"end":{"line":57,"column":1084}}})) != null ? stack1 : "");
},"245":function(container,depth0,helpers,partials,data) {
    return "no tamponade was left in the eye";
},"246":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"agent") : stack1),{"name":"if","hash":{},"fn":container.program(247, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":57,"column":101},"end":{"line":57,"column":1077}}})) != null ? stack1 : "");
},"247":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"isNot").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"concentrationPercent") : stack1),"not-applicable",{"name":"isNot","hash":{},"data":data,"loc":{"start":{"line":57,"column":130},"end":{"line":57,"column":185}}}),{"name":"if","hash":{},"fn":container.program(248, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":57,"column":124},"end":{"line":57,"column":282}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"mixing") : stack1),"pure",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":57,"column":288},"end":{"line":57,"column":316}}}),{"name":"if","hash":{},"fn":container.program(250, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":57,"column":282},"end":{"line":57,"column":330}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"label").call(alias1,"tamponade.agent",((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"agent") : stack1),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":57,"column":330},"end":{"line":57,"column":373}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"moreThan").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"viscosityCentistokes") : stack1),0,{"name":"moreThan","hash":{},"data":data,"loc":{"start":{"line":57,"column":379},"end":{"line":57,"column":422}}}),{"name":"if","hash":{},"fn":container.program(251, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":57,"column":373},"end":{"line":57,"column":473}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"all").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"pureMl") : stack1),((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"syringeMl") : stack1),{"name":"all","hash":{},"data":data,"loc":{"start":{"line":57,"column":479},"end":{"line":57,"column":521}}}),{"name":"if","hash":{},"fn":container.program(252, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":57,"column":473},"end":{"line":57,"column":600}}})) != null ? stack1 : "")
    + " was "
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"exchange") : stack1),"injection",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":57,"column":611},"end":{"line":57,"column":646}}}),{"name":"if","hash":{},"fn":container.program(253, data, 0),"inverse":container.program(254, data, 0),"data":data,"loc":{"start":{"line":57,"column":605},"end":{"line":57,"column":686}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"volumeMl") : stack1),{"name":"if","hash":{},"fn":container.program(255, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":57,"column":686},"end":{"line":57,"column":753}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"fillPercent") : stack1),{"name":"if","hash":{},"fn":container.program(256, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":57,"column":753},"end":{"line":57,"column":846}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"exchange") : stack1),{"name":"if","hash":{},"fn":container.program(257, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":57,"column":846},"end":{"line":57,"column":991}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"injectedAtClock") : stack1),{"name":"if","hash":{},"fn":container.program(259, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":57,"column":991},"end":{"line":57,"column":1070}}})) != null ? stack1 : "");
},"248":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"concentrationPercent") : stack1),{"name":"if","hash":{},"fn":container.program(249, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":57,"column":187},"end":{"line":57,"column":275}}})) != null ? stack1 : "");
},"249":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"number").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"concentrationPercent") : stack1),{"name":"number","hash":{},"data":data,"loc":{"start":{"line":57,"column":225},"end":{"line":57,"column":266}}})) != null ? stack1 : "")
    + "% ";
},"250":function(container,depth0,helpers,partials,data) {
    return "pure ";
},"251":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " of "
    + ((stack1 = container.lambda(((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"viscosityCentistokes") : stack1), depth0)) != null ? stack1 : "")
    + " cSt";
},"252":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " ("
    + ((stack1 = lookupProperty(helpers,"number").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"pureMl") : stack1),{"name":"number","hash":{},"data":data,"loc":{"start":{"line":57,"column":525},"end":{"line":57,"column":552}}})) != null ? stack1 : "")
    + " mL in "
    + ((stack1 = lookupProperty(helpers,"number").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"syringeMl") : stack1),{"name":"number","hash":{},"data":data,"loc":{"start":{"line":57,"column":559},"end":{"line":57,"column":589}}})) != null ? stack1 : "")
    + " mL)";
},"253":function(container,depth0,helpers,partials,data) {
    return "injected";
},"254":function(container,depth0,helpers,partials,data) {
    return "left in the eye";
},"255":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", "
    + ((stack1 = lookupProperty(helpers,"number").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"volumeMl") : stack1),{"name":"number","hash":{},"data":data,"loc":{"start":{"line":57,"column":714},"end":{"line":57,"column":743}}})) != null ? stack1 : "")
    + " mL";
},"256":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", filling "
    + ((stack1 = lookupProperty(helpers,"number").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"fillPercent") : stack1),{"name":"number","hash":{},"data":data,"loc":{"start":{"line":57,"column":792},"end":{"line":57,"column":824}}})) != null ? stack1 : "")
    + "% of the cavity";
},"257":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"unless").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"exchange") : stack1),"injection",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":57,"column":882},"end":{"line":57,"column":917}}}),{"name":"unless","hash":{},"fn":container.program(258, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":57,"column":872},"end":{"line":57,"column":984}}})) != null ? stack1 : "");
},"258":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", by "
    + ((stack1 = lookupProperty(helpers,"label").call(depth0 != null ? depth0 : (container.nullContext || {}),"tamponade.exchange",((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"exchange") : stack1),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":57,"column":924},"end":{"line":57,"column":973}}})) != null ? stack1 : "");
},"259":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " at "
    + ((stack1 = lookupProperty(helpers,"clock").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"injectedAtClock") : stack1),{"name":"clock","hash":{},"data":data,"loc":{"start":{"line":57,"column":1028},"end":{"line":57,"column":1063}}})) != null ? stack1 : "");
},"260":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"paracentesis") : stack1),{"name":"if","hash":{},"fn":container.program(261, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":58,"column":29},"end":{"line":58,"column":182}}})) != null ? stack1 : "");
},"261":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "a paracentesis was made"
    + ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"paracentesisVolumeMl") : stack1),{"name":"if","hash":{},"fn":container.program(262, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":58,"column":82},"end":{"line":58,"column":175}}})) != null ? stack1 : "");
},"262":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " of "
    + ((stack1 = lookupProperty(helpers,"number").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"paracentesisVolumeMl") : stack1),{"name":"number","hash":{},"data":data,"loc":{"start":{"line":58,"column":124},"end":{"line":58,"column":165}}})) != null ? stack1 : "")
    + " mL";
},"263":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"any").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"iridectomy") : stack1),"inferior",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":59,"column":38},"end":{"line":59,"column":74}}}),lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"iridectomy") : stack1),"superior",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":59,"column":75},"end":{"line":59,"column":111}}}),{"name":"any","hash":{},"data":data,"loc":{"start":{"line":59,"column":33},"end":{"line":59,"column":112}}}),{"name":"if","hash":{},"fn":container.program(264, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":59,"column":27},"end":{"line":59,"column":179}}})) != null ? stack1 : "");
},"264":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"an").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"iridectomy") : stack1),{"name":"an","hash":{},"data":data,"loc":{"start":{"line":59,"column":114},"end":{"line":59,"column":141}}})) != null ? stack1 : "")
    + " peripheral iridectomy was made";
},"265":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"sclerotomyClosure") : stack1),{"name":"if","hash":{},"fn":container.program(266, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":60,"column":24},"end":{"line":60,"column":339}}})) != null ? stack1 : "");
},"266":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"sclerotomyClosure") : stack1),"sutureless",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":60,"column":64},"end":{"line":60,"column":108}}}),{"name":"if","hash":{},"fn":container.program(267, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":60,"column":58},"end":{"line":60,"column":156}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"sclerotomyClosure") : stack1),"sutured",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":60,"column":162},"end":{"line":60,"column":203}}}),{"name":"if","hash":{},"fn":container.program(268, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":60,"column":156},"end":{"line":60,"column":241}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"sclerotomyClosure") : stack1),"some-sutured",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":60,"column":247},"end":{"line":60,"column":293}}}),{"name":"if","hash":{},"fn":container.program(269, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":60,"column":241},"end":{"line":60,"column":332}}})) != null ? stack1 : "");
},"267":function(container,depth0,helpers,partials,data) {
    return "the sclerotomies closed without sutures";
},"268":function(container,depth0,helpers,partials,data) {
    return "the sclerotomies were sutured";
},"269":function(container,depth0,helpers,partials,data) {
    return "some sclerotomies were sutured";
},"270":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"isNot").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"buckle") : depth0)) != null ? lookupProperty(stack1,"conjunctivalClosure") : stack1),"not-applicable",{"name":"isNot","hash":{},"data":data,"loc":{"start":{"line":61,"column":34},"end":{"line":61,"column":85}}}),{"name":"if","hash":{},"fn":container.program(271, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":61,"column":28},"end":{"line":61,"column":191}}})) != null ? stack1 : "");
},"271":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "the conjunctiva was closed with "
    + ((stack1 = lookupProperty(helpers,"label").call(depth0 != null ? depth0 : (container.nullContext || {}),"buckle.conjunctivalClosure",((stack1 = (depth0 != null ? lookupProperty(depth0,"buckle") : depth0)) != null ? lookupProperty(stack1,"conjunctivalClosure") : stack1),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":61,"column":119},"end":{"line":61,"column":184}}})) != null ? stack1 : "");
},"272":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"extraSteps") : stack1),{"name":"if","hash":{},"fn":container.program(273, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":62,"column":22},"end":{"line":62,"column":94}}})) != null ? stack1 : "");
},"273":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "extra steps: "
    + ((stack1 = container.lambda(((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"extraSteps") : stack1), depth0)) != null ? stack1 : "");
},"274":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(alias1,"retina",{"name":"statement","hash":{},"fn":container.program(275, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":65,"column":0},"end":{"line":65,"column":284}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"closed",{"name":"statement","hash":{},"fn":container.program(280, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":66,"column":0},"end":{"line":66,"column":250}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"disc",{"name":"statement","hash":{},"fn":container.program(284, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":67,"column":0},"end":{"line":67,"column":182}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"pressure",{"name":"statement","hash":{},"fn":container.program(288, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":68,"column":0},"end":{"line":68,"column":231}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"complications") : stack1),"none",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":69,"column":6},"end":{"line":69,"column":41}}}),{"name":"if","hash":{},"fn":container.program(291, data, 0),"inverse":container.program(294, data, 0),"data":data,"loc":{"start":{"line":69,"column":0},"end":{"line":69,"column":480}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"blood-loss",{"name":"statement","hash":{},"fn":container.program(302, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":70,"column":0},"end":{"line":70,"column":333}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"specimens") : stack1),"none",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":71,"column":6},"end":{"line":71,"column":37}}}),{"name":"if","hash":{},"fn":container.program(308, data, 0),"inverse":container.program(311, data, 0),"data":data,"loc":{"start":{"line":71,"column":0},"end":{"line":71,"column":327}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"tissue",{"name":"statement","hash":{},"fn":container.program(316, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":72,"column":0},"end":{"line":72,"column":208}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"counts",{"name":"statement","hash":{},"fn":container.program(320, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":73,"column":0},"end":{"line":73,"column":382}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"medicines") : stack1),"none",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":74,"column":6},"end":{"line":74,"column":37}}}),{"name":"if","hash":{},"fn":container.program(325, data, 0),"inverse":container.program(328, data, 0),"data":data,"loc":{"start":{"line":74,"column":0},"end":{"line":74,"column":442}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"thrombosis",{"name":"statement","hash":{},"fn":container.program(335, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":75,"column":0},"end":{"line":75,"column":326}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"shield",{"name":"statement","hash":{},"fn":container.program(339, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":76,"column":0},"end":{"line":76,"column":99}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"remarks",{"name":"statement","hash":{},"fn":container.program(341, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":77,"column":0},"end":{"line":77,"column":91}}})) != null ? stack1 : "")
    + "\n";
},"275":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"retina") : stack1),{"name":"if","hash":{},"fn":container.program(276, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":65,"column":23},"end":{"line":65,"column":270}}})) != null ? stack1 : "");
},"276":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"retina") : stack1),"fluid-left",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":65,"column":53},"end":{"line":65,"column":87}}}),{"name":"if","hash":{},"fn":container.program(277, data, 0),"inverse":container.program(279, data, 0),"data":data,"loc":{"start":{"line":65,"column":47},"end":{"line":65,"column":263}}})) != null ? stack1 : "");
},"277":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "some subretinal fluid was left"
    + ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"fluidLeftWhere") : stack1),{"name":"if","hash":{},"fn":container.program(278, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":65,"column":119},"end":{"line":65,"column":188}}})) != null ? stack1 : "");
},"278":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ": "
    + ((stack1 = container.lambda(((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"fluidLeftWhere") : stack1), depth0)) != null ? stack1 : "");
},"279":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "the retina was "
    + ((stack1 = lookupProperty(helpers,"label").call(depth0 != null ? depth0 : (container.nullContext || {}),"endOfCase.retina",((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"retina") : stack1),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":65,"column":211},"end":{"line":65,"column":256}}})) != null ? stack1 : "");
},"280":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"breaksClosed") : stack1),"all",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":66,"column":29},"end":{"line":66,"column":62}}}),{"name":"if","hash":{},"fn":container.program(281, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":66,"column":23},"end":{"line":66,"column":93}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"breaksClosed") : stack1),"some",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":66,"column":99},"end":{"line":66,"column":133}}}),{"name":"if","hash":{},"fn":container.program(282, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":66,"column":93},"end":{"line":66,"column":168}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"breaksClosed") : stack1),"none",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":66,"column":174},"end":{"line":66,"column":208}}}),{"name":"if","hash":{},"fn":container.program(283, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":66,"column":168},"end":{"line":66,"column":236}}})) != null ? stack1 : "");
},"281":function(container,depth0,helpers,partials,data) {
    return "every break was closed";
},"282":function(container,depth0,helpers,partials,data) {
    return "not every break was closed";
},"283":function(container,depth0,helpers,partials,data) {
    return "no break was closed";
},"284":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"discPerfused") : stack1),{"name":"if","hash":{},"fn":container.program(285, data, 0),"inverse":container.program(286, data, 0),"data":data,"loc":{"start":{"line":67,"column":21},"end":{"line":67,"column":168}}})) != null ? stack1 : "");
},"285":function(container,depth0,helpers,partials,data) {
    return "the optic disc was perfused";
},"286":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"isNo").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"discPerfused") : stack1),{"name":"isNo","hash":{},"data":data,"loc":{"start":{"line":67,"column":92},"end":{"line":67,"column":121}}}),{"name":"if","hash":{},"fn":container.program(287, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":67,"column":86},"end":{"line":67,"column":161}}})) != null ? stack1 : "");
},"287":function(container,depth0,helpers,partials,data) {
    return "the optic disc was not perfused";
},"288":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"known").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"pressureMmHg") : stack1),{"name":"known","hash":{},"data":data,"loc":{"start":{"line":68,"column":31},"end":{"line":68,"column":61}}}),{"name":"if","hash":{},"fn":container.program(289, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":68,"column":25},"end":{"line":68,"column":217}}})) != null ? stack1 : "");
},"289":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "the pressure was "
    + ((stack1 = lookupProperty(helpers,"number").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"pressureMmHg") : stack1),{"name":"number","hash":{},"data":data,"loc":{"start":{"line":68,"column":80},"end":{"line":68,"column":113}}})) != null ? stack1 : "")
    + " mmHg"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"pressureBy") : stack1),{"name":"if","hash":{},"fn":container.program(290, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":68,"column":118},"end":{"line":68,"column":210}}})) != null ? stack1 : "");
},"290":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " by "
    + ((stack1 = lookupProperty(helpers,"label").call(depth0 != null ? depth0 : (container.nullContext || {}),"endOfCase.pressureBy",((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"pressureBy") : stack1),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":68,"column":150},"end":{"line":68,"column":203}}})) != null ? stack1 : "");
},"291":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(depth0 != null ? depth0 : (container.nullContext || {}),"no-complication",{"name":"statement","hash":{},"fn":container.program(292, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":69,"column":43},"end":{"line":69,"column":166}}})) != null ? stack1 : "");
},"292":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"complications") : stack1),"none",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":69,"column":81},"end":{"line":69,"column":116}}}),{"name":"if","hash":{},"fn":container.program(293, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":69,"column":75},"end":{"line":69,"column":152}}})) != null ? stack1 : "");
},"293":function(container,depth0,helpers,partials,data) {
    return "there were no complications";
},"294":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"complications") : stack1),{"name":"each","hash":{},"fn":container.program(295, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":69,"column":174},"end":{"line":69,"column":473}}})) != null ? stack1 : "");
},"295":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(depth0 != null ? depth0 : (container.nullContext || {}),"complication",(data && lookupProperty(data,"index")),{"name":"statement","hash":{},"fn":container.program(296, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":69,"column":207},"end":{"line":69,"column":464}}})) != null ? stack1 : "");
},"296":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"any").call(alias1,(depth0 != null ? lookupProperty(depth0,"kind") : depth0),(depth0 != null ? lookupProperty(depth0,"detail") : depth0),{"name":"any","hash":{},"data":data,"loc":{"start":{"line":69,"column":249},"end":{"line":69,"column":266}}}),{"name":"if","hash":{},"fn":container.program(297, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":69,"column":243},"end":{"line":69,"column":450}}})) != null ? stack1 : "");
},"297":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "complication: "
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,(depth0 != null ? lookupProperty(depth0,"kind") : depth0),"other",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":69,"column":288},"end":{"line":69,"column":305}}}),{"name":"if","hash":{},"fn":container.program(298, data, 0),"inverse":container.program(299, data, 0),"data":data,"loc":{"start":{"line":69,"column":282},"end":{"line":69,"column":410}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"action") : depth0),{"name":"if","hash":{},"fn":container.program(301, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":69,"column":410},"end":{"line":69,"column":443}}})) != null ? stack1 : "");
},"298":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.lambda((depth0 != null ? lookupProperty(depth0,"detail") : depth0), depth0)) != null ? stack1 : "");
},"299":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"label").call(alias1,"endOfCase.complications.kind",(depth0 != null ? lookupProperty(depth0,"kind") : depth0),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":69,"column":325},"end":{"line":69,"column":370}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"detail") : depth0),{"name":"if","hash":{},"fn":container.program(300, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":69,"column":370},"end":{"line":69,"column":403}}})) != null ? stack1 : "");
},"300":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", "
    + ((stack1 = container.lambda((depth0 != null ? lookupProperty(depth0,"detail") : depth0), depth0)) != null ? stack1 : "");
},"301":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "; "
    + ((stack1 = container.lambda((depth0 != null ? lookupProperty(depth0,"action") : depth0), depth0)) != null ? stack1 : "");
},"302":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"bloodLoss") : stack1),"measured",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":70,"column":33},"end":{"line":70,"column":68}}}),{"name":"if","hash":{},"fn":container.program(303, data, 0),"inverse":container.program(305, data, 0),"data":data,"loc":{"start":{"line":70,"column":27},"end":{"line":70,"column":319}}})) != null ? stack1 : "");
},"303":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"known").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"bloodLossMl") : stack1),{"name":"known","hash":{},"data":data,"loc":{"start":{"line":70,"column":76},"end":{"line":70,"column":105}}}),{"name":"if","hash":{},"fn":container.program(304, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":70,"column":70},"end":{"line":70,"column":164}}})) != null ? stack1 : "");
},"304":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "blood loss was "
    + ((stack1 = lookupProperty(helpers,"number").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"bloodLossMl") : stack1),{"name":"number","hash":{},"data":data,"loc":{"start":{"line":70,"column":122},"end":{"line":70,"column":154}}})) != null ? stack1 : "")
    + " mL";
},"305":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"bloodLoss") : stack1),"none",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":70,"column":178},"end":{"line":70,"column":209}}}),{"name":"if","hash":{},"fn":container.program(306, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":70,"column":172},"end":{"line":70,"column":241}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"bloodLoss") : stack1),"minimal",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":70,"column":247},"end":{"line":70,"column":281}}}),{"name":"if","hash":{},"fn":container.program(307, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":70,"column":241},"end":{"line":70,"column":312}}})) != null ? stack1 : "");
},"306":function(container,depth0,helpers,partials,data) {
    return "there was no blood loss";
},"307":function(container,depth0,helpers,partials,data) {
    return "blood loss was minimal";
},"308":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(depth0 != null ? depth0 : (container.nullContext || {}),"no-specimen",{"name":"statement","hash":{},"fn":container.program(309, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":71,"column":39},"end":{"line":71,"column":150}}})) != null ? stack1 : "");
},"309":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"specimens") : stack1),"none",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":71,"column":73},"end":{"line":71,"column":104}}}),{"name":"if","hash":{},"fn":container.program(310, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":71,"column":67},"end":{"line":71,"column":136}}})) != null ? stack1 : "");
},"310":function(container,depth0,helpers,partials,data) {
    return "there were no specimens";
},"311":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"specimens") : stack1),{"name":"each","hash":{},"fn":container.program(312, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":71,"column":158},"end":{"line":71,"column":320}}})) != null ? stack1 : "");
},"312":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(depth0 != null ? depth0 : (container.nullContext || {}),"specimen",(data && lookupProperty(data,"index")),{"name":"statement","hash":{},"fn":container.program(313, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":71,"column":187},"end":{"line":71,"column":311}}})) != null ? stack1 : "");
},"313":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"what") : depth0),{"name":"if","hash":{},"fn":container.program(314, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":71,"column":219},"end":{"line":71,"column":297}}})) != null ? stack1 : "");
},"314":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "specimen: "
    + ((stack1 = container.lambda((depth0 != null ? lookupProperty(depth0,"what") : depth0), depth0)) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"sentTo") : depth0),{"name":"if","hash":{},"fn":container.program(315, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":71,"column":249},"end":{"line":71,"column":290}}})) != null ? stack1 : "");
},"315":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", sent to "
    + ((stack1 = container.lambda((depth0 != null ? lookupProperty(depth0,"sentTo") : depth0), depth0)) != null ? stack1 : "");
},"316":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"includes").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"tissue") : stack1),"none",{"name":"includes","hash":{},"data":data,"loc":{"start":{"line":72,"column":29},"end":{"line":72,"column":63}}}),{"name":"if","hash":{},"fn":container.program(317, data, 0),"inverse":container.program(318, data, 0),"data":data,"loc":{"start":{"line":72,"column":23},"end":{"line":72,"column":194}}})) != null ? stack1 : "");
},"317":function(container,depth0,helpers,partials,data) {
    return "no tissue was removed";
},"318":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"tissue") : stack1),{"name":"if","hash":{},"fn":container.program(319, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":72,"column":94},"end":{"line":72,"column":187}}})) != null ? stack1 : "");
},"319":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "tissue removed: "
    + ((stack1 = lookupProperty(helpers,"labels").call(depth0 != null ? depth0 : (container.nullContext || {}),"endOfCase.tissue",((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"tissue") : stack1),{"name":"labels","hash":{},"data":data,"loc":{"start":{"line":72,"column":134},"end":{"line":72,"column":180}}})) != null ? stack1 : "");
},"320":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"counts") : stack1),"correct",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":73,"column":29},"end":{"line":73,"column":60}}}),{"name":"if","hash":{},"fn":container.program(321, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":73,"column":23},"end":{"line":73,"column":92}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"counts") : stack1),"discrepancy",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":73,"column":98},"end":{"line":73,"column":133}}}),{"name":"if","hash":{},"fn":container.program(322, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":73,"column":92},"end":{"line":73,"column":240}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"counts") : stack1),"not-done",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":73,"column":246},"end":{"line":73,"column":278}}}),{"name":"if","hash":{},"fn":container.program(324, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":73,"column":240},"end":{"line":73,"column":368}}})) != null ? stack1 : "");
},"321":function(container,depth0,helpers,partials,data) {
    return "the counts were correct";
},"322":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "there was a discrepancy in the counts"
    + ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"countsNote") : stack1),{"name":"if","hash":{},"fn":container.program(323, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":73,"column":172},"end":{"line":73,"column":233}}})) != null ? stack1 : "");
},"323":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ": "
    + ((stack1 = container.lambda(((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"countsNote") : stack1), depth0)) != null ? stack1 : "");
},"324":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "counts were not done"
    + ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"countsNote") : stack1),{"name":"if","hash":{},"fn":container.program(323, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":73,"column":300},"end":{"line":73,"column":361}}})) != null ? stack1 : "");
},"325":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(depth0 != null ? depth0 : (container.nullContext || {}),"no-medicine",{"name":"statement","hash":{},"fn":container.program(326, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":74,"column":39},"end":{"line":74,"column":159}}})) != null ? stack1 : "");
},"326":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"medicines") : stack1),"none",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":74,"column":73},"end":{"line":74,"column":104}}}),{"name":"if","hash":{},"fn":container.program(327, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":74,"column":67},"end":{"line":74,"column":145}}})) != null ? stack1 : "");
},"327":function(container,depth0,helpers,partials,data) {
    return "no medicine was given at the end";
},"328":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"medicines") : stack1),{"name":"each","hash":{},"fn":container.program(329, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":74,"column":167},"end":{"line":74,"column":435}}})) != null ? stack1 : "");
},"329":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(depth0 != null ? depth0 : (container.nullContext || {}),"medicine",(data && lookupProperty(data,"index")),{"name":"statement","hash":{},"fn":container.program(330, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":74,"column":196},"end":{"line":74,"column":426}}})) != null ? stack1 : "");
},"330":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"drug") : depth0),{"name":"if","hash":{},"fn":container.program(331, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":74,"column":228},"end":{"line":74,"column":412}}})) != null ? stack1 : "");
},"331":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.lambda((depth0 != null ? lookupProperty(depth0,"drug") : depth0), depth0)) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"dose") : depth0),{"name":"if","hash":{},"fn":container.program(332, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":74,"column":248},"end":{"line":74,"column":276}}})) != null ? stack1 : "")
    + " was given"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"route") : depth0),{"name":"if","hash":{},"fn":container.program(333, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":74,"column":286},"end":{"line":74,"column":363}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"givenAt") : depth0),{"name":"if","hash":{},"fn":container.program(334, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":74,"column":363},"end":{"line":74,"column":405}}})) != null ? stack1 : "");
},"332":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " "
    + ((stack1 = container.lambda((depth0 != null ? lookupProperty(depth0,"dose") : depth0), depth0)) != null ? stack1 : "");
},"333":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " by the "
    + ((stack1 = lookupProperty(helpers,"label").call(depth0 != null ? depth0 : (container.nullContext || {}),"endOfCase.medicines.route",(depth0 != null ? lookupProperty(depth0,"route") : depth0),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":74,"column":307},"end":{"line":74,"column":350}}})) != null ? stack1 : "")
    + " route";
},"334":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " at "
    + ((stack1 = lookupProperty(helpers,"time").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"givenAt") : depth0),{"name":"time","hash":{},"data":data,"loc":{"start":{"line":74,"column":382},"end":{"line":74,"column":398}}})) != null ? stack1 : "");
},"335":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"thrombosisProphylaxis") : stack1),{"name":"if","hash":{},"fn":container.program(336, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":75,"column":27},"end":{"line":75,"column":312}}})) != null ? stack1 : "");
},"336":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"thrombosisProphylaxis") : stack1),"not-indicated",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":75,"column":72},"end":{"line":75,"column":124}}}),{"name":"if","hash":{},"fn":container.program(337, data, 0),"inverse":container.program(338, data, 0),"data":data,"loc":{"start":{"line":75,"column":66},"end":{"line":75,"column":305}}})) != null ? stack1 : "");
},"337":function(container,depth0,helpers,partials,data) {
    return "the risk of thrombosis was assessed and no prophylaxis was needed";
},"338":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "thrombosis prophylaxis: "
    + ((stack1 = lookupProperty(helpers,"label").call(depth0 != null ? depth0 : (container.nullContext || {}),"endOfCase.thrombosisProphylaxis",((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"thrombosisProphylaxis") : stack1),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":75,"column":223},"end":{"line":75,"column":298}}})) != null ? stack1 : "");
},"339":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"shield") : stack1),{"name":"if","hash":{},"fn":container.program(340, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":76,"column":23},"end":{"line":76,"column":85}}})) != null ? stack1 : "");
},"340":function(container,depth0,helpers,partials,data) {
    return "the eye was padded and shielded";
},"341":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"remarks") : stack1),{"name":"if","hash":{},"fn":container.program(342, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":77,"column":24},"end":{"line":77,"column":77}}})) != null ? stack1 : "");
},"342":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.lambda(((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"remarks") : stack1), depth0)) != null ? stack1 : "");
},"343":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.invokePartial(lookupProperty(partials,"posture"),depth0,{"name":"posture","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "")
    + ((stack1 = container.invokePartial(lookupProperty(partials,"gas-advice"),depth0,{"name":"gas-advice","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "")
    + ((stack1 = container.invokePartial(lookupProperty(partials,"courses"),depth0,{"name":"courses","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"shield-nights",{"name":"statement","hash":{},"fn":container.program(344, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":83,"column":0},"end":{"line":83,"column":165}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"activity",{"name":"statement","hash":{},"fn":container.program(346, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":84,"column":0},"end":{"line":84,"column":104}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"driving",{"name":"statement","hash":{},"fn":container.program(348, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":85,"column":0},"end":{"line":85,"column":126}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"warnings",{"name":"statement","hash":{},"fn":container.program(350, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":86,"column":0},"end":{"line":86,"column":167}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = container.invokePartial(lookupProperty(partials,"review"),depth0,{"name":"review","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"refraction",{"name":"statement","hash":{},"fn":container.program(352, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":88,"column":0},"end":{"line":88,"column":126}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"goes-to",{"name":"statement","hash":{},"fn":container.program(354, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":89,"column":0},"end":{"line":89,"column":192}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"note",{"name":"statement","hash":{},"fn":container.program(358, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":90,"column":0},"end":{"line":90,"column":82}}})) != null ? stack1 : "")
    + "\n";
},"344":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"moreThan").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"shieldNights") : stack1),0,{"name":"moreThan","hash":{},"data":data,"loc":{"start":{"line":83,"column":36},"end":{"line":83,"column":71}}}),{"name":"if","hash":{},"fn":container.program(345, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":83,"column":30},"end":{"line":83,"column":151}}})) != null ? stack1 : "");
},"345":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "shield at night for "
    + ((stack1 = lookupProperty(helpers,"countOf").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"shieldNights") : stack1),"night","nights",{"name":"countOf","hash":{},"data":data,"loc":{"start":{"line":83,"column":93},"end":{"line":83,"column":144}}})) != null ? stack1 : "");
},"346":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"activity") : stack1),{"name":"if","hash":{},"fn":container.program(347, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":84,"column":25},"end":{"line":84,"column":90}}})) != null ? stack1 : "");
},"347":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "activity: "
    + ((stack1 = container.lambda(((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"activity") : stack1), depth0)) != null ? stack1 : "");
},"348":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"driving") : stack1),{"name":"if","hash":{},"fn":container.program(349, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":85,"column":24},"end":{"line":85,"column":112}}})) != null ? stack1 : "");
},"349":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "driving: "
    + ((stack1 = lookupProperty(helpers,"label").call(depth0 != null ? depth0 : (container.nullContext || {}),"aftercare.driving",((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"driving") : stack1),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":85,"column":58},"end":{"line":85,"column":105}}})) != null ? stack1 : "");
},"350":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"warningSigns") : stack1),{"name":"if","hash":{},"fn":container.program(351, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":86,"column":25},"end":{"line":86,"column":153}}})) != null ? stack1 : "");
},"351":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "warned to come back at once with "
    + ((stack1 = lookupProperty(helpers,"either").call(depth0 != null ? depth0 : (container.nullContext || {}),"aftercare.warningSigns",((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"warningSigns") : stack1),{"name":"either","hash":{},"data":data,"loc":{"start":{"line":86,"column":88},"end":{"line":86,"column":146}}})) != null ? stack1 : "");
},"352":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"refractiveChangeTold") : stack1),{"name":"if","hash":{},"fn":container.program(353, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":88,"column":27},"end":{"line":88,"column":112}}})) != null ? stack1 : "");
},"353":function(container,depth0,helpers,partials,data) {
    return "told that glasses are expected to change";
},"354":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"goesTo") : stack1),{"name":"if","hash":{},"fn":container.program(355, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":89,"column":24},"end":{"line":89,"column":178}}})) != null ? stack1 : "");
},"355":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "goes to "
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"goesTo") : stack1),"home",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":89,"column":62},"end":{"line":89,"column":90}}}),{"name":"if","hash":{},"fn":container.program(356, data, 0),"inverse":container.program(357, data, 0),"data":data,"loc":{"start":{"line":89,"column":56},"end":{"line":89,"column":171}}})) != null ? stack1 : "");
},"356":function(container,depth0,helpers,partials,data) {
    return "home after recovery";
},"357":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"label").call(depth0 != null ? depth0 : (container.nullContext || {}),"aftercare.goesTo",((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"goesTo") : stack1),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":89,"column":119},"end":{"line":89,"column":164}}})) != null ? stack1 : "");
},"358":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"note") : stack1),{"name":"if","hash":{},"fn":container.program(359, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":90,"column":21},"end":{"line":90,"column":68}}})) != null ? stack1 : "");
},"359":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.lambda(((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"note") : stack1), depth0)) != null ? stack1 : "");
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"section").call(alias1,"operation","Operation",{"name":"section","hash":{},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":6,"column":12}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"section").call(alias1,"team","Team",{"name":"section","hash":{},"fn":container.program(15, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":7,"column":0},"end":{"line":13,"column":12}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"section").call(alias1,"diagnosis","Diagnosis",{"name":"section","hash":{},"fn":container.program(37, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":14,"column":0},"end":{"line":19,"column":12}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"section").call(alias1,"anaesthesia","Anaesthesia",{"name":"section","hash":{},"fn":container.program(51, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":20,"column":0},"end":{"line":25,"column":12}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"section").call(alias1,"findings","Findings",{"name":"section","hash":{},"fn":container.program(71, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":26,"column":0},"end":{"line":37,"column":12}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"section").call(alias1,"technique","Technique",{"name":"section","hash":{},"fn":container.program(129, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":38,"column":0},"end":{"line":63,"column":12}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"section").call(alias1,"end","At the end",{"name":"section","hash":{},"fn":container.program(274, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":64,"column":0},"end":{"line":78,"column":12}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"section").call(alias1,"aftercare","Aftercare",{"name":"section","hash":{},"fn":container.program(343, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":79,"column":0},"end":{"line":91,"column":12}}})) != null ? stack1 : "");
},"usePartial":true,"useData":true},
};
export const letters = {
  "family-doctor": {"0":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(alias1,"dear",{"name":"statement","hash":{},"fn":container.program(1, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":2,"column":0},"end":{"line":2,"column":102}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"opening",{"name":"statement","hash":{},"fn":container.program(3, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":3,"column":0},"end":{"line":3,"column":251}}})) != null ? stack1 : "")
    + "\n";
},"1":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"any").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"eye") : stack1),((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"patient") : stack1)) != null ? lookupProperty(stack1,"familyName") : stack1),{"name":"any","hash":{},"data":data,"loc":{"start":{"line":2,"column":27},"end":{"line":2,"column":63}}}),{"name":"if","hash":{},"fn":container.program(2, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":2,"column":21},"end":{"line":2,"column":88}}})) != null ? stack1 : "");
},"2":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "dear "
    + ((stack1 = container.lambda((depth0 != null ? lookupProperty(depth0,"reader") : depth0), depth0)) != null ? stack1 : "")
    + ",";
},"3":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"patient") : stack1)) != null ? lookupProperty(stack1,"familyName") : stack1),{"name":"if","hash":{},"fn":container.program(4, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":3,"column":24},"end":{"line":3,"column":237}}})) != null ? stack1 : "");
},"4":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "your patient "
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"patient") : stack1)) != null ? lookupProperty(stack1,"givenName") : stack1),{"name":"if","hash":{},"fn":container.program(5, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":3,"column":67},"end":{"line":3,"column":129}}})) != null ? stack1 : "")
    + ((stack1 = container.lambda(((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"patient") : stack1)) != null ? lookupProperty(stack1,"familyName") : stack1), depth0)) != null ? stack1 : "")
    + " had an eye operation"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"startedAt") : stack1),{"name":"if","hash":{},"fn":container.program(6, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":3,"column":176},"end":{"line":3,"column":230}}})) != null ? stack1 : "");
},"5":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.lambda(((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"patient") : stack1)) != null ? lookupProperty(stack1,"givenName") : stack1), depth0)) != null ? stack1 : "")
    + " ";
},"6":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " on "
    + ((stack1 = lookupProperty(helpers,"date").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"startedAt") : stack1),{"name":"date","hash":{},"data":data,"loc":{"start":{"line":3,"column":201},"end":{"line":3,"column":223}}})) != null ? stack1 : "");
},"7":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.invokePartial(lookupProperty(partials,"diagnosis"),depth0,{"name":"diagnosis","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "");
},"8":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.invokePartial(lookupProperty(partials,"procedure"),depth0,{"name":"procedure","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "");
},"9":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(alias1,"continue",{"name":"statement","hash":{},"fn":container.program(10, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":12,"column":0},"end":{"line":12,"column":142}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"referral",{"name":"statement","hash":{},"fn":container.program(12, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":13,"column":0},"end":{"line":13,"column":153}}})) != null ? stack1 : "")
    + "\n";
},"10":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"isList").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"drops") : stack1),{"name":"isList","hash":{},"data":data,"loc":{"start":{"line":12,"column":31},"end":{"line":12,"column":55}}}),{"name":"if","hash":{},"fn":container.program(11, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":12,"column":25},"end":{"line":12,"column":128}}})) != null ? stack1 : "");
},"11":function(container,depth0,helpers,partials,data) {
    return "please go on prescribing the drops below until their course ends";
},"12":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"eye") : stack1),{"name":"if","hash":{},"fn":container.program(13, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":13,"column":25},"end":{"line":13,"column":139}}})) != null ? stack1 : "");
},"13":function(container,depth0,helpers,partials,data) {
    return "please send the patient to us the same day with pain, loss of sight, a new shadow or redness";
},"14":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.invokePartial(lookupProperty(partials,"courses"),depth0,{"name":"courses","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "")
    + ((stack1 = container.invokePartial(lookupProperty(partials,"gas-advice"),depth0,{"name":"gas-advice","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "")
    + ((stack1 = container.invokePartial(lookupProperty(partials,"posture"),depth0,{"name":"posture","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "")
    + ((stack1 = container.invokePartial(lookupProperty(partials,"review"),depth0,{"name":"review","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "");
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"section").call(alias1,"salutation","Salutation",{"name":"section","hash":{},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":4,"column":12}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"section").call(alias1,"diagnosis","Diagnosis",{"name":"section","hash":{},"fn":container.program(7, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":5,"column":0},"end":{"line":7,"column":12}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"section").call(alias1,"procedure","Procedure",{"name":"section","hash":{},"fn":container.program(8, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":8,"column":0},"end":{"line":10,"column":12}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"section").call(alias1,"actions","What we ask of you",{"name":"section","hash":{},"fn":container.program(9, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":11,"column":0},"end":{"line":14,"column":12}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"section").call(alias1,"medicines","Medicines and advice",{"name":"section","hash":{},"fn":container.program(14, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":15,"column":0},"end":{"line":20,"column":12}}})) != null ? stack1 : "");
},"usePartial":true,"useData":true},
  "patient": {"0":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(alias1,"dear",{"name":"statement","hash":{},"fn":container.program(1, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":2,"column":0},"end":{"line":2,"column":102}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"opening",{"name":"statement","hash":{},"fn":container.program(3, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":3,"column":0},"end":{"line":3,"column":158}}})) != null ? stack1 : "")
    + "\n";
},"1":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"any").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"eye") : stack1),((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"patient") : stack1)) != null ? lookupProperty(stack1,"familyName") : stack1),{"name":"any","hash":{},"data":data,"loc":{"start":{"line":2,"column":27},"end":{"line":2,"column":63}}}),{"name":"if","hash":{},"fn":container.program(2, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":2,"column":21},"end":{"line":2,"column":88}}})) != null ? stack1 : "");
},"2":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "dear "
    + ((stack1 = container.lambda((depth0 != null ? lookupProperty(depth0,"reader") : depth0), depth0)) != null ? stack1 : "")
    + ",";
},"3":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"eye") : stack1),{"name":"if","hash":{},"fn":container.program(4, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":3,"column":24},"end":{"line":3,"column":144}}})) != null ? stack1 : "");
},"4":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "you had an operation on your "
    + ((stack1 = container.lambda(((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"eye") : stack1), depth0)) != null ? stack1 : "")
    + " eye"
    + ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"startedAt") : stack1),{"name":"if","hash":{},"fn":container.program(5, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":3,"column":83},"end":{"line":3,"column":137}}})) != null ? stack1 : "");
},"5":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " on "
    + ((stack1 = lookupProperty(helpers,"date").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"startedAt") : stack1),{"name":"date","hash":{},"data":data,"loc":{"start":{"line":3,"column":108},"end":{"line":3,"column":130}}})) != null ? stack1 : "");
},"6":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(alias1,"wrong",{"name":"statement","hash":{},"fn":container.program(7, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":6,"column":0},"end":{"line":6,"column":281}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"band",{"name":"statement","hash":{},"fn":container.program(11, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":7,"column":0},"end":{"line":7,"column":155}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"vitrectomy",{"name":"statement","hash":{},"fn":container.program(13, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":8,"column":0},"end":{"line":8,"column":111}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"retinopexy",{"name":"statement","hash":{},"fn":container.program(15, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":9,"column":0},"end":{"line":9,"column":132}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"outcome",{"name":"statement","hash":{},"fn":container.program(17, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":10,"column":0},"end":{"line":10,"column":234}}})) != null ? stack1 : "")
    + "\n";
},"7":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"diagnosis") : stack1),{"name":"if","hash":{},"fn":container.program(8, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":6,"column":22},"end":{"line":6,"column":267}}})) != null ? stack1 : "");
},"8":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"diagnosis") : stack1),"break-without-detachment",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":6,"column":52},"end":{"line":6,"column":100}}}),{"name":"if","hash":{},"fn":container.program(9, data, 0),"inverse":container.program(10, data, 0),"data":data,"loc":{"start":{"line":6,"column":46},"end":{"line":6,"column":260}}})) != null ? stack1 : "");
},"9":function(container,depth0,helpers,partials,data) {
    return "there was a tear in the retina, the layer at the back of the eye that sees";
},"10":function(container,depth0,helpers,partials,data) {
    return "the retina, the layer at the back of the eye that sees, had come away";
},"11":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"isList").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"buckle") : depth0)) != null ? lookupProperty(stack1,"elements") : stack1),{"name":"isList","hash":{},"data":data,"loc":{"start":{"line":7,"column":27},"end":{"line":7,"column":51}}}),{"name":"if","hash":{},"fn":container.program(12, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":7,"column":21},"end":{"line":7,"column":141}}})) != null ? stack1 : "");
},"12":function(container,depth0,helpers,partials,data) {
    return "we put soft silicone on the outside of the eye to support it; you will not see it";
},"13":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"vitreous") : depth0)) != null ? lookupProperty(stack1,"vitrectomy") : stack1),{"name":"if","hash":{},"fn":container.program(14, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":8,"column":27},"end":{"line":8,"column":97}}})) != null ? stack1 : "");
},"14":function(container,depth0,helpers,partials,data) {
    return "we took out the jelly inside the eye";
},"15":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"isList").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"retinopexy") : depth0)) != null ? lookupProperty(stack1,"treatments") : stack1),{"name":"isList","hash":{},"data":data,"loc":{"start":{"line":9,"column":33},"end":{"line":9,"column":63}}}),{"name":"if","hash":{},"fn":container.program(16, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":9,"column":27},"end":{"line":9,"column":118}}})) != null ? stack1 : "");
},"16":function(container,depth0,helpers,partials,data) {
    return "we sealed the tears so that they scar and hold";
},"17":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"retina") : stack1),"flat",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":10,"column":30},"end":{"line":10,"column":58}}}),{"name":"if","hash":{},"fn":container.program(18, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":10,"column":24},"end":{"line":10,"column":97}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"retina") : stack1),"fluid-left",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":10,"column":103},"end":{"line":10,"column":137}}}),{"name":"if","hash":{},"fn":container.program(19, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":10,"column":97},"end":{"line":10,"column":220}}})) != null ? stack1 : "");
},"18":function(container,depth0,helpers,partials,data) {
    return "at the end the retina lay flat";
},"19":function(container,depth0,helpers,partials,data) {
    return "some fluid is still behind the retina; we expect it to go in the next days";
},"20":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(alias1,"gas",{"name":"statement","hash":{},"fn":container.program(21, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":13,"column":0},"end":{"line":13,"column":309}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"span",{"name":"statement","hash":{},"fn":container.program(25, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":14,"column":0},"end":{"line":14,"column":227}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"flying",{"name":"statement","hash":{},"fn":container.program(27, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":15,"column":0},"end":{"line":15,"column":267}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"anaesthetic",{"name":"statement","hash":{},"fn":container.program(29, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":16,"column":0},"end":{"line":16,"column":342}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"wristband",{"name":"statement","hash":{},"fn":container.program(31, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":17,"column":0},"end":{"line":17,"column":106}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"oil",{"name":"statement","hash":{},"fn":container.program(33, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":18,"column":0},"end":{"line":18,"column":205}}})) != null ? stack1 : "")
    + "\n";
},"21":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"any").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"agent") : stack1),"air",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":13,"column":31},"end":{"line":13,"column":57}}}),lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"agent") : stack1),"SF6",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":13,"column":58},"end":{"line":13,"column":84}}}),lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"agent") : stack1),"C2F6",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":13,"column":85},"end":{"line":13,"column":112}}}),lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"agent") : stack1),"C3F8",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":13,"column":113},"end":{"line":13,"column":140}}}),{"name":"any","hash":{},"data":data,"loc":{"start":{"line":13,"column":26},"end":{"line":13,"column":141}}}),{"name":"if","hash":{},"fn":container.program(22, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":13,"column":20},"end":{"line":13,"column":295}}})) != null ? stack1 : "");
},"22":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "there is a bubble of "
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"agent") : stack1),"air",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":13,"column":170},"end":{"line":13,"column":196}}}),{"name":"if","hash":{},"fn":container.program(23, data, 0),"inverse":container.program(24, data, 0),"data":data,"loc":{"start":{"line":13,"column":164},"end":{"line":13,"column":219}}})) != null ? stack1 : "")
    + " in your eye; it goes by itself, and until then your sight is blurred";
},"23":function(container,depth0,helpers,partials,data) {
    return "air";
},"24":function(container,depth0,helpers,partials,data) {
    return "gas";
},"25":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"gasSpan").call(alias1,(depth0 != null ? lookupProperty(depth0,"tamponade") : depth0),((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"lens") : stack1),{"name":"gasSpan","hash":{},"data":data,"loc":{"start":{"line":14,"column":27},"end":{"line":14,"column":58}}}),{"name":"if","hash":{},"fn":container.program(26, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":14,"column":21},"end":{"line":14,"column":213}}})) != null ? stack1 : "");
},"26":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "how long it lasts differs from eye to eye: "
    + ((stack1 = lookupProperty(helpers,"gasSpan").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"tamponade") : depth0),((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"lens") : stack1),{"name":"gasSpan","hash":{},"data":data,"loc":{"start":{"line":14,"column":103},"end":{"line":14,"column":136}}})) != null ? stack1 : "")
    + " is usual, an estimate, and only an examination shows that it has gone";
},"27":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"any").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"agent") : stack1),"air",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":15,"column":34},"end":{"line":15,"column":60}}}),lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"agent") : stack1),"SF6",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":15,"column":61},"end":{"line":15,"column":87}}}),lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"agent") : stack1),"C2F6",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":15,"column":88},"end":{"line":15,"column":115}}}),lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"agent") : stack1),"C3F8",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":15,"column":116},"end":{"line":15,"column":143}}}),{"name":"any","hash":{},"data":data,"loc":{"start":{"line":15,"column":29},"end":{"line":15,"column":144}}}),{"name":"if","hash":{},"fn":container.program(28, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":15,"column":23},"end":{"line":15,"column":253}}})) != null ? stack1 : "");
},"28":function(container,depth0,helpers,partials,data) {
    return "do not fly and do not travel up mountains until your eye surgeon has confirmed that the gas has gone";
},"29":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"any").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"agent") : stack1),"air",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":16,"column":39},"end":{"line":16,"column":65}}}),lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"agent") : stack1),"SF6",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":16,"column":66},"end":{"line":16,"column":92}}}),lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"agent") : stack1),"C2F6",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":16,"column":93},"end":{"line":16,"column":120}}}),lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"agent") : stack1),"C3F8",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":16,"column":121},"end":{"line":16,"column":148}}}),{"name":"any","hash":{},"data":data,"loc":{"start":{"line":16,"column":34},"end":{"line":16,"column":149}}}),{"name":"if","hash":{},"fn":container.program(30, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":16,"column":28},"end":{"line":16,"column":328}}})) != null ? stack1 : "");
},"30":function(container,depth0,helpers,partials,data) {
    return "tell every doctor and dentist that there is gas in your eye: you must not be given nitrous oxide (laughing gas) until your eye surgeon has confirmed that the gas has gone";
},"31":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"wristband") : stack1),{"name":"if","hash":{},"fn":container.program(32, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":17,"column":26},"end":{"line":17,"column":92}}})) != null ? stack1 : "");
},"32":function(container,depth0,helpers,partials,data) {
    return "keep the wristband on until then";
},"33":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"any").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"agent") : stack1),"silicone-oil",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":18,"column":31},"end":{"line":18,"column":66}}}),lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"agent") : stack1),"heavy-oil",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":18,"column":67},"end":{"line":18,"column":99}}}),{"name":"any","hash":{},"data":data,"loc":{"start":{"line":18,"column":26},"end":{"line":18,"column":100}}}),{"name":"if","hash":{},"fn":container.program(34, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":18,"column":20},"end":{"line":18,"column":191}}})) != null ? stack1 : "");
},"34":function(container,depth0,helpers,partials,data) {
    return "there is clear oil in your eye; it stays until we take it out in another operation";
},"35":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"posture") : stack1),"none",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":21,"column":6},"end":{"line":21,"column":35}}}),{"name":"if","hash":{},"fn":container.program(36, data, 0),"inverse":container.program(39, data, 0),"data":data,"loc":{"start":{"line":21,"column":0},"end":{"line":21,"column":560}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"isList").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"drops") : stack1),{"name":"isList","hash":{},"data":data,"loc":{"start":{"line":22,"column":6},"end":{"line":22,"column":30}}}),{"name":"if","hash":{},"fn":container.program(46, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":22,"column":0},"end":{"line":22,"column":248}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"tablets") : stack1),{"name":"each","hash":{},"fn":container.program(52, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":23,"column":0},"end":{"line":23,"column":216}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"shield",{"name":"statement","hash":{},"fn":container.program(55, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":24,"column":0},"end":{"line":24,"column":181}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"activity",{"name":"statement","hash":{},"fn":container.program(57, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":25,"column":0},"end":{"line":25,"column":94}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"driving",{"name":"statement","hash":{},"fn":container.program(59, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":26,"column":0},"end":{"line":26,"column":236}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"glasses",{"name":"statement","hash":{},"fn":container.program(62, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":27,"column":0},"end":{"line":27,"column":147}}})) != null ? stack1 : "")
    + "\n";
},"36":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(depth0 != null ? depth0 : (container.nullContext || {}),"no-posture",{"name":"statement","hash":{},"fn":container.program(37, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":21,"column":37},"end":{"line":21,"column":156}}})) != null ? stack1 : "");
},"37":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"posture") : stack1),"none",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":21,"column":70},"end":{"line":21,"column":99}}}),{"name":"if","hash":{},"fn":container.program(38, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":21,"column":64},"end":{"line":21,"column":142}}})) != null ? stack1 : "");
},"38":function(container,depth0,helpers,partials,data) {
    return "you may hold your head as you like";
},"39":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"posture") : stack1),{"name":"each","hash":{},"fn":container.program(40, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":21,"column":164},"end":{"line":21,"column":553}}})) != null ? stack1 : "");
},"40":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(depth0 != null ? depth0 : (container.nullContext || {}),"posture",(data && lookupProperty(data,"index")),{"name":"statement","hash":{},"fn":container.program(41, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":21,"column":191},"end":{"line":21,"column":544}}})) != null ? stack1 : "");
},"41":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"position") : depth0),{"name":"if","hash":{},"fn":container.program(42, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":21,"column":222},"end":{"line":21,"column":530}}})) != null ? stack1 : "");
},"42":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "keep your head like this: "
    + ((stack1 = lookupProperty(helpers,"label").call(alias1,"aftercare.posture.position",(depth0 != null ? lookupProperty(depth0,"position") : depth0),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":21,"column":264},"end":{"line":21,"column":311}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"hoursADay") : depth0),{"name":"if","hash":{},"fn":container.program(43, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":21,"column":311},"end":{"line":21,"column":384}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"minutesAnHour") : depth0),{"name":"if","hash":{},"fn":container.program(44, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":21,"column":384},"end":{"line":21,"column":456}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"moreThan").call(alias1,(depth0 != null ? lookupProperty(depth0,"days") : depth0),0,{"name":"moreThan","hash":{},"data":data,"loc":{"start":{"line":21,"column":462},"end":{"line":21,"column":479}}}),{"name":"if","hash":{},"fn":container.program(45, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":21,"column":456},"end":{"line":21,"column":523}}})) != null ? stack1 : "");
},"43":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", for "
    + ((stack1 = lookupProperty(helpers,"figureOf").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"hoursADay") : depth0),"hour","hours",{"name":"figureOf","hash":{},"data":data,"loc":{"start":{"line":21,"column":334},"end":{"line":21,"column":371}}})) != null ? stack1 : "")
    + " a day";
},"44":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", for "
    + ((stack1 = container.lambda((depth0 != null ? lookupProperty(depth0,"minutesAnHour") : depth0), depth0)) != null ? stack1 : "")
    + " minutes of each hour";
},"45":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", for "
    + ((stack1 = lookupProperty(helpers,"countOf").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"days") : depth0),"day","days",{"name":"countOf","hash":{},"data":data,"loc":{"start":{"line":21,"column":487},"end":{"line":21,"column":516}}})) != null ? stack1 : "");
},"46":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"drops") : stack1),{"name":"each","hash":{},"fn":container.program(47, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":22,"column":32},"end":{"line":22,"column":241}}})) != null ? stack1 : "");
},"47":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(depth0 != null ? depth0 : (container.nullContext || {}),"drop",(data && lookupProperty(data,"index")),{"name":"statement","hash":{},"fn":container.program(48, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":22,"column":57},"end":{"line":22,"column":232}}})) != null ? stack1 : "");
},"48":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"drug") : depth0),{"name":"if","hash":{},"fn":container.program(49, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":22,"column":85},"end":{"line":22,"column":218}}})) != null ? stack1 : "");
},"49":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "use the "
    + ((stack1 = container.lambda((depth0 != null ? lookupProperty(depth0,"drug") : depth0), depth0)) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"strength") : depth0),{"name":"if","hash":{},"fn":container.program(50, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":22,"column":113},"end":{"line":22,"column":149}}})) != null ? stack1 : "")
    + " drops "
    + ((stack1 = lookupProperty(helpers,"course").call(alias1,(depth0 != null ? lookupProperty(depth0,"timesADay") : depth0),(depth0 != null ? lookupProperty(depth0,"weeks") : depth0),{"name":"course","hash":{},"data":data,"loc":{"start":{"line":22,"column":156},"end":{"line":22,"column":182}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"note") : depth0),{"name":"if","hash":{},"fn":container.program(51, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":22,"column":182},"end":{"line":22,"column":211}}})) != null ? stack1 : "");
},"50":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " "
    + ((stack1 = container.lambda((depth0 != null ? lookupProperty(depth0,"strength") : depth0), depth0)) != null ? stack1 : "");
},"51":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", "
    + ((stack1 = container.lambda((depth0 != null ? lookupProperty(depth0,"note") : depth0), depth0)) != null ? stack1 : "");
},"52":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(depth0 != null ? depth0 : (container.nullContext || {}),"tablet",(data && lookupProperty(data,"index")),{"name":"statement","hash":{},"fn":container.program(53, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":23,"column":27},"end":{"line":23,"column":207}}})) != null ? stack1 : "");
},"53":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"drug") : depth0),{"name":"if","hash":{},"fn":container.program(54, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":23,"column":57},"end":{"line":23,"column":193}}})) != null ? stack1 : "");
},"54":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "take the "
    + ((stack1 = container.lambda((depth0 != null ? lookupProperty(depth0,"drug") : depth0), depth0)) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"strength") : depth0),{"name":"if","hash":{},"fn":container.program(50, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":23,"column":86},"end":{"line":23,"column":122}}})) != null ? stack1 : "")
    + " tablets "
    + ((stack1 = lookupProperty(helpers,"course").call(alias1,(depth0 != null ? lookupProperty(depth0,"timesADay") : depth0),(depth0 != null ? lookupProperty(depth0,"weeks") : depth0),{"name":"course","hash":{},"data":data,"loc":{"start":{"line":23,"column":131},"end":{"line":23,"column":157}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"note") : depth0),{"name":"if","hash":{},"fn":container.program(51, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":23,"column":157},"end":{"line":23,"column":186}}})) != null ? stack1 : "");
},"55":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"moreThan").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"shieldNights") : stack1),0,{"name":"moreThan","hash":{},"data":data,"loc":{"start":{"line":24,"column":29},"end":{"line":24,"column":64}}}),{"name":"if","hash":{},"fn":container.program(56, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":24,"column":23},"end":{"line":24,"column":167}}})) != null ? stack1 : "");
},"56":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "wear the shield over your eye at night for "
    + ((stack1 = lookupProperty(helpers,"countOf").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"shieldNights") : stack1),"night","nights",{"name":"countOf","hash":{},"data":data,"loc":{"start":{"line":24,"column":109},"end":{"line":24,"column":160}}})) != null ? stack1 : "");
},"57":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"activity") : stack1),{"name":"if","hash":{},"fn":container.program(58, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":25,"column":25},"end":{"line":25,"column":80}}})) != null ? stack1 : "");
},"58":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.lambda(((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"activity") : stack1), depth0)) != null ? stack1 : "");
},"59":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"driving") : stack1),"not-until-review",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":26,"column":30},"end":{"line":26,"column":71}}}),{"name":"if","hash":{},"fn":container.program(60, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":26,"column":24},"end":{"line":26,"column":115}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"driving") : stack1),"as-rules",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":26,"column":121},"end":{"line":26,"column":154}}}),{"name":"if","hash":{},"fn":container.program(61, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":26,"column":115},"end":{"line":26,"column":222}}})) != null ? stack1 : "");
},"60":function(container,depth0,helpers,partials,data) {
    return "do not drive until we have seen you";
},"61":function(container,depth0,helpers,partials,data) {
    return "drive only when you meet the rules for sight where you live";
},"62":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"refractiveChangeTold") : stack1),{"name":"if","hash":{},"fn":container.program(63, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":27,"column":24},"end":{"line":27,"column":133}}})) != null ? stack1 : "");
},"63":function(container,depth0,helpers,partials,data) {
    return "you may need other glasses later; wait until the eye has settled";
},"64":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(depth0 != null ? depth0 : (container.nullContext || {}),"call",{"name":"statement","hash":{},"fn":container.program(65, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":30,"column":0},"end":{"line":30,"column":166}}})) != null ? stack1 : "")
    + "\n";
},"65":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"warningSigns") : stack1),{"name":"if","hash":{},"fn":container.program(66, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":30,"column":21},"end":{"line":30,"column":152}}})) != null ? stack1 : "");
},"66":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "call us at once, day or night, with "
    + ((stack1 = lookupProperty(helpers,"either").call(depth0 != null ? depth0 : (container.nullContext || {}),"aftercare.warningSigns",((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"warningSigns") : stack1),{"name":"either","hash":{},"data":data,"loc":{"start":{"line":30,"column":87},"end":{"line":30,"column":145}}})) != null ? stack1 : "");
},"67":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(depth0 != null ? depth0 : (container.nullContext || {}),"review",{"name":"statement","hash":{},"fn":container.program(68, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":33,"column":0},"end":{"line":33,"column":394}}})) != null ? stack1 : "")
    + "\n";
},"68":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"reviewAt") : stack1),{"name":"if","hash":{},"fn":container.program(69, data, 0),"inverse":container.program(71, data, 0),"data":data,"loc":{"start":{"line":33,"column":23},"end":{"line":33,"column":380}}})) != null ? stack1 : "");
},"69":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "we see you again on "
    + ((stack1 = lookupProperty(helpers,"date").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"reviewAt") : stack1),{"name":"date","hash":{},"data":data,"loc":{"start":{"line":33,"column":69},"end":{"line":33,"column":96}}})) != null ? stack1 : "")
    + " at "
    + ((stack1 = lookupProperty(helpers,"time").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"reviewAt") : stack1),{"name":"time","hash":{},"data":data,"loc":{"start":{"line":33,"column":100},"end":{"line":33,"column":127}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"reviewPlace") : stack1),{"name":"if","hash":{},"fn":container.program(70, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":33,"column":127},"end":{"line":33,"column":190}}})) != null ? stack1 : "");
},"70":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", "
    + ((stack1 = container.lambda(((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"reviewPlace") : stack1), depth0)) != null ? stack1 : "");
},"71":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"known").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"reviewInDays") : stack1),{"name":"known","hash":{},"data":data,"loc":{"start":{"line":33,"column":204},"end":{"line":33,"column":234}}}),{"name":"if","hash":{},"fn":container.program(72, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":33,"column":198},"end":{"line":33,"column":373}}})) != null ? stack1 : "");
},"72":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "we see you again in "
    + ((stack1 = lookupProperty(helpers,"countOf").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"reviewInDays") : stack1),"day","days",{"name":"countOf","hash":{},"data":data,"loc":{"start":{"line":33,"column":256},"end":{"line":33,"column":303}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"reviewPlace") : stack1),{"name":"if","hash":{},"fn":container.program(70, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":33,"column":303},"end":{"line":33,"column":366}}})) != null ? stack1 : "");
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"section").call(alias1,"salutation","Salutation",{"name":"section","hash":{},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":4,"column":12}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"section").call(alias1,"what","What was wrong and what we did",{"name":"section","hash":{},"fn":container.program(6, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":5,"column":0},"end":{"line":11,"column":12}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"section").call(alias1,"gas","Gas or oil in your eye",{"name":"section","hash":{},"fn":container.program(20, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":12,"column":0},"end":{"line":19,"column":12}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"section").call(alias1,"do","What to do",{"name":"section","hash":{},"fn":container.program(35, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":20,"column":0},"end":{"line":28,"column":12}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"section").call(alias1,"call","When to call us at once",{"name":"section","hash":{},"fn":container.program(64, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":29,"column":0},"end":{"line":31,"column":12}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"section").call(alias1,"next","Next visit",{"name":"section","hash":{},"fn":container.program(67, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":32,"column":0},"end":{"line":34,"column":12}}})) != null ? stack1 : "");
},"useData":true},
  "referring-doctor": {"0":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(alias1,"dear",{"name":"statement","hash":{},"fn":container.program(1, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":2,"column":0},"end":{"line":2,"column":102}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"opening",{"name":"statement","hash":{},"fn":container.program(3, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":3,"column":0},"end":{"line":3,"column":373}}})) != null ? stack1 : "")
    + "\n";
},"1":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"any").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"eye") : stack1),((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"patient") : stack1)) != null ? lookupProperty(stack1,"familyName") : stack1),{"name":"any","hash":{},"data":data,"loc":{"start":{"line":2,"column":27},"end":{"line":2,"column":63}}}),{"name":"if","hash":{},"fn":container.program(2, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":2,"column":21},"end":{"line":2,"column":88}}})) != null ? stack1 : "");
},"2":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "dear "
    + ((stack1 = container.lambda((depth0 != null ? lookupProperty(depth0,"reader") : depth0), depth0)) != null ? stack1 : "")
    + ",";
},"3":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"patient") : stack1)) != null ? lookupProperty(stack1,"familyName") : stack1),{"name":"if","hash":{},"fn":container.program(4, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":3,"column":24},"end":{"line":3,"column":359}}})) != null ? stack1 : "");
},"4":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"referrer") : stack1)) != null ? lookupProperty(stack1,"referredOn") : stack1),{"name":"if","hash":{},"fn":container.program(5, data, 0),"inverse":container.program(6, data, 0),"data":data,"loc":{"start":{"line":3,"column":54},"end":{"line":3,"column":191}}})) != null ? stack1 : "")
    + " "
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"patient") : stack1)) != null ? lookupProperty(stack1,"givenName") : stack1),{"name":"if","hash":{},"fn":container.program(7, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":3,"column":192},"end":{"line":3,"column":254}}})) != null ? stack1 : "")
    + ((stack1 = container.lambda(((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"patient") : stack1)) != null ? lookupProperty(stack1,"familyName") : stack1), depth0)) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"startedAt") : stack1),{"name":"if","hash":{},"fn":container.program(8, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":3,"column":280},"end":{"line":3,"column":352}}})) != null ? stack1 : "");
},"5":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "thank you for your referral of "
    + ((stack1 = lookupProperty(helpers,"date").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"referrer") : stack1)) != null ? lookupProperty(stack1,"referredOn") : stack1),{"name":"date","hash":{},"data":data,"loc":{"start":{"line":3,"column":116},"end":{"line":3,"column":148}}})) != null ? stack1 : "")
    + " of";
},"6":function(container,depth0,helpers,partials,data) {
    return "this is to tell you about";
},"7":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.lambda(((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"patient") : stack1)) != null ? lookupProperty(stack1,"givenName") : stack1), depth0)) != null ? stack1 : "")
    + " ";
},"8":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", who was operated on "
    + ((stack1 = lookupProperty(helpers,"date").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"startedAt") : stack1),{"name":"date","hash":{},"data":data,"loc":{"start":{"line":3,"column":323},"end":{"line":3,"column":345}}})) != null ? stack1 : "");
},"9":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.invokePartial(lookupProperty(partials,"diagnosis"),depth0,{"name":"diagnosis","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "");
},"10":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.invokePartial(lookupProperty(partials,"procedure"),depth0,{"name":"procedure","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "");
},"11":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(alias1,"pressure",{"name":"statement","hash":{},"fn":container.program(12, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":12,"column":0},"end":{"line":12,"column":337}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"oil-pressure",{"name":"statement","hash":{},"fn":container.program(14, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":13,"column":0},"end":{"line":13,"column":268}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"again",{"name":"statement","hash":{},"fn":container.program(16, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":14,"column":0},"end":{"line":14,"column":173}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"glasses",{"name":"statement","hash":{},"fn":container.program(18, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":15,"column":0},"end":{"line":15,"column":317}}})) != null ? stack1 : "")
    + "\n";
},"12":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"any").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"agent") : stack1),"SF6",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":12,"column":36},"end":{"line":12,"column":62}}}),lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"agent") : stack1),"C2F6",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":12,"column":63},"end":{"line":12,"column":90}}}),lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"agent") : stack1),"C3F8",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":12,"column":91},"end":{"line":12,"column":118}}}),{"name":"any","hash":{},"data":data,"loc":{"start":{"line":12,"column":31},"end":{"line":12,"column":119}}}),{"name":"if","hash":{},"fn":container.program(13, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":12,"column":25},"end":{"line":12,"column":323}}})) != null ? stack1 : "");
},"13":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "if you see the patient while there is gas in the eye, please measure the pressure; tell us the same day if it is raised; the gas may last "
    + ((stack1 = lookupProperty(helpers,"gasSpan").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"tamponade") : depth0),((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"lens") : stack1),{"name":"gasSpan","hash":{},"data":data,"loc":{"start":{"line":12,"column":259},"end":{"line":12,"column":292}}})) != null ? stack1 : "")
    + " or longer (an estimate)";
},"14":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"any").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"agent") : stack1),"silicone-oil",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":13,"column":40},"end":{"line":13,"column":75}}}),lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"agent") : stack1),"heavy-oil",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":13,"column":76},"end":{"line":13,"column":108}}}),{"name":"any","hash":{},"data":data,"loc":{"start":{"line":13,"column":35},"end":{"line":13,"column":109}}}),{"name":"if","hash":{},"fn":container.program(15, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":13,"column":29},"end":{"line":13,"column":254}}})) != null ? stack1 : "");
},"15":function(container,depth0,helpers,partials,data) {
    return "there is silicone oil in the eye: please measure the pressure at each visit and expect the refraction to be altered until the oil is out";
},"16":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"eye") : stack1),{"name":"if","hash":{},"fn":container.program(17, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":14,"column":22},"end":{"line":14,"column":159}}})) != null ? stack1 : "");
},"17":function(container,depth0,helpers,partials,data) {
    return "please send the patient back the same day with new floaters, flashes, a shadow, loss of sight or pain in either eye";
},"18":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"refractiveChangeTold") : stack1),{"name":"if","hash":{},"fn":container.program(19, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":15,"column":24},"end":{"line":15,"column":303}}})) != null ? stack1 : "");
},"19":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "please wait with new glasses until the eye has settled: the operation is expected to change its refraction"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"bandShift").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"buckle") : depth0)) != null ? lookupProperty(stack1,"elements") : stack1),{"name":"bandShift","hash":{},"data":data,"loc":{"start":{"line":15,"column":174},"end":{"line":15,"column":201}}}),{"name":"if","hash":{},"fn":container.program(20, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":15,"column":168},"end":{"line":15,"column":296}}})) != null ? stack1 : "");
},"20":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "; published bands made the eye "
    + ((stack1 = lookupProperty(helpers,"bandShift").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"buckle") : depth0)) != null ? lookupProperty(stack1,"elements") : stack1),{"name":"bandShift","hash":{},"data":data,"loc":{"start":{"line":15,"column":234},"end":{"line":15,"column":263}}})) != null ? stack1 : "")
    + " more myopic (an estimate)";
},"21":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.invokePartial(lookupProperty(partials,"posture"),depth0,{"name":"posture","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "")
    + ((stack1 = container.invokePartial(lookupProperty(partials,"gas-advice"),depth0,{"name":"gas-advice","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "")
    + ((stack1 = container.invokePartial(lookupProperty(partials,"courses"),depth0,{"name":"courses","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "")
    + ((stack1 = container.invokePartial(lookupProperty(partials,"review"),depth0,{"name":"review","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "");
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"section").call(alias1,"salutation","Salutation",{"name":"section","hash":{},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":4,"column":12}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"section").call(alias1,"diagnosis","Diagnosis",{"name":"section","hash":{},"fn":container.program(9, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":5,"column":0},"end":{"line":7,"column":12}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"section").call(alias1,"procedure","Procedure",{"name":"section","hash":{},"fn":container.program(10, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":8,"column":0},"end":{"line":10,"column":12}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"section").call(alias1,"actions","What we ask of you",{"name":"section","hash":{},"fn":container.program(11, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":11,"column":0},"end":{"line":16,"column":12}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"section").call(alias1,"aftercare","What the patient was told",{"name":"section","hash":{},"fn":container.program(21, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":17,"column":0},"end":{"line":22,"column":12}}})) != null ? stack1 : "");
},"usePartial":true,"useData":true},
};
export const partials = {
  "courses": {"0":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(depth0 != null ? depth0 : (container.nullContext || {}),"no-drops",{"name":"statement","hash":{},"fn":container.program(1, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":35},"end":{"line":1,"column":135}}})) != null ? stack1 : "");
},"1":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"drops") : stack1),"none",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":1,"column":66},"end":{"line":1,"column":93}}}),{"name":"if","hash":{},"fn":container.program(2, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":60},"end":{"line":1,"column":121}}})) != null ? stack1 : "");
},"2":function(container,depth0,helpers,partials,data) {
    return "no drops are needed";
},"3":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"drops") : stack1),{"name":"each","hash":{},"fn":container.program(4, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":143},"end":{"line":1,"column":381}}})) != null ? stack1 : "");
},"4":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(depth0 != null ? depth0 : (container.nullContext || {}),"drop",(data && lookupProperty(data,"index")),{"name":"statement","hash":{},"fn":container.program(5, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":168},"end":{"line":1,"column":372}}})) != null ? stack1 : "");
},"5":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"drug") : depth0),{"name":"if","hash":{},"fn":container.program(6, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":196},"end":{"line":1,"column":358}}})) != null ? stack1 : "");
},"6":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.lambda((depth0 != null ? lookupProperty(depth0,"drug") : depth0), depth0)) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"strength") : depth0),{"name":"if","hash":{},"fn":container.program(7, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":216},"end":{"line":1,"column":252}}})) != null ? stack1 : "")
    + " drops"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"eye") : depth0),{"name":"if","hash":{},"fn":container.program(8, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":258},"end":{"line":1,"column":295}}})) != null ? stack1 : "")
    + " "
    + ((stack1 = lookupProperty(helpers,"course").call(alias1,(depth0 != null ? lookupProperty(depth0,"timesADay") : depth0),(depth0 != null ? lookupProperty(depth0,"weeks") : depth0),{"name":"course","hash":{},"data":data,"loc":{"start":{"line":1,"column":296},"end":{"line":1,"column":322}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"note") : depth0),{"name":"if","hash":{},"fn":container.program(9, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":322},"end":{"line":1,"column":351}}})) != null ? stack1 : "");
},"7":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " "
    + ((stack1 = container.lambda((depth0 != null ? lookupProperty(depth0,"strength") : depth0), depth0)) != null ? stack1 : "");
},"8":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " to the "
    + ((stack1 = container.lambda((depth0 != null ? lookupProperty(depth0,"eye") : depth0), depth0)) != null ? stack1 : "")
    + " eye";
},"9":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", "
    + ((stack1 = container.lambda((depth0 != null ? lookupProperty(depth0,"note") : depth0), depth0)) != null ? stack1 : "");
},"10":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(depth0 != null ? depth0 : (container.nullContext || {}),"tablet",(data && lookupProperty(data,"index")),{"name":"statement","hash":{},"fn":container.program(11, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":2,"column":27},"end":{"line":2,"column":199}}})) != null ? stack1 : "");
},"11":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"drug") : depth0),{"name":"if","hash":{},"fn":container.program(12, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":2,"column":57},"end":{"line":2,"column":185}}})) != null ? stack1 : "");
},"12":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.lambda((depth0 != null ? lookupProperty(depth0,"drug") : depth0), depth0)) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"strength") : depth0),{"name":"if","hash":{},"fn":container.program(7, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":2,"column":77},"end":{"line":2,"column":113}}})) != null ? stack1 : "")
    + " by mouth "
    + ((stack1 = lookupProperty(helpers,"course").call(alias1,(depth0 != null ? lookupProperty(depth0,"timesADay") : depth0),(depth0 != null ? lookupProperty(depth0,"weeks") : depth0),{"name":"course","hash":{},"data":data,"loc":{"start":{"line":2,"column":123},"end":{"line":2,"column":149}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"note") : depth0),{"name":"if","hash":{},"fn":container.program(9, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":2,"column":149},"end":{"line":2,"column":178}}})) != null ? stack1 : "");
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"drops") : stack1),"none",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":1,"column":6},"end":{"line":1,"column":33}}}),{"name":"if","hash":{},"fn":container.program(0, data, 0),"inverse":container.program(3, data, 0),"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":388}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"tablets") : stack1),{"name":"each","hash":{},"fn":container.program(10, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":2,"column":0},"end":{"line":2,"column":208}}})) != null ? stack1 : "")
    + "\n";
},"useData":true},
  "diagnosis": {"0":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"diagnosis") : stack1),{"name":"if","hash":{},"fn":container.program(1, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":26},"end":{"line":1,"column":209}}})) != null ? stack1 : "");
},"1":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.lambda(((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"eye") : stack1), depth0)) != null ? stack1 : "")
    + " "
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"recurrent") : stack1),{"name":"if","hash":{},"fn":container.program(2, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":62},"end":{"line":1,"column":103}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"label").call(alias1,"before.diagnosis",((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"diagnosis") : stack1),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":1,"column":103},"end":{"line":1,"column":148}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"macula") : stack1),{"name":"if","hash":{},"fn":container.program(3, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":148},"end":{"line":1,"column":202}}})) != null ? stack1 : "");
},"2":function(container,depth0,helpers,partials,data) {
    return "recurrent ";
},"3":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", macula "
    + ((stack1 = container.lambda(((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"macula") : stack1), depth0)) != null ? stack1 : "");
},"4":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"isList").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"breaks") : depth0)) != null ? lookupProperty(stack1,"found") : stack1),{"name":"isList","hash":{},"data":data,"loc":{"start":{"line":2,"column":29},"end":{"line":2,"column":50}}}),{"name":"if","hash":{},"fn":container.program(5, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":2,"column":23},"end":{"line":2,"column":115}}})) != null ? stack1 : "");
},"5":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"counted").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"breaks") : depth0)) != null ? lookupProperty(stack1,"found") : stack1),"break was","breaks were",{"name":"counted","hash":{},"data":data,"loc":{"start":{"line":2,"column":52},"end":{"line":2,"column":102}}})) != null ? stack1 : "")
    + " found";
},"6":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"pvr") : stack1)) != null ? lookupProperty(stack1,"grade") : stack1),{"name":"if","hash":{},"fn":container.program(7, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":3,"column":20},"end":{"line":3,"column":194}}})) != null ? stack1 : "");
},"7":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"isNot").call(alias1,((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"pvr") : stack1)) != null ? lookupProperty(stack1,"grade") : stack1),"none",{"name":"isNot","hash":{},"data":data,"loc":{"start":{"line":3,"column":50},"end":{"line":3,"column":81}}}),{"name":"if","hash":{},"fn":container.program(8, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":3,"column":44},"end":{"line":3,"column":187}}})) != null ? stack1 : "");
},"8":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "there was scar tissue on the retina (proliferative vitreoretinopathy, grade "
    + ((stack1 = container.lambda(((stack1 = ((stack1 = (depth0 != null ? lookupProperty(depth0,"before") : depth0)) != null ? lookupProperty(stack1,"pvr") : stack1)) != null ? lookupProperty(stack1,"grade") : stack1), depth0)) != null ? stack1 : "")
    + ")";
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(alias1,"diagnosis",{"name":"statement","hash":{},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":223}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"breaks",{"name":"statement","hash":{},"fn":container.program(4, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":2,"column":0},"end":{"line":2,"column":129}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"pvr",{"name":"statement","hash":{},"fn":container.program(6, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":3,"column":0},"end":{"line":3,"column":208}}})) != null ? stack1 : "")
    + "\n";
},"useData":true},
  "gas-advice": {"0":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"flyingAdviceGiven") : stack1),{"name":"if","hash":{},"fn":container.program(1, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":23},"end":{"line":1,"column":155}}})) != null ? stack1 : "");
},"1":function(container,depth0,helpers,partials,data) {
    return "told not to fly or travel to heights until the surgeon has confirmed that the gas has gone";
},"2":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"nitrousOxideAdviceGiven") : stack1),{"name":"if","hash":{},"fn":container.program(3, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":2,"column":30},"end":{"line":2,"column":171}}})) != null ? stack1 : "");
},"3":function(container,depth0,helpers,partials,data) {
    return "told that no nitrous oxide may be given until the surgeon has confirmed that the gas has gone";
},"4":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"wristband") : stack1),{"name":"if","hash":{},"fn":container.program(5, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":3,"column":26},"end":{"line":3,"column":81}}})) != null ? stack1 : "");
},"5":function(container,depth0,helpers,partials,data) {
    return "a wristband was given";
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(alias1,"flying",{"name":"statement","hash":{},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":169}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"nitrous-oxide",{"name":"statement","hash":{},"fn":container.program(2, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":2,"column":0},"end":{"line":2,"column":185}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"wristband",{"name":"statement","hash":{},"fn":container.program(4, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":3,"column":0},"end":{"line":3,"column":95}}})) != null ? stack1 : "")
    + "\n";
},"useData":true},
  "posture": {"0":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(depth0 != null ? depth0 : (container.nullContext || {}),"no-posture",{"name":"statement","hash":{},"fn":container.program(1, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":37},"end":{"line":1,"column":142}}})) != null ? stack1 : "");
},"1":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"posture") : stack1),"none",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":1,"column":70},"end":{"line":1,"column":99}}}),{"name":"if","hash":{},"fn":container.program(2, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":64},"end":{"line":1,"column":128}}})) != null ? stack1 : "");
},"2":function(container,depth0,helpers,partials,data) {
    return "no posture is needed";
},"3":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"posture") : stack1),{"name":"each","hash":{},"fn":container.program(4, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":150},"end":{"line":1,"column":514}}})) != null ? stack1 : "");
},"4":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(depth0 != null ? depth0 : (container.nullContext || {}),"posture",(data && lookupProperty(data,"index")),{"name":"statement","hash":{},"fn":container.program(5, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":177},"end":{"line":1,"column":505}}})) != null ? stack1 : "");
},"5":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"position") : depth0),{"name":"if","hash":{},"fn":container.program(6, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":208},"end":{"line":1,"column":491}}})) != null ? stack1 : "");
},"6":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "posture: "
    + ((stack1 = lookupProperty(helpers,"label").call(alias1,"aftercare.posture.position",(depth0 != null ? lookupProperty(depth0,"position") : depth0),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":1,"column":233},"end":{"line":1,"column":280}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"hoursADay") : depth0),{"name":"if","hash":{},"fn":container.program(7, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":280},"end":{"line":1,"column":349}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"minutesAnHour") : depth0),{"name":"if","hash":{},"fn":container.program(8, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":349},"end":{"line":1,"column":417}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"moreThan").call(alias1,(depth0 != null ? lookupProperty(depth0,"days") : depth0),0,{"name":"moreThan","hash":{},"data":data,"loc":{"start":{"line":1,"column":423},"end":{"line":1,"column":440}}}),{"name":"if","hash":{},"fn":container.program(9, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":417},"end":{"line":1,"column":484}}})) != null ? stack1 : "");
},"7":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", "
    + ((stack1 = lookupProperty(helpers,"figureOf").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"hoursADay") : depth0),"hour","hours",{"name":"figureOf","hash":{},"data":data,"loc":{"start":{"line":1,"column":299},"end":{"line":1,"column":336}}})) != null ? stack1 : "")
    + " a day";
},"8":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", "
    + ((stack1 = container.lambda((depth0 != null ? lookupProperty(depth0,"minutesAnHour") : depth0), depth0)) != null ? stack1 : "")
    + " minutes of each hour";
},"9":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", for "
    + ((stack1 = lookupProperty(helpers,"countOf").call(depth0 != null ? depth0 : (container.nullContext || {}),(depth0 != null ? lookupProperty(depth0,"days") : depth0),"day","days",{"name":"countOf","hash":{},"data":data,"loc":{"start":{"line":1,"column":448},"end":{"line":1,"column":477}}})) != null ? stack1 : "");
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"posture") : stack1),"none",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":1,"column":6},"end":{"line":1,"column":35}}}),{"name":"if","hash":{},"fn":container.program(0, data, 0),"inverse":container.program(3, data, 0),"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":521}}})) != null ? stack1 : "")
    + "\n";
},"useData":true},
  "procedure": {"0":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"performed") : stack1),{"name":"if","hash":{},"fn":container.program(1, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":26},"end":{"line":1,"column":271}}})) != null ? stack1 : "");
},"1":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.lambda(((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"eye") : stack1), depth0)) != null ? stack1 : "")
    + " "
    + ((stack1 = lookupProperty(helpers,"labels").call(alias1,"who.performed",((stack1 = (depth0 != null ? lookupProperty(depth0,"who") : depth0)) != null ? lookupProperty(stack1,"performed") : stack1),{"name":"labels","hash":{},"data":data,"loc":{"start":{"line":1,"column":59},"end":{"line":1,"column":99}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"anaesthesia") : depth0)) != null ? lookupProperty(stack1,"kind") : stack1),{"name":"if","hash":{},"fn":container.program(2, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":99},"end":{"line":1,"column":264}}})) != null ? stack1 : "");
},"2":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", under "
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"anaesthesia") : depth0)) != null ? lookupProperty(stack1,"kind") : stack1),"general",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":1,"column":137},"end":{"line":1,"column":168}}}),{"name":"if","hash":{},"fn":container.program(3, data, 0),"inverse":container.program(4, data, 0),"data":data,"loc":{"start":{"line":1,"column":131},"end":{"line":1,"column":257}}})) != null ? stack1 : "");
},"3":function(container,depth0,helpers,partials,data) {
    return "general anaesthesia";
},"4":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"lower").call(alias1,lookupProperty(helpers,"label").call(alias1,"anaesthesia.kind",((stack1 = (depth0 != null ? lookupProperty(depth0,"anaesthesia") : depth0)) != null ? lookupProperty(stack1,"kind") : stack1),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":1,"column":205},"end":{"line":1,"column":248}}}),{"name":"lower","hash":{},"data":data,"loc":{"start":{"line":1,"column":197},"end":{"line":1,"column":250}}})) != null ? stack1 : "");
},"5":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"agent") : stack1),{"name":"if","hash":{},"fn":container.program(6, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":2,"column":26},"end":{"line":2,"column":360}}})) != null ? stack1 : "");
},"6":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"agent") : stack1),"none",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":2,"column":55},"end":{"line":2,"column":82}}}),{"name":"if","hash":{},"fn":container.program(7, data, 0),"inverse":container.program(8, data, 0),"data":data,"loc":{"start":{"line":2,"column":49},"end":{"line":2,"column":353}}})) != null ? stack1 : "");
},"7":function(container,depth0,helpers,partials,data) {
    return "no gas or oil was left in the eye";
},"8":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"isNot").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"concentrationPercent") : stack1),"not-applicable",{"name":"isNot","hash":{},"data":data,"loc":{"start":{"line":2,"column":131},"end":{"line":2,"column":186}}}),{"name":"if","hash":{},"fn":container.program(9, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":2,"column":125},"end":{"line":2,"column":283}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"label").call(alias1,"tamponade.agent",((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"agent") : stack1),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":2,"column":283},"end":{"line":2,"column":326}}})) != null ? stack1 : "")
    + " was left in the eye";
},"9":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"concentrationPercent") : stack1),{"name":"if","hash":{},"fn":container.program(10, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":2,"column":188},"end":{"line":2,"column":276}}})) != null ? stack1 : "");
},"10":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"number").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"tamponade") : depth0)) != null ? lookupProperty(stack1,"concentrationPercent") : stack1),{"name":"number","hash":{},"data":data,"loc":{"start":{"line":2,"column":226},"end":{"line":2,"column":267}}})) != null ? stack1 : "")
    + "% ";
},"11":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"retina") : stack1),{"name":"if","hash":{},"fn":container.program(12, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":3,"column":24},"end":{"line":3,"column":320}}})) != null ? stack1 : "");
},"12":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "at the end "
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"retina") : stack1),"fluid-left",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":3,"column":65},"end":{"line":3,"column":99}}}),{"name":"if","hash":{},"fn":container.program(13, data, 0),"inverse":container.program(14, data, 0),"data":data,"loc":{"start":{"line":3,"column":59},"end":{"line":3,"column":212}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"known").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"pressureMmHg") : stack1),{"name":"known","hash":{},"data":data,"loc":{"start":{"line":3,"column":218},"end":{"line":3,"column":248}}}),{"name":"if","hash":{},"fn":container.program(15, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":3,"column":212},"end":{"line":3,"column":313}}})) != null ? stack1 : "");
},"13":function(container,depth0,helpers,partials,data) {
    return "some fluid was left under the retina";
},"14":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "the retina was "
    + ((stack1 = lookupProperty(helpers,"label").call(depth0 != null ? depth0 : (container.nullContext || {}),"endOfCase.retina",((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"retina") : stack1),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":3,"column":160},"end":{"line":3,"column":205}}})) != null ? stack1 : "");
},"15":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " and the pressure "
    + ((stack1 = lookupProperty(helpers,"number").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"pressureMmHg") : stack1),{"name":"number","hash":{},"data":data,"loc":{"start":{"line":3,"column":268},"end":{"line":3,"column":301}}})) != null ? stack1 : "")
    + " mmHg";
},"16":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(depth0 != null ? depth0 : (container.nullContext || {}),"no-complication",{"name":"statement","hash":{},"fn":container.program(17, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":4,"column":43},"end":{"line":4,"column":166}}})) != null ? stack1 : "");
},"17":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"complications") : stack1),"none",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":4,"column":81},"end":{"line":4,"column":116}}}),{"name":"if","hash":{},"fn":container.program(18, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":4,"column":75},"end":{"line":4,"column":152}}})) != null ? stack1 : "");
},"18":function(container,depth0,helpers,partials,data) {
    return "there were no complications";
},"19":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"complications") : stack1),{"name":"each","hash":{},"fn":container.program(20, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":4,"column":174},"end":{"line":4,"column":473}}})) != null ? stack1 : "");
},"20":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(depth0 != null ? depth0 : (container.nullContext || {}),"complication",(data && lookupProperty(data,"index")),{"name":"statement","hash":{},"fn":container.program(21, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":4,"column":207},"end":{"line":4,"column":464}}})) != null ? stack1 : "");
},"21":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"any").call(alias1,(depth0 != null ? lookupProperty(depth0,"kind") : depth0),(depth0 != null ? lookupProperty(depth0,"detail") : depth0),{"name":"any","hash":{},"data":data,"loc":{"start":{"line":4,"column":249},"end":{"line":4,"column":266}}}),{"name":"if","hash":{},"fn":container.program(22, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":4,"column":243},"end":{"line":4,"column":450}}})) != null ? stack1 : "");
},"22":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "complication: "
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,(depth0 != null ? lookupProperty(depth0,"kind") : depth0),"other",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":4,"column":288},"end":{"line":4,"column":305}}}),{"name":"if","hash":{},"fn":container.program(23, data, 0),"inverse":container.program(24, data, 0),"data":data,"loc":{"start":{"line":4,"column":282},"end":{"line":4,"column":410}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"action") : depth0),{"name":"if","hash":{},"fn":container.program(26, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":4,"column":410},"end":{"line":4,"column":443}}})) != null ? stack1 : "");
},"23":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.lambda((depth0 != null ? lookupProperty(depth0,"detail") : depth0), depth0)) != null ? stack1 : "");
},"24":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"label").call(alias1,"endOfCase.complications.kind",(depth0 != null ? lookupProperty(depth0,"kind") : depth0),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":4,"column":325},"end":{"line":4,"column":370}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,(depth0 != null ? lookupProperty(depth0,"detail") : depth0),{"name":"if","hash":{},"fn":container.program(25, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":4,"column":370},"end":{"line":4,"column":403}}})) != null ? stack1 : "");
},"25":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", "
    + ((stack1 = container.lambda((depth0 != null ? lookupProperty(depth0,"detail") : depth0), depth0)) != null ? stack1 : "");
},"26":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "; "
    + ((stack1 = container.lambda((depth0 != null ? lookupProperty(depth0,"action") : depth0), depth0)) != null ? stack1 : "");
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(alias1,"procedure",{"name":"statement","hash":{},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":285}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"tamponade",{"name":"statement","hash":{},"fn":container.program(5, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":2,"column":0},"end":{"line":2,"column":374}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"outcome",{"name":"statement","hash":{},"fn":container.program(11, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":3,"column":0},"end":{"line":3,"column":334}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"is").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"endOfCase") : depth0)) != null ? lookupProperty(stack1,"complications") : stack1),"none",{"name":"is","hash":{},"data":data,"loc":{"start":{"line":4,"column":6},"end":{"line":4,"column":41}}}),{"name":"if","hash":{},"fn":container.program(16, data, 0),"inverse":container.program(19, data, 0),"data":data,"loc":{"start":{"line":4,"column":0},"end":{"line":4,"column":480}}})) != null ? stack1 : "")
    + "\n";
},"useData":true},
  "review": {"0":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"reviewAt") : stack1),{"name":"if","hash":{},"fn":container.program(1, data, 0),"inverse":container.program(3, data, 0),"data":data,"loc":{"start":{"line":1,"column":23},"end":{"line":1,"column":360}}})) != null ? stack1 : "");
},"1":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "review on "
    + ((stack1 = lookupProperty(helpers,"date").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"reviewAt") : stack1),{"name":"date","hash":{},"data":data,"loc":{"start":{"line":1,"column":59},"end":{"line":1,"column":86}}})) != null ? stack1 : "")
    + " at "
    + ((stack1 = lookupProperty(helpers,"time").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"reviewAt") : stack1),{"name":"time","hash":{},"data":data,"loc":{"start":{"line":1,"column":90},"end":{"line":1,"column":117}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"reviewPlace") : stack1),{"name":"if","hash":{},"fn":container.program(2, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":117},"end":{"line":1,"column":180}}})) != null ? stack1 : "");
},"2":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", "
    + ((stack1 = container.lambda(((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"reviewPlace") : stack1), depth0)) != null ? stack1 : "");
},"3":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(helpers,"known").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"reviewInDays") : stack1),{"name":"known","hash":{},"data":data,"loc":{"start":{"line":1,"column":194},"end":{"line":1,"column":224}}}),{"name":"if","hash":{},"fn":container.program(4, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":188},"end":{"line":1,"column":353}}})) != null ? stack1 : "");
},"4":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "review in "
    + ((stack1 = lookupProperty(helpers,"countOf").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"reviewInDays") : stack1),"day","days",{"name":"countOf","hash":{},"data":data,"loc":{"start":{"line":1,"column":236},"end":{"line":1,"column":283}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"reviewPlace") : stack1),{"name":"if","hash":{},"fn":container.program(2, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":283},"end":{"line":1,"column":346}}})) != null ? stack1 : "");
},"5":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"oilRemovalInMonths") : stack1),{"name":"if","hash":{},"fn":container.program(6, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":2,"column":28},"end":{"line":2,"column":169}}})) != null ? stack1 : "");
},"6":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "the oil is planned to come out in about "
    + ((stack1 = lookupProperty(helpers,"figureOf").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"oilRemovalInMonths") : stack1),"month","months",{"name":"figureOf","hash":{},"data":data,"loc":{"start":{"line":2,"column":104},"end":{"line":2,"column":162}}})) != null ? stack1 : "");
},"7":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"elementRemovalInMonths") : stack1),{"name":"if","hash":{},"fn":container.program(8, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":3,"column":32},"end":{"line":3,"column":199}}})) != null ? stack1 : "");
},"8":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "the element is planned to be released or removed in about "
    + ((stack1 = lookupProperty(helpers,"figureOf").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"elementRemovalInMonths") : stack1),"month","months",{"name":"figureOf","hash":{},"data":data,"loc":{"start":{"line":3,"column":130},"end":{"line":3,"column":192}}})) != null ? stack1 : "");
},"9":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"nextOperationOn") : stack1),{"name":"if","hash":{},"fn":container.program(10, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":4,"column":31},"end":{"line":4,"column":138}}})) != null ? stack1 : "");
},"10":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "the next operation is planned on "
    + ((stack1 = lookupProperty(helpers,"date").call(depth0 != null ? depth0 : (container.nullContext || {}),((stack1 = (depth0 != null ? lookupProperty(depth0,"aftercare") : depth0)) != null ? lookupProperty(stack1,"nextOperationOn") : stack1),{"name":"date","hash":{},"data":data,"loc":{"start":{"line":4,"column":97},"end":{"line":4,"column":131}}})) != null ? stack1 : "");
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"statement").call(alias1,"review",{"name":"statement","hash":{},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":1,"column":374}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"oil-removal",{"name":"statement","hash":{},"fn":container.program(5, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":2,"column":0},"end":{"line":2,"column":183}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"element-removal",{"name":"statement","hash":{},"fn":container.program(7, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":3,"column":0},"end":{"line":3,"column":213}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"statement").call(alias1,"next-operation",{"name":"statement","hash":{},"fn":container.program(9, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":4,"column":0},"end":{"line":4,"column":152}}})) != null ? stack1 : "")
    + "\n";
},"useData":true},
};
